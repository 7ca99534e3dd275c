import { beforeEach, describe, expect, it } from 'vitest';
import { ledger } from '@/db/schema';
import { callTag } from '@/server/commands/tag/call';
import { moveInLine } from '@/server/commands/tag/move';
import { withdrawTag } from '@/server/commands/tag/withdraw';
import { actorOf, fixedId, makeTag, makeWorld } from '@/tests/support/factories';
import { TEST_NOW, testStore, type TestStore } from '@/tests/support/store';
import { ENTRIES_A_PAGE, ledgerPage } from './page';

let store: TestStore;
let world: Awaited<ReturnType<typeof makeWorld>>;

beforeEach(async () => {
  store = await testStore();
  await store.reset();
  world = await makeWorld(store.db);
});

describe('ledgerPage', () => {
  it('tells who did what, the newest first', async () => {
    const second = await makeTag(store.db, 2);
    const lead = store.contextFor(actorOf(world.staff.lead));
    await moveInLine(lead, fixedId('call', 1), {
      tagId: second.id,
      place: 1,
      reason: 'Leaves at noon',
    });
    await callTag(store.contextFor(actorOf(world.staff.operator)), fixedId('call', 2), {
      benchId: world.bench.id,
      tagId: world.tag.id,
    });
    await withdrawTag(store.contextFor({ kind: 'visitor', tagId: second.id }), fixedId('call', 3), {
      tagId: second.id,
    });
    const page = await ledgerPage(store.db, { meetId: world.meet.id });
    expect(page.rows.map(({ who, what, tagCode }) => [who, what, tagCode])).toEqual([
      ['Visitor', 'Withdrew', 'A02'],
      ['Olive Pike', 'Called', 'A01'],
      ['Lena Marsh', 'Moved in the line', 'A02'],
    ]);
    expect(page.rows[2]!.detail).toContain('reason Leaves at noon');
    expect(page).toMatchObject({ older: null, isNewest: true });

    const one = await ledgerPage(store.db, { meetId: world.meet.id, tagCode: 'A01' });
    expect(one.rows.map((row) => row.what)).toEqual(['Called']);
    expect((await ledgerPage(store.db, { meetId: world.meet.id, tagCode: 'B09' })).rows).toEqual(
      [],
    );
  });

  it('goes through a long ledger page by page, and shows each entry once', async () => {
    const total = 2 * ENTRIES_A_PAGE + 7;
    await store.db.insert(ledger).values(
      Array.from({ length: total }, () => ({
        at: TEST_NOW,
        actor: 'job:tests',
        command: 'tag.call',
        meetId: world.meet.id,
        detail: {},
      })),
    );
    const seen: number[] = [];
    let before: number | null = null;
    for (let round = 0; round < 3; round += 1) {
      const page = await ledgerPage(store.db, { meetId: world.meet.id, before });
      expect(page.isNewest).toBe(round === 0);
      seen.push(...page.rows.map((row) => row.sequence));
      before = page.older;
    }
    expect(before).toBeNull();
    expect(seen).toEqual([...seen].sort((a, b) => b - a));
    expect(new Set(seen).size).toBe(total);
  });

  it('keeps what belongs to no meet apart', async () => {
    await store.db.insert(ledger).values([
      { at: TEST_NOW, actor: `staff:${world.staff.owner.id}`, command: 'staff.add', detail: {} },
      { at: TEST_NOW, actor: 'public', command: 'tag.join', meetId: world.meet.id, detail: {} },
    ]);
    const page = await ledgerPage(store.db, { meetId: null });
    expect(page.rows.map(({ who, what }) => [who, what])).toEqual([
      ['Oswin Hale', 'Added an account'],
    ]);
  });
});
