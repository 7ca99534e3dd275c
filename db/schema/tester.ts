import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  date,
  doublePrecision,
  index,
  jsonb,
  pgTable,
  text,
  uuid,
} from 'drizzle-orm/pg-core';
import type { ProofMethod } from '@/lib/line/states';
import type { TesterConnection } from '@/lib/signal/connection';
import type { CertificatePoint } from '@/lib/torque/tester';
import { id, instant } from './columns';
import { postIdColumn } from './post';
import { staff } from './staff';

export const testers = pgTable('testers', {
  id: id(),
  postId: postIdColumn(),
  /** What it is called on the bench, e.g. T-01. */
  name: text('name').notNull().unique(),
  maker: text('maker').notNull(),
  model: text('model').notNull(),
  serial: text('serial').notNull(),
  minNm: doublePrecision('min_nm').notNull(),
  maxNm: doublePrecision('max_nm').notNull(),
  resolutionNm: doublePrecision('resolution_nm').notNull(),
  /** Stated limit of drift in a year, per cent of reading. */
  yearlyDriftPercent: doublePrecision('yearly_drift_percent').notNull(),
  temperatureCoefficientPercentPerK: doublePrecision('temperature_coefficient_percent_per_k'),
  /** Is the certificate's error taken off each reading? Stands on every record. */
  correctionApplied: boolean('correction_applied').notNull().default(false),
  connection: jsonb('connection').$type<TesterConnection>().notNull(),
  /** A locked tester bars every verdict; the reason is shown. */
  lockedReason: text('locked_reason'),
  createdAt: instant('created_at').notNull(),
});

export const certificates = pgTable(
  'certificates',
  {
    id: id(),
    testerId: uuid('tester_id')
      .notNull()
      .references(() => testers.id),
    number: text('number').notNull(),
    laboratory: text('laboratory').notNull(),
    accreditation: text('accreditation').notNull(),
    issuedOn: date('issued_on').notNull(),
    dueOn: date('due_on').notNull(),
    traceability: text('traceability').notNull(),
    temperatureC: doublePrecision('temperature_c'),
    /** Certified points in each direction, read whole and never one by one. */
    points: jsonb('points').$type<CertificatePoint[]>().notNull(),
    createdAt: instant('created_at').notNull(),
  },
  // Found by tester, newest first, at the start of every check.
  (table) => [index('certificates_tester').on(table.testerId, table.issuedOn)],
);

/** Proofs of a tester. Append-only: a failed one stays. */
export const testerProofs = pgTable(
  'tester_proofs',
  {
    id: id(),
    testerId: uuid('tester_id')
      .notNull()
      .references(() => testers.id),
    method: text('method').$type<ProofMethod>().notNull(),
    loadNm: doublePrecision('load_nm').notNull(),
    /** What the tester showed at that load. */
    readingNm: doublePrecision('reading_nm').notNull(),
    /** Largest error allowed at that load, per cent of the load. */
    limitPercent: doublePrecision('limit_percent').notNull(),
    result: text('result').$type<'passed' | 'failed'>().notNull(),
    at: instant('at').notNull(),
    byStaffId: uuid('by_staff_id')
      .notNull()
      .references(() => staff.id),
    note: text('note'),
  },
  (table) => [
    // The newest proof of a tester, at the start of every check.
    index('tester_proofs_tester').on(table.testerId, table.at),
    check('tester_proofs_load', sql`${table.loadNm} > 0`),
  ],
);
