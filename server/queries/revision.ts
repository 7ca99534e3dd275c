import { max } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { ledger } from '@/db/schema';

/** The number of the newest ledger entry: what a snapshot taken now carries as its revision. */
export async function currentRevision(reader: Reader): Promise<number> {
  const [row] = await reader.select({ newest: max(ledger.sequence) }).from(ledger);
  return row?.newest ?? 0;
}
