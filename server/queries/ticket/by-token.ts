import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { tags } from '@/db/schema';
import { hashToken } from '@/server/access/links';

/** The tag that a ticket's token has authority over, or null. */
export async function tagOfTicket(
  reader: Reader,
  token: string,
): Promise<typeof tags.$inferSelect | null> {
  const [tag] = await reader
    .select()
    .from(tags)
    .where(eq(tags.ticketHash, hashToken(token)));
  return tag ?? null;
}
