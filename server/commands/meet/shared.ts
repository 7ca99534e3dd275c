import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import type { Transaction } from '@/db/client';
import { benches, meets } from '@/db/schema';
import { slugOf } from '@/lib/desk/slug';
import { DEFAULT_PLAN_SETTINGS } from '@/lib/torque/settings';
import { Problem } from '@/server/problem';

export type MeetRow = typeof meets.$inferSelect;
type NewMeet = Pick<MeetRow, 'name' | 'place' | 'startsOn' | 'endsOn' | 'timeZone'> &
  Partial<Pick<MeetRow, 'latitudeDeg' | 'heightM' | 'dayStartHour'>>;

/** Writes a meet and its benches, numbered from 1. Its address word is made from its name. */
export async function insertMeet(
  tx: Transaction,
  input: NewMeet & { postId: string; benches: number },
  now: Date,
): Promise<MeetRow> {
  const { benches: benchCount, ...values } = input;
  const taken = (await tx.select({ slug: meets.slug }).from(meets)).map(({ slug }) => slug);
  const [meet] = await tx
    .insert(meets)
    .values({
      id: uuidv7(),
      slug: slugOf(input.name, taken),
      planSettings: DEFAULT_PLAN_SETTINGS,
      createdAt: now,
      ...values,
    })
    .returning();
  await tx.insert(benches).values(
    Array.from({ length: benchCount }, (_, index) => ({
      id: uuidv7(),
      meetId: meet!.id,
      number: index + 1,
    })),
  );
  return meet!;
}

/** Loads a meet and takes its row for the transaction. @throws Problem `not-found`. */
export async function lockMeet(tx: Transaction, meetId: string): Promise<MeetRow> {
  const [meet] = await tx.select().from(meets).where(eq(meets.id, meetId)).for('update');
  if (!meet) throw new Problem('not-found', 'There is no such meet.');
  return meet;
}
