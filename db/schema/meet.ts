import { sql } from 'drizzle-orm';
import {
  boolean,
  date,
  doublePrecision,
  integer,
  jsonb,
  pgTable,
  text,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import type { BenchState } from '@/lib/line/states';
import type { PlanSettings } from '@/lib/torque/settings';
import { id, instant } from './columns';
import { postIdColumn } from './post';
import { staff } from './staff';
import { testers } from './tester';

export const meets = pgTable('meets', {
  id: id(),
  postId: postIdColumn(),
  /** The word that stands in public addresses. */
  slug: text('slug').notNull().unique(),
  name: text('name').notNull(),
  place: text('place').notNull(),
  startsOn: date('starts_on').notNull(),
  endsOn: date('ends_on').notNull(),
  timeZone: text('time_zone').notNull(),
  /** The local hour at which a service day begins. */
  dayStartHour: integer('day_start_hour').notNull().default(4),
  latitudeDeg: doublePrecision('latitude_deg'),
  heightM: doublePrecision('height_m'),
  /** May visitors join now? */
  joinOpen: boolean('join_open').notNull().default(true),
  /** Scheme, basis, guard and the changeable numbers of a check; a snapshot goes into each check. */
  planSettings: jsonb('plan_settings').$type<PlanSettings>().notNull(),
  /** How many codes this meet has given out. */
  tagsIssued: integer('tags_issued').notNull().default(0),
  createdAt: instant('created_at').notNull(),
});

export const benches = pgTable(
  'benches',
  {
    id: id(),
    meetId: uuid('meet_id')
      .notNull()
      .references(() => meets.id),
    number: integer('number').notNull(),
    state: text('state').$type<BenchState>().notNull().default('open'),
    pausedReason: text('paused_reason'),
    testerId: uuid('tester_id').references(() => testers.id),
    operatorId: uuid('operator_id').references(() => staff.id),
  },
  (table) => [
    uniqueIndex('benches_meet_number').on(table.meetId, table.number),
    // A tester feeds one bench only.
    uniqueIndex('benches_tester')
      .on(table.testerId)
      .where(sql`${table.testerId} is not null`),
  ],
);
