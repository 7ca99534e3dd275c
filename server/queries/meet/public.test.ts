import { beforeEach, describe, expect, it } from 'vitest';
import { meets } from '@/db/schema';
import { fixedId, makeMeet, makePost } from '@/tests/support/factories';
import { testStore } from '@/tests/support/store';
import { meetBySlug, meetsOnNow } from './public';

describe('the meets that everybody may see', async () => {
  const store = await testStore();
  beforeEach(async () => {
    await store.reset();
    await makePost(store.db);
    await makeMeet(store.db, { benches: 1 });
  });

  it('are on from the first service day to the last, in their own zone', async () => {
    const on = async (instant: string) =>
      (await meetsOnNow(store.db, new Date(instant))).now.map(({ slug }) => slug);
    // Days start at 04:00, London is an hour ahead of UTC in June.
    expect(await on('2026-06-12T02:59:00Z')).toEqual([]);
    expect(await on('2026-06-12T03:00:00Z')).toEqual(['test-meet']);
    expect(await on('2026-06-15T02:59:00Z')).toEqual(['test-meet']);
    expect(await on('2026-06-15T03:00:00Z')).toEqual([]);
  });

  it('name what is to come', async () => {
    const [meet] = await store.db.select().from(meets);
    const later = { id: fixedId('meet', 2), slug: 'later', startsOn: '2026-08-01' };
    await store.db.insert(meets).values({ ...meet!, ...later, endsOn: '2026-08-01' });
    const { now, coming } = await meetsOnNow(store.db, store.now);
    expect(now.map(({ slug }) => slug)).toEqual(['test-meet']);
    expect(coming).toMatchObject([{ slug: 'later', days: '1 Aug 2026' }]);
  });

  it('are found by their slug, with nothing else of the row', async () => {
    const meet = await meetBySlug(store.db, 'test-meet');
    expect(meet).toEqual({
      id: fixedId('meet'),
      slug: 'test-meet',
      name: 'Test Meet',
      place: 'Fallow Field',
      timeZone: 'Europe/London',
      joinOpen: true,
      days: '12 Jun 2026 to 14 Jun 2026',
    });
    expect(await meetBySlug(store.db, 'nowhere')).toBeNull();
  });
});
