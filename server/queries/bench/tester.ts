import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches } from '@/db/schema';

/** The tester that stands on a bench; undefined when there is no such bench. */
export async function testerOfBench(
  reader: Reader,
  benchId: string,
): Promise<{ testerId: string | null } | undefined> {
  const [bench] = await reader
    .select({ testerId: benches.testerId })
    .from(benches)
    .where(eq(benches.id, benchId));
  return bench;
}
