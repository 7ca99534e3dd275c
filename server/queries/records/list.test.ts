import { v7 as uuidv7 } from 'uuid';
import { beforeEach, expect, it } from 'vitest';
import { records } from '@/db/schema';
import { signOff } from '@/server/commands/check/sign-off';
import { stopEarly } from '@/server/commands/check/stop-early';
import { hangTool } from '@/server/commands/tag/hang';
import { ledgerPage } from '@/server/queries/ledger/page';
import { recordOfToken } from '@/server/queries/record/by-token';
import { actorOf, fixedId, makeTag, makeWorld } from '@/tests/support/factories';
import { checkOnBench } from '@/tests/support/line';
import { TEST_SECRET, testStore, type TestStore } from '@/tests/support/store';
import { recordsOfMeet } from './list';

let store: TestStore;
let world: Awaited<ReturnType<typeof makeWorld>>;

beforeEach(async () => {
  store = await testStore();
  await store.reset();
  world = await makeWorld(store.db);
});

/** Two signed checks, a minute apart: A01, then A02. */
async function signTwo(): Promise<void> {
  const second = await makeTag(store.db, 2);
  const operator = store.contextFor(actorOf(world.staff.operator));
  for (const tag of [world.tag, second]) {
    const checkId = await checkOnBench(operator, world.bench.id, tag.id);
    await stopEarly(operator, uuidv7(), { checkId, reason: 'Rain' });
    await signOff(operator, uuidv7(), { checkId });
    await hangTool(operator, uuidv7(), { tagId: tag.id });
    store.now = new Date(store.now.getTime() + 60_000);
  }
}

it('lists the newest first, as they were signed, with links that open them', async () => {
  await signTwo();
  const page = await recordsOfMeet(store.db, TEST_SECRET, world.meet.id);
  expect(page).toMatchObject({ total: 2, page: 1, pages: 1 });
  expect(page.rows.map(({ number, tagCode }) => [number, tagCode])).toEqual([
    ['TP-2026-0002', 'A02'],
    ['TP-2026-0001', 'A01'],
  ]);
  expect(page.rows[0]).toMatchObject({
    tool: 'Click wrench · 60–340 N·m',
    verdict: (await store.db.select().from(records))[0]!.verdict,
  });
  const token = page.rows[0]!.path.replace('/r/', '');
  expect((await recordOfToken(store.db, token))?.number).toBe('TP-2026-0002');
});

it('keeps a page in range, and other meets apart', async () => {
  await signTwo();
  expect((await recordsOfMeet(store.db, TEST_SECRET, world.meet.id, 99)).page).toBe(1);
  expect((await recordsOfMeet(store.db, TEST_SECRET, world.meet.id, -3)).rows).toHaveLength(2);
  expect(await recordsOfMeet(store.db, TEST_SECRET, fixedId('meet', 7))).toMatchObject({
    total: 0,
    rows: [],
  });
});

it('finds the checks of a tag in the ledger by its code', async () => {
  await signTwo();
  const { rows } = await ledgerPage(store.db, { meetId: world.meet.id, tagCode: 'A02' });
  expect(rows.map((row) => row.what)).toEqual([
    'Hung on a peg',
    'Signed off',
    'Ended the pulls early',
    'Started the check',
    'Took on the bench',
    'Called',
  ]);
});
