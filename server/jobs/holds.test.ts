import { beforeEach, expect, it } from 'vitest';
import { makeTag, makeWorld } from '@/tests/support/factories';
import { testStore, type TestStore } from '@/tests/support/store';
import { endedHolds } from './holds';

let store: TestStore;

beforeEach(async () => {
  store = await testStore();
  await store.reset();
});

it('tells the tag, its line and the benches once, when the hold has run out', async () => {
  const world = await makeWorld(store.db);
  const minute = (count: number) => new Date(store.now.getTime() + count * 60_000);
  const held = await makeTag(store.db, 2, { heldUntil: minute(10) });
  expect(await endedHolds(store.db, minute(0), minute(9))).toEqual([]);
  expect(await endedHolds(store.db, minute(9), minute(10))).toEqual([
    { kind: 'tag', tagId: held.id },
    { kind: 'line', meetId: world.meet.id },
    { kind: 'bench', benchId: world.bench.id },
    { kind: 'bench', benchId: world.otherBench.id },
  ]);
  expect(await endedHolds(store.db, minute(10), minute(11))).toEqual([]);
});
