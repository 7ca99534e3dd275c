import { index, integer, pgTable, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { Verdict } from '@/lib/torque/verdict';
import { checks } from './check';
import { id, instant } from './columns';
import { meets } from './meet';
import { posts } from './post';
import { tags } from './tag';

/** A signed-off check. Append-only (trigger); `canonical` is all that pages and exports render. */
export const records = pgTable(
  'records',
  {
    id: id(),
    postId: uuid('post_id')
      .notNull()
      .references(() => posts.id),
    year: integer('year').notNull(),
    sequence: integer('sequence').notNull(),
    number: text('number').notNull().unique(),
    checkId: uuid('check_id')
      .notNull()
      .unique()
      .references(() => checks.id),
    tagId: uuid('tag_id')
      .notNull()
      .references(() => tags.id),
    meetId: uuid('meet_id')
      .notNull()
      .references(() => meets.id),
    verdict: text('verdict').$type<Verdict>().notNull(),
    canonical: text('canonical').notNull(),
    sha256: text('sha256').notNull(),
    /** SHA-256 of the record's link token. */
    linkHash: text('link_hash').notNull().unique(),
    linkVersion: integer('link_version').notNull().default(1),
    signedAt: instant('signed_at').notNull(),
  },
  (table) => [
    uniqueIndex('records_post_year_sequence').on(table.postId, table.year, table.sequence),
    // Today's counts on the board, and the records list of a meet.
    index('records_meet_signed').on(table.meetId, table.signedAt),
    index('records_tag').on(table.tagId),
  ],
);
