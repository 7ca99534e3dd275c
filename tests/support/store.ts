import { getTableName, is, sql } from 'drizzle-orm';
import { PgTable } from 'drizzle-orm/pg-core';
import { openStore, type Database } from '@/db/client';
import * as schema from '@/db/schema';
import type { Actor } from '@/server/access/actor';
import type { CommandContext } from '@/server/commands/command';
import type { LiveEvent } from '@/server/live/events';
import { storeTemplate } from './template';

/** The moment at which tests begin: 10:00 in the summer of the test meet's zone. */
export const TEST_NOW = new Date('2026-06-13T09:00:00Z');
/** Links, sessions and hashes of tests rest on it. */
export const TEST_SECRET = 'a-secret-that-only-tests-use-and-that-is-long-enough-0123456789abcdef';

export interface TestStore {
  db: Database;
  /** A context whose events end in `published`. */
  contextFor(actor: Actor): CommandContext;
  /** What committed commands have published since the last `reset`. */
  published: { events: LiveEvent[]; revision: number }[];
  /** The clock of every context; set it to move on. */
  now: Date;
  /** Empties every table, `published`, and puts the clock back. */
  reset(): Promise<void>;
}

const TABLES = Object.values(schema)
  .filter((value) => is(value, PgTable))
  .map((table) => getTableName(table));

/**
 * Empties every table. As a replica no trigger fires, so that append-only tables and foreign keys
 * let go; a truncate does the same, but takes a tenth of a second.
 */
const EMPTY = `do $$ begin
  set local session_replication_role = replica;
  ${TABLES.map((name) => `delete from "${name}";`).join(' ')}
  perform setval(pg_get_serial_sequence('ledger', 'sequence'), 1, false);
end $$`;

let shared: Promise<TestStore> | null = null;

/**
 * The one migrated store of this test file, in memory; with TEST_DATABASE_URL that PostgreSQL database,
 * which it empties (then run the files one after the other). Call `reset()` before each test.
 */
export function testStore(): Promise<TestStore> {
  shared ??= open();
  return shared;
}

async function open(): Promise<TestStore> {
  const { db } = await openStore(
    process.env.TEST_DATABASE_URL
      ? { kind: 'postgres', url: process.env.TEST_DATABASE_URL }
      : { kind: 'dump', dump: await storeTemplate() },
  );
  const store: TestStore = {
    db,
    published: [],
    now: TEST_NOW,
    contextFor: (actor) => ({
      db,
      actor,
      clock: () => store.now,
      secret: TEST_SECRET,
      publish: (events, revision) => void store.published.push({ events, revision }),
    }),
    async reset() {
      await db.execute(sql.raw(EMPTY));
      store.published = [];
      store.now = TEST_NOW;
    },
  };
  return store;
}
