import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { benches, staff } from '@/db/schema';
import { standingOf as currentStanding } from '@/server/access/standing';
import {
  actorOf,
  fixedId,
  makeStaff,
  makeWorld,
  TEST_PASSWORD_HASH,
} from '@/tests/support/factories';
import { testStore } from '@/tests/support/store';
import { addStaff } from './add';
import { changeStaff } from './change';
import { setPassword } from './set-password';

const id = fixedId('call');
const OTHER_HASH = TEST_PASSWORD_HASH.replace('$8+', '$9+');

describe('the staff', async () => {
  const store = await testStore();
  let world: Awaited<ReturnType<typeof makeWorld>>;
  const asOwner = () => store.contextFor(actorOf(world.staff.owner));
  const person = async (staffId: string) =>
    (await store.db.select().from(staff).where(eq(staff.id, staffId)))[0]!;
  beforeEach(async () => {
    await store.reset();
    world = await makeWorld(store.db);
  });

  it('refuses a sign-in name that is taken, in any case', async () => {
    const input = {
      name: 'Ada Fell',
      login: 'LEAD',
      role: 'lead' as const,
      passwordHash: TEST_PASSWORD_HASH,
    };
    await expect(addStaff(asOwner(), id, input)).rejects.toMatchObject({
      code: 'invalid',
      extra: { fields: { login: expect.stringContaining('already') } },
    });
  });

  it('never takes a password for a hash', async () => {
    const input = { name: 'Ada', login: 'ada', role: 'lead' as const, passwordHash: 'plain words' };
    await expect(addStaff(asOwner(), id, input)).rejects.toMatchObject({ code: 'invalid' });
  });

  it('keeps the last owner who can sign in', async () => {
    const staffId = world.staff.owner.id;
    for (const change of [{ active: false }, { role: 'lead' as const }]) {
      await expect(changeStaff(asOwner(), id, { staffId, ...change })).rejects.toMatchObject({
        code: 'wrong-move',
        message: expect.stringContaining('last owner'),
      });
    }
    await makeStaff(store.db, 'owner', { id: fixedId('staff', 8), login: 'second', active: false });
    await expect(changeStaff(asOwner(), id, { staffId, active: false })).rejects.toMatchObject({
      code: 'wrong-move',
    });
    await changeStaff(asOwner(), id, { staffId: fixedId('staff', 8), active: true });
    await changeStaff(asOwner(), fixedId('call', 2), { staffId, role: 'operator' });
    expect((await person(staffId)).role).toBe('operator');
  });

  it('lets one of two owners who switch each other off at the same moment win', async () => {
    const second = await makeStaff(store.db, 'owner', { id: fixedId('staff', 8), login: 'second' });
    const outcomes = await Promise.allSettled([
      changeStaff(asOwner(), id, { staffId: second.id, active: false }),
      changeStaff(store.contextFor(actorOf(second)), id, {
        staffId: world.staff.owner.id,
        active: false,
      }),
    ]);
    expect(outcomes.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
  });

  it('ends the sessions of somebody who is switched off, for good, and frees the bench', async () => {
    const { operator } = world.staff;
    await store.db
      .update(benches)
      .set({ operatorId: operator.id })
      .where(eq(benches.id, world.bench.id));
    await changeStaff(asOwner(), id, { staffId: operator.id, active: false });
    await changeStaff(asOwner(), fixedId('call', 2), { staffId: operator.id, active: true });
    await expect(currentStanding(store.db, actorOf(operator))).rejects.toMatchObject({
      code: 'sign-in',
    });
    const [bench] = await store.db.select().from(benches).where(eq(benches.id, world.bench.id));
    expect(bench!.operatorId).toBeNull();
    expect(store.published[0]!.events).toEqual([
      { kind: 'staff', staffId: operator.id },
      { kind: 'line', meetId: world.meet.id },
      { kind: 'bench', benchId: world.bench.id },
    ]);
  });

  it('ends every session with a new password', async () => {
    const { lead } = world.staff;
    const { sessionVersion } = await setPassword(asOwner(), id, {
      staffId: lead.id,
      passwordHash: OTHER_HASH,
    });
    expect((await person(lead.id)).passwordHash).toBe(OTHER_HASH);
    await expect(currentStanding(store.db, actorOf(lead))).rejects.toMatchObject({
      code: 'sign-in',
    });
    expect(await currentStanding(store.db, actorOf({ ...lead, sessionVersion }))).toBe('lead');
    expect(store.published.map(({ events }) => events)).toEqual([
      [{ kind: 'staff', staffId: lead.id }],
    ]);
  });

  it('knows nobody by a foreign id', async () => {
    const staffId = fixedId('staff', 99);
    await expect(changeStaff(asOwner(), id, { staffId, active: false })).rejects.toMatchObject({
      code: 'not-found',
    });
  });
});
