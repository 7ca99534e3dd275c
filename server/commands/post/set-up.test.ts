import { beforeEach, describe, expect, it } from 'vitest';
import { benches, commandRuns, ledger, meets, posts, staff } from '@/db/schema';
import { verifyPassword } from '@/server/access/password';
import { fixedId, TEST_PASSWORD, TEST_PASSWORD_HASH } from '@/tests/support/factories';
import { testStore } from '@/tests/support/store';
import { setUpPost } from './set-up';

const input = {
  post: { name: 'Test Post', shortName: 'tp' },
  owner: { name: 'Oswin Hale', login: ' Oswin ', passwordHash: TEST_PASSWORD_HASH },
  meet: {
    name: 'Café Meet 2026',
    place: 'Long Acre',
    startsOn: '2026-07-03',
    endsOn: '2026-07-05',
    timeZone: 'Europe/London',
    benches: '3',
  },
};
const id = fixedId('call');

describe('post.set-up', async () => {
  const store = await testStore();
  const ctx = store.contextFor({ kind: 'public' });
  beforeEach(() => store.reset());

  it('makes the post, its owner and its first meet', async () => {
    const result = await setUpPost(ctx, id, input);
    const [owner] = await store.db.select().from(staff);
    expect(owner).toMatchObject({
      id: result.staffId,
      login: 'oswin',
      role: 'owner',
      active: true,
    });
    expect(await verifyPassword(owner!.passwordHash, TEST_PASSWORD)).toBe(true);
    expect(await store.db.select().from(posts)).toMatchObject([{ shortName: 'TP' }]);
    expect(await store.db.select().from(meets)).toMatchObject([
      { id: result.meetId, slug: 'cafe-meet-2026', joinOpen: true, dayStartHour: 4 },
    ]);
    const numbers = (await store.db.select().from(benches)).map(({ number }) => number);
    expect(numbers.sort()).toEqual([1, 2, 3]);
  });

  it('keeps no name, sign-in name or hash in the ledger or the results of commands', async () => {
    await setUpPost(ctx, id, input);
    const kept = JSON.stringify([
      await store.db.select().from(ledger),
      await store.db.select().from(commandRuns),
    ]);
    for (const secret of ['Oswin', 'oswin', TEST_PASSWORD_HASH]) expect(kept).not.toContain(secret);
  });

  it('is done once, and again gives what was done', async () => {
    const first = await setUpPost(ctx, id, input);
    expect(await setUpPost(ctx, id, input)).toEqual(first);
    await expect(setUpPost(ctx, fixedId('call', 2), input)).rejects.toMatchObject({
      code: 'wrong-move',
    });
    expect(await store.db.select().from(posts)).toHaveLength(1);
  });

  it('lets one of two at the same moment in', async () => {
    const outcomes = await Promise.allSettled([
      setUpPost(ctx, id, input),
      setUpPost(ctx, fixedId('call', 2), input),
    ]);
    expect(outcomes.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(await store.db.select().from(staff)).toHaveLength(1);
  });

  it('names every field that cannot be used, and writes nothing', async () => {
    const bad = {
      post: { name: '', shortName: 'T1' },
      owner: { name: 'x'.repeat(10_000), login: 'A B', passwordHash: 'quiet-paddock-42' },
      meet: { ...input.meet, endsOn: '2026-07-01', timeZone: '+01:00', benches: 9 },
    };
    const refusal: unknown = await setUpPost(ctx, id, bad).catch((error: unknown) => error);
    expect(refusal).toMatchObject({ code: 'invalid' });
    expect(Object.keys((refusal as { extra: { fields: object } }).extra.fields).sort()).toEqual([
      'meet.benches',
      'meet.endsOn',
      'meet.timeZone',
      'owner.login',
      'owner.name',
      'owner.passwordHash',
      'post.name',
      'post.shortName',
    ]);
    expect(await store.db.select().from(posts)).toEqual([]);
  });

  it('refuses days that are the wrong way round', async () => {
    const meet = { ...input.meet, endsOn: '2026-07-01' };
    await expect(setUpPost(ctx, id, { ...input, meet })).rejects.toMatchObject({
      extra: { fields: { 'meet.endsOn': 'The last day is before the first.' } },
    });
  });
});
