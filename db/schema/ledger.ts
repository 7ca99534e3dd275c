import { bigserial, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { instant } from './columns';

/** Who did what, in the transaction that did it. Append-only (trigger). Ids only, no personal data. */
export const ledger = pgTable(
  'ledger',
  {
    /** Also the revision number of live snapshots: it only grows. */
    sequence: bigserial('sequence', { mode: 'number' }).primaryKey(),
    at: instant('at').notNull(),
    actor: text('actor').notNull(),
    command: text('command').notNull(),
    meetId: uuid('meet_id'),
    subjectId: uuid('subject_id'),
    detail: jsonb('detail').$type<Record<string, unknown>>().notNull(),
  },
  (table) => [
    index('ledger_meet').on(table.meetId, table.sequence),
    index('ledger_subject').on(table.subjectId, table.sequence),
  ],
);

/** A command that has run: the same key again gets the stored result. */
export const commandRuns = pgTable(
  'command_runs',
  {
    actor: text('actor').notNull(),
    command: text('command').notNull(),
    id: uuid('id').notNull(),
    inputHash: text('input_hash').notNull(),
    /** Ids only, never personal data. */
    result: jsonb('result').$type<unknown>(),
    at: instant('at').notNull(),
  },
  (table) => [primaryKey({ columns: [table.actor, table.command, table.id] })],
);
