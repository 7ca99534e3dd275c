import { desc, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openStore, type Store } from '@/db/client';
import { benches, records, tags } from '@/db/schema';
import { takeBench } from '@/server/commands/bench/take';
import { storeTemplate } from '@/tests/support/template';
import type { Backstage } from './backstage';
import { MAX_WAITING } from './pace';
import { backstageOf, step } from './play';
import { seed } from './seed';
import { fixedId, STAFF_IDS } from './ids';

const OPENED = new Date('2026-10-03T13:20:00Z');
const SECRET = 'a-secret-of-this-test-that-is-long-enough-0123456789';
const STEP_SECONDS = 5;
/** A whole story takes seconds, more on a busy machine. */
const STORY_MS = 120_000;

describe('simulated visitors', () => {
  let store: Store;
  let scene: Backstage;
  let now = OPENED;

  beforeAll(async () => {
    store = await openStore({ kind: 'dump', dump: await storeTemplate() });
    await seed({ store, secret: SECRET, clock: () => OPENED });
    scene = await backstageOf({
      db: store.db,
      secret: SECRET,
      clock: () => now,
      publish: () => undefined,
    });
  }, STORY_MS);
  afterAll(() => store.close());

  const stateOf = async (code: string) =>
    (await store.db.select().from(tags).where(eq(tags.code, code)))[0]!.state;

  /** Plays until something is so; fails after a simulated hour. */
  async function until(so: () => Promise<boolean>): Promise<void> {
    for (let steps = 0; steps < 3600 / STEP_SECONDS; steps += 1) {
      if (await so()) return;
      now = new Date(now.getTime() + STEP_SECONDS * 1000);
      await step(scene);
    }
    throw new Error('It did not happen within an hour.');
  }

  it(
    'carry a tag from waiting through its check to its owner, and sign a record',
    async () => {
      expect(await stateOf('A20')).toBe('waiting');
      const seen = new Set<string>();
      await until(async () => {
        const state = await stateOf('A20');
        seen.add(state);
        return state === 'returned';
      });
      expect([...seen]).toEqual(
        expect.arrayContaining(['waiting', 'called', 'on_bench', 'ready', 'returned']),
      );
      const [tag] = await store.db.select().from(tags).where(eq(tags.code, 'A20'));
      const signed = await store.db.select().from(records).where(eq(records.tagId, tag!.id));
      expect(signed).toHaveLength(1);
    },
    STORY_MS,
  );

  it('join, but never make the line longer than it may be', async () => {
    const newest = async () =>
      (await store.db.select({ code: tags.code }).from(tags).orderBy(desc(tags.position)))[0]!.code;
    const before = await newest();
    await until(async () => (await newest()) > before);
    const waiting = await store.db.select().from(tags).where(eq(tags.state, 'waiting'));
    expect(waiting.length).toBeLessThanOrEqual(MAX_WAITING);
  });

  it('leave a bench alone once a person has taken it', async () => {
    const [first] = await store.db.select().from(benches).where(eq(benches.number, 1));
    const owner = { kind: 'staff' as const, staffId: STAFF_IDS.owner, sessionVersion: 1 };
    await takeBench({ ...scene.stage, actor: owner }, fixedId(0x99), { benchId: first!.id });
    const atBench = () => store.db.select().from(tags).where(eq(tags.benchId, first!.id));
    const before = await atBench();
    const signedBefore = await store.db.select().from(records);
    await until(async () => (await store.db.select().from(records)).length > signedBefore.length);
    expect(await atBench()).toEqual(before);
  });
});
