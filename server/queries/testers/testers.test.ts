import { beforeEach, describe, expect, it } from 'vitest';
import { eq } from 'drizzle-orm';
import { benches, testers } from '@/db/schema';
import {
  fixedId,
  makeCertificate,
  makeMeet,
  makeProof,
  makeTester,
  makeWorld,
} from '@/tests/support/factories';
import { TEST_NOW, testStore } from '@/tests/support/store';
import { benchList, testerChoices } from '@/server/queries/benches/list';
import { meetList } from '@/server/queries/meets/list';
import { testerList } from './list';
import { testerPage } from './page';

const HOUR_MS = 3_600_000;

describe('what the desk reads of testers, benches and meets', async () => {
  const store = await testStore();
  const instruments = {
    status: () => ({ state: 'lost' as const, since: TEST_NOW, message: 'The cable is out.' }),
  };
  const page = (testerId: string, now = TEST_NOW) =>
    testerPage({ reader: store.db, now, instruments }, testerId);
  let world: Awaited<ReturnType<typeof makeWorld>>;
  beforeEach(async () => {
    await store.reset();
    world = await makeWorld(store.db);
  });

  it('says what a tester rests on, and that it may judge', async () => {
    expect(await testerList(store.db, TEST_NOW)).toMatchObject([
      {
        name: 'T-01',
        range: '10–500 N·m',
        bench: 'bench 1 of Test Meet',
        certificate: 'certificate to 14 Mar 2027',
        proof: 'proved 08:30 at 100 N·m',
        barred: [],
      },
    ]);
  });

  it('counts the day as the meet does: it starts at four, not at midnight', async () => {
    const lateNight = new Date('2026-06-14T02:30:00Z');
    expect((await page(world.tester.id, lateNight))!.proofs[0]!.today).toBe(true);
    const morning = new Date(lateNight.getTime() + HOUR_MS);
    const nextDay = await page(world.tester.id, morning);
    expect(nextDay!.proofs[0]!.today).toBe(false);
    expect(nextDay!.barred).toEqual(['the tester was not proved today']);
  });

  it('shows the certificate that holds, and the older one below it', async () => {
    await makeCertificate(store.db, {
      id: fixedId('certificate', 2),
      number: 'C-2025',
      issuedOn: '2025-03-14',
      dueOn: '2026-03-14',
    });
    const { certificates } = (await page(world.tester.id))!;
    expect(certificates.map(({ number, holds, ended }) => [number, holds, ended])).toEqual([
      ['C-2026-0117', true, false],
      ['C-2025', false, true],
    ]);
  });

  it('lets no certificate hold once it is out of date', async () => {
    const after = new Date('2027-03-15T09:00:00Z');
    const tester = (await page(world.tester.id, after))!;
    expect(tester.certificates[0]).toMatchObject({ holds: false, ended: true });
    expect(tester.barred).toContain('the tester has no certificate that is valid today');
  });

  it('lists the newest thirty proofs, and says that there are more', async () => {
    for (let number = 2; number <= 31; number += 1) {
      const at = new Date(TEST_NOW.getTime() - number * 24 * HOUR_MS);
      await makeProof(store.db, {
        id: fixedId('proof', number),
        at,
        readingNm: 99.4,
        result: 'failed',
      });
    }
    const { proofs, moreProofs } = (await page(world.tester.id))!;
    expect(proofs).toHaveLength(30);
    expect(moreProofs).toBe(true);
    expect(proofs[1]).toMatchObject({ result: 'failed', error: '−0.60 %', by: 'Lena Marsh' });
  });

  it('knows the connection of a tester on a bench only', async () => {
    expect((await page(world.tester.id))!.status).toEqual({
      state: 'lost',
      words: 'The cable is out.',
    });
    await store.db.update(benches).set({ testerId: null }).where(eq(benches.id, world.bench.id));
    expect(await page(world.tester.id)).toMatchObject({ status: null, bench: null });
  });

  it.each(['no-id', fixedId('tester', 9)])('finds no tester of %s', async (testerId) => {
    expect(await page(testerId)).toBeNull();
  });

  it('says for each bench why it would judge nothing', async () => {
    await store.db.update(testers).set({ lockedReason: 'Dropped.' });
    expect(await benchList(store.db, world.meet.id, TEST_NOW)).toMatchObject([
      { number: 1, tester: 'T-01', barred: ['the tester is locked'], busy: false },
      { number: 2, tester: null, barred: ['no tester stands on this bench'] },
    ]);
  });

  it('says where each tester stands', async () => {
    await makeTester(store.db, { id: fixedId('tester', 2), name: 'T-02' });
    expect(await testerChoices(store.db)).toMatchObject([
      { name: 'T-01', where: 'bench 1 of Test Meet' },
      { name: 'T-02', where: null },
    ]);
  });

  it('puts the meet that is on first, then the newest', async () => {
    const later = { startsOn: '2026-09-01', endsOn: '2026-09-02' };
    const earlier = { startsOn: '2026-04-01', endsOn: '2026-04-01' };
    await makeMeet(store.db, { id: fixedId('meet', 2), slug: 'later', benches: 0, ...later });
    await makeMeet(store.db, { id: fixedId('meet', 3), slug: 'earlier', benches: 0, ...earlier });
    const list = await meetList(store.db, TEST_NOW);
    expect(list.map(({ slug, isOn, benches: count }) => [slug, isOn, count])).toEqual([
      ['test-meet', true, 2],
      ['later', false, 0],
      ['earlier', false, 0],
    ]);
    expect(list[2]!.days).toBe('1 Apr 2026');
  });
});
