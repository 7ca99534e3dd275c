import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import { checks } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import {
  lockTag,
  reason,
  saveMove,
  tagEntry,
  tagEvents,
  tagInput,
  takePeg,
} from '@/server/commands/tag/shared';

/**
 * Gives a check up without a record, before or after it began: the tool goes back to its owner or on
 * a peg, and the tag waits again with its old place. What was pulled stays in the database.
 */
export const abandonCheck = defineCommand({
  name: 'check.abandon',
  input: tagInput.extend({ reason, to: z.enum(['visitor', 'peg']) }),
  run: async ({ tx, now }, input) => {
    const tag = await lockTag(tx, input.tagId);
    const peg = input.to === 'peg' ? await takePeg(tx, tag.meetId, null) : null;
    const moved = await saveMove(
      tx,
      tag,
      { kind: 'abandon', to: peg === null ? 'visitor' : { peg } },
      now,
    );
    const ended = await tx
      .update(checks)
      .set({ state: 'abandoned', abandonReason: input.reason, endedAt: now })
      .where(and(eq(checks.tagId, tag.id), eq(checks.state, 'running')))
      .returning({ id: checks.id });
    return {
      result: { tagId: tag.id, peg },
      entry: tagEntry(moved, { reason: input.reason, checkId: ended[0]?.id ?? null, peg }),
      events: [
        ...tagEvents(moved, tag.benchId),
        ...(tag.benchId ? [{ kind: 'check-ended' as const, benchId: tag.benchId }] : []),
      ],
    };
  },
});
