import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { beforeEach, describe, expect, it } from 'vitest';
import { benches } from '@/db/schema';
import { actorOf, fixedId, makeStaff, makeWorld } from '@/tests/support/factories';
import { codeOf } from '@/tests/support/line';
import { testStore, type TestStore } from '@/tests/support/store';
import { leaveBench } from './leave';
import { closeBench, openBench, pauseBench } from './set-state';
import { takeBench } from './take';

let store: TestStore;
let world: Awaited<ReturnType<typeof makeWorld>>;

beforeEach(async () => {
  store = await testStore();
  await store.reset();
  world = await makeWorld(store.db);
});

const operator = () => store.contextFor(actorOf(world.staff.operator));
const lead = () => store.contextFor(actorOf(world.staff.lead));
const benchNow = async () =>
  (await store.db.select().from(benches).where(eq(benches.id, world.bench.id)))[0]!;

describe('a bench that somebody works at', () => {
  it('is not taken or freed by another operator, but by a lead', async () => {
    const benchId = world.bench.id;
    await takeBench(operator(), uuidv7(), { benchId });
    const second = await makeStaff(store.db, 'operator', {
      id: fixedId('staff', 7),
      login: 'second',
    });
    const other = store.contextFor(actorOf(second));
    expect(await codeOf(takeBench(other, uuidv7(), { benchId }))).toBe('conflict');
    expect(await codeOf(leaveBench(other, uuidv7(), { benchId }))).toBe('forbidden');
    expect((await benchNow()).operatorId).toBe(world.staff.operator.id);
    await leaveBench(lead(), uuidv7(), { benchId });
    expect((await benchNow()).operatorId).toBeNull();
  });
});

describe('a bench that a lead closed', () => {
  it('is neither opened nor paused by an operator', async () => {
    const benchId = world.bench.id;
    expect(await codeOf(closeBench(operator(), uuidv7(), { benchId }))).toBe('forbidden');
    await closeBench(lead(), uuidv7(), { benchId });
    expect(await codeOf(openBench(operator(), uuidv7(), { benchId }))).toBe('forbidden');
    expect(await codeOf(pauseBench(operator(), uuidv7(), { benchId }))).toBe('forbidden');
    await openBench(lead(), uuidv7(), { benchId });
    await pauseBench(operator(), uuidv7(), { benchId, reason: 'Weather' });
    await openBench(operator(), uuidv7(), { benchId });
    expect((await benchNow()).state).toBe('open');
  });
});
