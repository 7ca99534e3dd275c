import { eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Transaction } from '@/db/client';
import { benches } from '@/db/schema';
import type { LiveEvent } from '@/server/live/events';
import { Problem } from '@/server/problem';

export type BenchRow = typeof benches.$inferSelect;

export const benchInput = z.object({ benchId: z.uuid() });

/** Loads a bench and takes its row for the transaction. @throws Problem `not-found`. */
export async function lockBench(tx: Transaction, benchId: string): Promise<BenchRow> {
  const [bench] = await tx.select().from(benches).where(eq(benches.id, benchId)).for('update');
  if (!bench) throw new Problem('not-found', 'There is no such bench.');
  return bench;
}

export const benchEvents = (bench: BenchRow): LiveEvent[] => [
  { kind: 'line', meetId: bench.meetId },
  { kind: 'bench', benchId: bench.id },
];

export const benchEntry = (bench: BenchRow, detail: Record<string, unknown> = {}) => ({
  meetId: bench.meetId,
  subjectId: bench.id,
  detail: { bench: bench.number, ...detail },
});
