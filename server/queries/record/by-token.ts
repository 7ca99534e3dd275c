import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { records } from '@/db/schema';
import { parseRecord, type SignedRecord } from '@/lib/record/record';
import { hashToken } from '@/server/access/links';

/**
 * The record that a link shows, read from its signed text and from nothing else; null for a token
 * that shows none.
 */
export async function recordOfToken(reader: Reader, token: string): Promise<SignedRecord | null> {
  const [row] = await reader
    .select({ canonical: records.canonical })
    .from(records)
    .where(eq(records.linkHash, hashToken(token)));
  return row ? parseRecord(row.canonical) : null;
}
