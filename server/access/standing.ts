import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { staff } from '@/db/schema';
import { Problem } from '@/server/problem';
import type { Actor, Standing } from './actor';

/**
 * What an actor may pass for right now. A role is read from the database each time: a cookie from
 * before a demotion, a sign-out everywhere or a switched-off account is worth nothing.
 */
export async function standingOf(reader: Reader, actor: Actor): Promise<Standing> {
  if (actor.kind !== 'staff') return actor.kind;
  const [person] = await reader
    .select({ role: staff.role, active: staff.active, sessionVersion: staff.sessionVersion })
    .from(staff)
    .where(eq(staff.id, actor.staffId));
  if (!person?.active || person.sessionVersion !== actor.sessionVersion) {
    throw new Problem('sign-in', 'Your session has ended. Sign in again.');
  }
  return person.role;
}
