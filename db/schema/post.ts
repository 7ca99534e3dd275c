import { pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { id, instant } from './columns';

/** One travelling set-up with its own chain of records. */
export const posts = pgTable('posts', {
  id: id(),
  name: text('name').notNull(),
  /** Two to six capitals: the first part of every record number. */
  shortName: text('short_name').notNull().unique(),
  createdAt: instant('created_at').notNull(),
});

export const postIdColumn = () =>
  uuid('post_id')
    .notNull()
    .references(() => posts.id);
