import { beforeEach, describe, expect, it } from 'vitest';
import { actorOf, makeStaff, makeWorld, TEST_PASSWORD } from '@/tests/support/factories';
import { fixedId } from '@/tests/support/factories';
import { testStore } from '@/tests/support/store';
import { signIn } from '@/server/commands/session/sign-in';
import { signOut } from '@/server/commands/session/sign-out';
import { checkSetUpCode } from './set-up-code';
import { checkPassword } from './sign-in';
import { forgetTries } from './tries';

describe('signing in', async () => {
  const store = await testStore();
  let world: Awaited<ReturnType<typeof makeWorld>>;
  const tryIn = (login: string, password: string, address = '192.0.2.1') =>
    checkPassword(store.db, { login, password, address });
  const refusal = (work: Promise<unknown>) =>
    work.then(
      () => null,
      (error: unknown) => error,
    );
  beforeEach(async () => {
    forgetTries();
    await store.reset();
    world = await makeWorld(store.db);
  });

  it('takes name and password, whatever the case of the name', async () => {
    expect(await tryIn(' Operator ', TEST_PASSWORD)).toBe(world.staff.operator.id);
  });

  it('answers an unknown name, a wrong password and a switched-off account alike', async () => {
    await makeStaff(store.db, 'lead', { id: fixedId('staff', 7), login: 'former', active: false });
    const refusals = await Promise.all([
      refusal(tryIn('nobody', TEST_PASSWORD)),
      refusal(tryIn('operator', 'wrong')),
      refusal(tryIn('former', TEST_PASSWORD)),
      refusal(tryIn('', '')),
    ]);
    for (const one of refusals) {
      expect(one).toMatchObject({
        code: 'sign-in',
        message: 'This name and password do not belong together.',
      });
    }
  });

  it('shuts a name after ten wrong passwords, for everybody and with the right one too', async () => {
    for (let count = 0; count < 10; count += 1) {
      await refusal(tryIn('operator', 'wrong', `192.0.2.${count}`));
    }
    expect(await refusal(tryIn('operator', TEST_PASSWORD, '192.0.2.99'))).toMatchObject({
      code: 'too-many',
    });
    expect(await tryIn('lead', TEST_PASSWORD)).toBe(world.staff.lead.id);
  });

  it('shuts an address that tries many names', async () => {
    for (let count = 0; count < 40; count += 1) await refusal(tryIn(`name-${count}`, ''));
    expect(await refusal(tryIn('lead', TEST_PASSWORD))).toMatchObject({ code: 'too-many' });
    expect(await tryIn('lead', TEST_PASSWORD, '192.0.2.2')).toBe(world.staff.lead.id);
  });

  it('forgets the wrong tries of a name once its password was right', async () => {
    for (let round = 0; round < 3; round += 1) {
      for (let count = 0; count < 9; count += 1)
        await refusal(tryIn('operator', 'wrong', `192.0.2.${count}`));
      await tryIn('operator', TEST_PASSWORD);
    }
  });

  it('records who came and went, and ends live connections at going', async () => {
    const { operator } = world.staff;
    const entered = await signIn(store.contextFor({ kind: 'public' }), fixedId('call', 1), {
      staffId: operator.id,
    });
    expect(entered).toEqual({ staffId: operator.id, sessionVersion: 1, role: 'operator' });
    await signOut(store.contextFor(actorOf(operator)), fixedId('call', 2), {});
    expect(store.published.map(({ events }) => events)).toEqual([
      [{ kind: 'staff', staffId: operator.id }],
    ]);
  });

  it('lets nobody in whose account was switched off in between', async () => {
    await makeStaff(store.db, 'lead', { id: fixedId('staff', 7), login: 'former', active: false });
    await expect(
      signIn(store.contextFor({ kind: 'public' }), fixedId('call', 1), {
        staffId: fixedId('staff', 7),
      }),
    ).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('takes the set-up code in any case and spacing, and counts wrong ones', async () => {
    await checkSetUpCode('ABCD-EF34', ' abcdef34');
    for (let count = 0; count < 9; count += 1) {
      expect(await refusal(checkSetUpCode('ABCD-EF34', 'ABCD-EF35'))).toMatchObject({
        code: 'invalid',
        extra: { fields: { setupCode: expect.any(String) } },
      });
    }
    expect(await refusal(checkSetUpCode('ABCD-EF34', 'ABCD-EF34'))).toMatchObject({
      code: 'too-many',
    });
  });
});
