import { boolean, integer, pgTable, text } from 'drizzle-orm/pg-core';
import type { Role } from '@/lib/line/states';
import { id, instant } from './columns';
import { postIdColumn } from './post';

export const staff = pgTable('staff', {
  id: id(),
  postId: postIdColumn(),
  name: text('name').notNull(),
  /** What the person signs in with; kept in lower case. */
  login: text('login').notNull().unique(),
  /** argon2id, with its own salt and parameters in the text. */
  passwordHash: text('password_hash').notNull(),
  role: text('role').$type<Role>().notNull(),
  active: boolean('active').notNull().default(true),
  /** Raised to end every session of this person. */
  sessionVersion: integer('session_version').notNull().default(1),
  createdAt: instant('created_at').notNull(),
});
