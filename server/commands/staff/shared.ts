import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { staff } from '@/db/schema';
import type { LiveEvent } from '@/server/live/events';
import { Problem } from '@/server/problem';

export type StaffRow = typeof staff.$inferSelect;

/** The post that this person works for; everything that staff make belongs to it. */
export async function postIdOf(tx: Transaction, staffId: string): Promise<string> {
  const [person] = await tx
    .select({ postId: staff.postId })
    .from(staff)
    .where(eq(staff.id, staffId));
  if (!person) throw new Problem('sign-in', 'Your session has ended. Sign in again.');
  return person.postId;
}

/**
 * Every person of the post, their rows taken: two owners who switch each other off at the same
 * moment must not both succeed.
 * @throws Problem `not-found` when the one asked for is not among them.
 */
export async function lockStaff(
  tx: Transaction,
  staffId: string,
): Promise<{ person: StaffRow; everybody: StaffRow[] }> {
  const everybody = await tx.select().from(staff).orderBy(staff.id).for('update');
  const person = everybody.find(({ id }) => id === staffId);
  if (!person) throw new Problem('not-found', 'There is no such person.');
  return { person, everybody };
}

/** @throws Problem `invalid` when somebody else signs in with this name. */
export async function refuseTakenLogin(tx: Transaction, login: string): Promise<void> {
  const [other] = await tx.select({ id: staff.id }).from(staff).where(eq(staff.login, login));
  if (!other) return;
  const message = 'Somebody signs in with this name already. Take another.';
  throw new Problem('invalid', message, { fields: { login: message } });
}

/** Open sockets of the person end; they come back with what the person may do now. */
export const staffEvents = (staffId: string): LiveEvent[] => [{ kind: 'staff', staffId }];
