import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { benches, tags } from '@/db/schema';
import { fixedId, makeTag, makeWorld } from '@/tests/support/factories';
import { TEST_NOW, TEST_SECRET, testStore, type TestStore } from '@/tests/support/store';
import { benchChoices } from './list';
import { findTag } from './find-tag';
import { benchSnapshot } from './snapshot';
import { testerOfBench } from './tester';

let store: TestStore;
beforeEach(async () => {
  store = await testStore();
  await store.reset();
  await makeWorld(store.db);
});

describe('benchChoices', () => {
  it('lists the benches of a meet that is on, with who and what is at each', async () => {
    await store.db
      .update(benches)
      .set({ operatorId: fixedId('staff', 1) })
      .where(eq(benches.id, fixedId('bench', 1)));
    await store.db
      .update(tags)
      .set({ state: 'called', benchId: fixedId('bench', 1) })
      .where(eq(tags.id, fixedId('tag', 1)));
    const [meet] = await benchChoices(store.db, TEST_NOW);
    expect(meet?.benches).toEqual([
      {
        id: fixedId('bench', 1),
        number: 1,
        state: 'open',
        operator: { id: fixedId('staff', 1), name: 'Olive Pike' },
        tester: 'T-01',
        tagCode: 'A01',
      },
      expect.objectContaining({ number: 2, operator: null, tester: null, tagCode: null }),
    ]);
  });

  it('counts the night to the day before it, and leaves out a meet that is over', async () => {
    // 02:30 in London on the 15th still belongs to the 14th, the last day.
    expect(await benchChoices(store.db, new Date('2026-06-15T01:30:00Z'))).toHaveLength(1);
    expect(await benchChoices(store.db, new Date('2026-06-15T05:30:00Z'))).toHaveLength(0);
    expect(await benchChoices(store.db, new Date('2026-06-11T20:00:00Z'))).toHaveLength(0);
  });
});

describe('findTag', () => {
  it('finds a tag of the own meet by its code, and no other', async () => {
    expect(await findTag(store.db, fixedId('bench', 1), 'A01')).toMatchObject({
      code: 'A01',
      benchNumber: null,
    });
    expect(await findTag(store.db, fixedId('bench', 1), 'A02')).toBeNull();
    expect(await findTag(store.db, fixedId('bench', 9), 'A01')).toBeNull();
  });

  it('says on which bench the tool lies', async () => {
    await makeTag(store.db, 2, {
      state: 'on_bench',
      place: 'bench',
      benchId: fixedId('bench', 2),
    });
    const found = await findTag(store.db, fixedId('bench', 1), 'A02');
    expect(found?.benchNumber).toBe(2);
  });
});

describe('benchSnapshot', () => {
  const read = () =>
    benchSnapshot(
      {
        reader: store.db,
        now: TEST_NOW,
        secret: TEST_SECRET,
        instruments: { status: () => null },
      },
      fixedId('bench', 1),
    );

  it('gives the whole description of the tool that lies there, and of none that does not', async () => {
    expect((await read())?.tool).toBeNull();
    await store.db
      .update(tags)
      .set({
        state: 'on_bench',
        place: 'bench',
        benchId: fixedId('bench', 1),
        workingPoints: [110, 200],
      })
      .where(eq(tags.id, fixedId('tag', 1)));
    expect((await read())?.tool).toMatchObject({
      toolClass: 'II-A',
      rangeMin: 60,
      rangeMax: 340,
      claim: { of: 'reading', cwPercent: 4 },
      workingPoints: [110, 200],
    });
  });

  it('tells the tester’s range and the plan of the meet, for the plan that the form shows', async () => {
    const snapshot = await read();
    expect(snapshot?.tester).toMatchObject({ minNm: 10, maxNm: 500, barred: [] });
    expect(snapshot?.meet.plan.scheme).toBe('iso-2003');
  });
});

describe('testerOfBench', () => {
  it('tells a bench without a tester from no bench', async () => {
    expect(await testerOfBench(store.db, fixedId('bench', 1))).toEqual({
      testerId: fixedId('tester'),
    });
    expect(await testerOfBench(store.db, fixedId('bench', 2))).toEqual({ testerId: null });
    expect(await testerOfBench(store.db, fixedId('bench', 9))).toBeUndefined();
  });
});
