import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { benches, meets } from '@/db/schema';
import { actorOf, fixedId, makeMeet, makeTester, makeWorld } from '@/tests/support/factories';
import { checkOnBench } from '@/tests/support/line';
import { testStore } from '@/tests/support/store';
import { addBench } from '../bench/add';
import { setBenchTester } from '../bench/set-tester';
import { changePlan } from '../plan/change';
import { changeMeet } from './change';
import { createMeet } from './create';

const call = (number: number) => fixedId('call', number);
const meetId = fixedId('meet');
const testerId = fixedId('tester');
const details = {
  name: 'Test Meet',
  place: 'Fallow Field',
  startsOn: '2026-07-03',
  endsOn: '2026-07-05',
  timeZone: 'Europe/London',
  latitudeDeg: '52,1',
  heightM: null,
  dayStartHour: 4,
};

describe('meets and benches', async () => {
  const store = await testStore();
  let world: Awaited<ReturnType<typeof makeWorld>>;
  const asLead = () => store.contextFor(actorOf(world.staff.lead));
  const bench = async (benchId: string) =>
    (await store.db.select().from(benches).where(eq(benches.id, benchId)))[0]!;
  beforeEach(async () => {
    await store.reset();
    world = await makeWorld(store.db);
  });

  it('gives every meet an address of its own', async () => {
    const { slug, meetId: made } = await createMeet(asLead(), call(1), { ...details, benches: 1 });
    expect(slug).toBe('test-meet-2');
    const [row] = await store.db.select().from(meets).where(eq(meets.id, made));
    expect(row).toMatchObject({ latitudeDeg: 52.1, heightM: null, timeZone: 'Europe/London' });
  });

  it.each([
    ['a latitude past the pole', { latitudeDeg: 90.1 }, 'latitudeDeg'],
    ['a zone that nobody knows', { timeZone: 'Mars/Olympus' }, 'timeZone'],
    ['an offset for a zone', { timeZone: '+01:00' }, 'timeZone'],
    ['days the wrong way round', { endsOn: '2026-07-02' }, 'endsOn'],
    ['a year that was mistyped', { endsOn: '2027-07-05' }, 'endsOn'],
    ['a date that does not exist', { startsOn: '2026-02-30' }, 'startsOn'],
    ['an hour past midnight', { dayStartHour: 24 }, 'dayStartHour'],
    ['nine benches', { benches: 9 }, 'benches'],
  ])('refuses %s', async (_what, change, field) => {
    const input: unknown = { ...details, benches: 1, ...change };
    const refusal = await createMeet
      .fromWire(asLead(), call(1), input)
      .catch((error: unknown) => error);
    expect(refusal).toMatchObject({
      code: 'invalid',
      extra: { fields: { [field]: expect.any(String) } },
    });
  });

  it('changes its details and keeps its address, and tells the line', async () => {
    await changeMeet(asLead(), call(1), { meetId, details: { ...details, name: 'Other Name' } });
    const [row] = await store.db.select().from(meets).where(eq(meets.id, meetId));
    expect(row).toMatchObject({ name: 'Other Name', slug: 'test-meet', joinOpen: true });
    await changeMeet(asLead(), call(2), { meetId, joinOpen: false });
    const [closed] = await store.db.select().from(meets).where(eq(meets.id, meetId));
    expect(closed).toMatchObject({ name: 'Other Name', joinOpen: false });
    expect(store.published.map(({ events }) => events)).toEqual([
      [{ kind: 'line', meetId }],
      [{ kind: 'line', meetId }],
    ]);
  });

  it('numbers a new bench, up to eight', async () => {
    expect(await addBench(asLead(), call(1), { meetId })).toMatchObject({ number: 3 });
    for (let number = 4; number <= 8; number += 1)
      await addBench(asLead(), call(number), { meetId });
    await expect(addBench(asLead(), call(9), { meetId })).rejects.toMatchObject({
      code: 'wrong-move',
    });
    await expect(
      addBench(asLead(), call(10), { meetId: fixedId('meet', 9) }),
    ).rejects.toMatchObject({
      code: 'not-found',
    });
  });

  it('says where a tester stands that is wanted elsewhere, in this meet and in another', async () => {
    const benchId = world.otherBench.id;
    await expect(setBenchTester(asLead(), call(1), { benchId, testerId })).rejects.toMatchObject({
      code: 'conflict',
      message: 'T-01 stands on bench 1. A tester feeds one bench: take it off there first.',
    });
    const other = await makeMeet(store.db, {
      id: fixedId('meet', 2),
      slug: 'other',
      name: 'Other',
      benches: 0,
    });
    const added = await addBench(asLead(), call(2), { meetId: other.meet.id });
    await expect(
      setBenchTester(asLead(), call(3), { benchId: added.benchId, testerId }),
    ).rejects.toMatchObject({
      message:
        'T-01 stands on bench 1 of Test Meet. A tester feeds one bench: take it off there first.',
    });
  });

  it('moves a tester by way of none, and tells bench, line and connections', async () => {
    await setBenchTester(asLead(), call(1), { benchId: world.bench.id, testerId: null });
    await setBenchTester(asLead(), call(2), { benchId: world.otherBench.id, testerId });
    expect((await bench(world.bench.id)).testerId).toBeNull();
    expect((await bench(world.otherBench.id)).testerId).toBe(testerId);
    expect(store.published[1]!.events).toEqual([
      { kind: 'line', meetId },
      { kind: 'bench', benchId: world.otherBench.id },
      { kind: 'testers' },
    ]);
  });

  it('leaves the tester of a running check where it is', async () => {
    await checkOnBench(asLead(), world.bench.id, world.tag.id);
    await makeTester(store.db, { id: fixedId('tester', 2), name: 'T-02' });
    for (const wanted of [null, fixedId('tester', 2)]) {
      await expect(
        setBenchTester(asLead(), call(1), { benchId: world.bench.id, testerId: wanted }),
      ).rejects.toMatchObject({ code: 'wrong-move' });
    }
    await expect(
      setBenchTester(asLead(), call(2), { benchId: world.otherBench.id, testerId }),
    ).rejects.toMatchObject({ message: 'T-01 stands on bench 1, where a check is running.' });
    expect((await bench(world.bench.id)).testerId).toBe(testerId);
  });

  it('raises the version of the plan with each change, and only then', async () => {
    const plan = {
      meetId,
      scheme: 'short' as const,
      basis: 'set' as const,
      guard: '0.83',
      readingsPerPoint: '4',
    };
    expect(await changePlan(asLead(), call(1), plan)).toMatchObject({ version: 2 });
    expect(await changePlan(asLead(), call(2), plan)).toMatchObject({ version: 2 });
    expect(await changePlan(asLead(), call(3), { ...plan, guard: 1 })).toMatchObject({
      version: 3,
    });
    const [row] = await store.db.select().from(meets).where(eq(meets.id, meetId));
    expect(row!.planSettings).toEqual({
      version: 3,
      scheme: 'short',
      basis: 'set',
      guard: 1,
      overrides: { exercisePulls: null, readingsPerPoint: 4 },
    });
  });

  it.each([
    ['a guard band of its own making', { guard: 0.5 }, 'guard'],
    ['half a reading', { readingsPerPoint: 2.5 }, 'readingsPerPoint'],
    ['no reading at all', { readingsPerPoint: 0 }, 'readingsPerPoint'],
    ['an unknown sequence', { scheme: 'working' }, 'scheme'],
  ])('refuses a plan with %s', async (_what, change, field) => {
    const input: unknown = { meetId, scheme: 'short', basis: 'set', guard: 1, ...change };
    const refusal = await changePlan
      .fromWire(asLead(), call(1), input)
      .catch((error: unknown) => error);
    expect(refusal).toMatchObject({
      code: 'invalid',
      extra: { fields: { [field]: expect.any(String) } },
    });
  });
});
