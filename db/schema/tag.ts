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
import type { Consent, TagPlace, TagState } from '@/lib/line/states';
import type { Claim } from '@/lib/torque/claim';
import type { ToolClass } from '@/lib/torque/tool';
import type { TorqueUnit } from '@/lib/torque/units';
import { id, instant } from './columns';
import { benches, meets } from './meet';

/** The only table with personal data. Everything else holds its id. */
export const visitors = pgTable('visitors', {
  id: id(),
  name: text('name'),
  email: text('email'),
  mobile: text('mobile'),
  createdAt: instant('created_at').notNull(),
});

/** A tool as its owner or its plate describes it. */
export const tools = pgTable('tools', {
  id: id(),
  toolClass: text('tool_class').$type<ToolClass>().notNull(),
  /** The owner was not sure what kind it is: the operator settles it at the bench. */
  classUnsure: boolean('class_unsure').notNull().default(false),
  rangeMin: doublePrecision('range_min').notNull(),
  rangeMax: doublePrecision('range_max').notNull(),
  unit: text('unit').$type<TorqueUnit>().notNull(),
  /** Scale division or display step, in `unit`. */
  division: doublePrecision('division'),
  /** The one value of a fixed tool, in `unit`. */
  nominal: doublePrecision('nominal'),
  claim: jsonb('claim').$type<Claim>(),
  measuresCcw: boolean('measures_ccw').notNull().default(false),
  drive: text('drive'),
  maker: text('maker'),
  serial: text('serial'),
  createdAt: instant('created_at').notNull(),
});

/** One tool at one meet, and its place in the line. */
export const tags = pgTable(
  'tags',
  {
    id: id(),
    meetId: uuid('meet_id')
      .notNull()
      .references(() => meets.id),
    code: text('code').notNull(),
    toolId: uuid('tool_id')
      .notNull()
      .references(() => tools.id),
    visitorId: uuid('visitor_id')
      .notNull()
      .references(() => visitors.id),
    state: text('state').$type<TagState>().notNull(),
    place: text('place').$type<TagPlace>().notNull(),
    peg: integer('peg'),
    benchId: uuid('bench_id').references(() => benches.id),
    heldUntil: instant('held_until'),
    unfitReason: text('unfit_reason'),
    position: doublePrecision('position').notNull(),
    consent: text('consent').$type<Consent>().notNull(),
    /** The visitor's own values, in the tool's unit; null when none were given. */
    workingPoints: jsonb('working_points').$type<number[]>(),
    /** SHA-256 of the ticket's token; the token itself is never stored. */
    ticketHash: text('ticket_hash').notNull().unique(),
    linkVersion: integer('link_version').notNull().default(1),
    joinedAt: instant('joined_at').notNull(),
    calledAt: instant('called_at'),
  },
  (table) => [
    uniqueIndex('tags_meet_code').on(table.meetId, table.code),
    // The line of a meet: read for every snapshot.
    index('tags_meet_state').on(table.meetId, table.state),
    // The tool that lies on a bench, or is called to it.
    index('tags_bench').on(table.benchId),
    index('tags_visitor').on(table.visitorId),
    // Holds that run out, looked for every few seconds: few tags are ever held.
    index('tags_held')
      .on(table.heldUntil)
      .where(sql`${table.heldUntil} is not null`),
  ],
);
