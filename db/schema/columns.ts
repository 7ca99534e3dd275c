import { timestamp, uuid } from 'drizzle-orm/pg-core';

/** A UUIDv7 primary key: made by the caller, so that a command can be repeated. */
export const id = () => uuid('id').primaryKey();

/** An instant in UTC. */
export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });
