import { sql } from 'drizzle-orm';
import {
  boolean,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import type { CheckState, PullSource } from '@/lib/line/states';
import type { AsFound } from '@/lib/record/as-found';
import type { CheckPlan } from '@/lib/torque/plan';
import type { VoidFault } from '@/lib/torque/faults';
import { id, instant } from './columns';
import { benches, meets } from './meet';
import { staff } from './staff';
import { tags } from './tag';
import { certificates, testerProofs, testers } from './tester';

export const checks = pgTable(
  'checks',
  {
    id: id(),
    meetId: uuid('meet_id')
      .notNull()
      .references(() => meets.id),
    tagId: uuid('tag_id')
      .notNull()
      .references(() => tags.id),
    benchId: uuid('bench_id')
      .notNull()
      .references(() => benches.id),
    testerId: uuid('tester_id')
      .notNull()
      .references(() => testers.id),
    /** What the tester rested on when the check began; null when it had none. */
    certificateId: uuid('certificate_id').references(() => certificates.id),
    proofId: uuid('proof_id').references(() => testerProofs.id),
    operatorId: uuid('operator_id')
      .notNull()
      .references(() => staff.id),
    state: text('state').$type<CheckState>().notNull(),
    plan: jsonb('plan').$type<CheckPlan>().notNull(),
    planVersion: integer('plan_version').notNull(),
    asFound: jsonb('as_found').$type<AsFound>().notNull(),
    pausedAt: instant('paused_at'),
    stoppedEarly: boolean('stopped_early').notNull().default(false),
    stopReason: text('stop_reason'),
    abandonReason: text('abandon_reason'),
    startedAt: instant('started_at').notNull(),
    endedAt: instant('ended_at'),
  },
  (table) => [
    // The running check of a bench: read for every pull.
    index('checks_bench_state').on(table.benchId, table.state),
    index('checks_tag').on(table.tagId),
    // The running checks of a meet, for every line snapshot: a handful among all that ever were.
    index('checks_running')
      .on(table.meetId)
      .where(sql`${table.state} = 'running'`),
    // Is a check running with this tester? Asked before it is locked, changed or moved.
    index('checks_running_tester')
      .on(table.testerId)
      .where(sql`${table.state} = 'running'`),
  ],
);

/** Every torque value that was seen, and every exercise pull. Append-only (trigger). */
export const pulls = pgTable(
  'pulls',
  {
    id: id(),
    checkId: uuid('check_id')
      .notNull()
      .references(() => checks.id),
    sequence: integer('sequence').notNull(),
    /** Index into the plan's steps. */
    stepIndex: integer('step_index').notNull(),
    outcome: text('outcome').$type<'reading' | 'no-release'>().notNull(),
    /** As the tester gave it, N·m; null for an exercise pull that nobody read. */
    rawNm: doublePrecision('raw_nm'),
    correctionNm: doublePrecision('correction_nm').notNull(),
    source: text('source').$type<PullSource>().notNull(),
    at: instant('at').notNull(),
    byStaffId: uuid('by_staff_id').references(() => staff.id),
  },
  (table) => [uniqueIndex('pulls_check_sequence').on(table.checkId, table.sequence)],
);

/** What was decided about a pull: accepted, later perhaps voided. Append-only (trigger). */
export const pullDecisions = pgTable(
  'pull_decisions',
  {
    id: id(),
    pullId: uuid('pull_id')
      .notNull()
      .references(() => pulls.id),
    checkId: uuid('check_id')
      .notNull()
      .references(() => checks.id),
    decision: text('decision').$type<'accepted' | 'voided'>().notNull(),
    /** What an accepted value is: a tester that sends by itself does not know that nothing let go. */
    outcome: text('outcome').$type<'reading' | 'no-release'>(),
    /** What the tool said, in the plan's unit: its setting, or what its display showed. */
    toolValue: doublePrecision('tool_value'),
    fault: text('fault').$type<VoidFault>(),
    note: text('note'),
    at: instant('at').notNull(),
    byStaffId: uuid('by_staff_id').references(() => staff.id),
  },
  (table) => [
    // A pull is accepted once and voided once.
    uniqueIndex('pull_decisions_once').on(table.pullId, table.decision),
    index('pull_decisions_check').on(table.checkId),
  ],
);

export const checkNotes = pgTable(
  'check_notes',
  {
    id: id(),
    checkId: uuid('check_id')
      .notNull()
      .references(() => checks.id),
    text: text('text').notNull(),
    at: instant('at').notNull(),
    byStaffId: uuid('by_staff_id')
      .notNull()
      .references(() => staff.id),
  },
  (table) => [index('check_notes_check').on(table.checkId)],
);
