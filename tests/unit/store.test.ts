import { verify } from '@node-rs/argon2';
import { beforeEach, describe, expect, it } from 'vitest';
import { eq } from 'drizzle-orm';
import { benches, ledger, pulls, staff, tags } from '@/db/schema';
import { callTag } from '@/server/commands/tag/call';
import { testerToday } from '@/server/queries/tester/standing';
import {
  actorOf,
  fixedId,
  makeWorld,
  TEST_PASSWORD,
  TEST_PASSWORD_HASH,
} from '../support/factories';
import { TEST_NOW, testStore } from '../support/store';

describe('the test store', async () => {
  const store = await testStore();
  beforeEach(() => store.reset());

  it('makes a post that can work', async () => {
    const world = await makeWorld(store.db);
    const today = await testerToday(store.db, world.tester.id, world.meet, TEST_NOW);
    expect(today?.barred).toEqual([]);
    const called = await callTag(store.contextFor(actorOf(world.staff.operator)), fixedId('call'), {
      benchId: world.bench.id,
    });
    expect(called).toMatchObject({ code: 'A01', state: 'called' });
    expect(store.published.flatMap(({ events }) => events).map(({ kind }) => kind)).toContain(
      'line',
    );
    const [bench] = await store.db.select().from(benches).where(eq(benches.id, world.bench.id));
    expect(bench?.testerId).toBe(world.tester.id);
  });

  it('starts each test from nothing', async () => {
    for (const table of [staff, tags, ledger, pulls]) {
      expect(await store.db.select().from(table)).toEqual([]);
    }
    expect(store.published).toEqual([]);
  });

  it('knows the password of its staff', async () => {
    expect(await verify(TEST_PASSWORD_HASH, TEST_PASSWORD)).toBe(true);
  });
});
