import { and, eq, inArray, isNotNull } from 'drizzle-orm';
import { z } from 'zod';
import type { Transaction } from '@/db/client';
import { meets, tags } from '@/db/schema';
import { moveTag, type TagMove } from '@/lib/line/machine';
import { freePeg } from '@/lib/line/order';
import type { LiveEvent } from '@/server/live/events';
import { Problem } from '@/server/problem';

export type TagRow = typeof tags.$inferSelect;

export const tagInput = z.object({ tagId: z.uuid() });
export const reason = z
  .string()
  .trim()
  .min(1, 'Say why, in a few words.')
  .max(300, 'Keep the reason under 300 characters.');

/** Loads a tag and takes its row for the transaction. @throws Problem `not-found`. */
export async function lockTag(tx: Transaction, tagId: string): Promise<TagRow> {
  const [tag] = await tx.select().from(tags).where(eq(tags.id, tagId)).for('update');
  if (!tag) throw new Problem('not-found', 'There is no such tag.');
  return tag;
}

/** Puts a move through the state machine and writes what it gives. */
export async function saveMove(
  tx: Transaction,
  tag: TagRow,
  move: TagMove,
  now: Date,
  also: Partial<Pick<TagRow, 'calledAt' | 'position'>> = {},
): Promise<TagRow> {
  const { state, place, peg, benchId, heldUntil, unfitReason } = moveTag(tag, move, now);
  const change = { state, place, peg, benchId, heldUntil, unfitReason, ...also };
  await tx.update(tags).set(change).where(eq(tags.id, tag.id));
  return { ...tag, ...change };
}

/** The lowest free peg of the meet, or the given one when it is free. */
export async function takePeg(
  tx: Transaction,
  meetId: string,
  wanted: number | null,
): Promise<number> {
  // Two tools that are hung at once do not get one peg.
  await tx.select({ id: meets.id }).from(meets).where(eq(meets.id, meetId)).for('update');
  const taken = (
    await tx
      .select({ peg: tags.peg })
      .from(tags)
      .where(and(eq(tags.meetId, meetId), eq(tags.place, 'peg'), isNotNull(tags.peg)))
  ).map((row) => row.peg!);
  if (wanted === null) return freePeg(taken);
  if (taken.includes(wanted)) throw new Problem('conflict', `Another tool hangs on peg ${wanted}.`);
  return wanted;
}

/** The tags that this bench is busy with: called to it, or their tool lies on it. */
export const tagsAtBench = (tx: Transaction, benchId: string): Promise<TagRow[]> =>
  tx
    .select()
    .from(tags)
    .where(and(eq(tags.benchId, benchId), inArray(tags.place, ['visitor', 'bench', 'peg'])));

/** Everybody who sees a tag move. */
export const tagEvents = (tag: TagRow, ...benchIds: (string | null)[]): LiveEvent[] => [
  { kind: 'line', meetId: tag.meetId },
  { kind: 'tag', tagId: tag.id },
  ...[...new Set([tag.benchId, ...benchIds])]
    .filter((benchId): benchId is string => benchId !== null)
    .map((benchId) => ({ kind: 'bench' as const, benchId })),
];

export const tagEntry = (tag: TagRow, detail: Record<string, unknown> = {}) => ({
  meetId: tag.meetId,
  subjectId: tag.id,
  detail: { code: tag.code, state: tag.state, place: tag.place, ...detail },
});
