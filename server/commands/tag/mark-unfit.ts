import { and, eq } from 'drizzle-orm';
import { checks } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { lockTag, reason, saveMove, tagEntry, tagEvents, tagInput } from './shared';

/** Unsafe or impossible to check. A running check must be abandoned first, so that its end is told. */
export const markUnfit = defineCommand({
  name: 'tag.mark-unfit',
  input: tagInput.extend({ reason }),
  run: async ({ tx, now }, input) => {
    const tag = await lockTag(tx, input.tagId);
    const [running] = await tx
      .select({ id: checks.id })
      .from(checks)
      .where(and(eq(checks.tagId, tag.id), eq(checks.state, 'running')));
    if (running)
      throw new Problem('wrong-move', `A check of ${tag.code} is running: abandon it first.`);
    const moved = await saveMove(tx, tag, { kind: 'mark-unfit', reason: input.reason }, now);
    return {
      result: { tagId: tag.id, state: moved.state },
      entry: tagEntry(moved, { reason: input.reason }),
      events: tagEvents(moved, tag.benchId),
    };
  },
});
