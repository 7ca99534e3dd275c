import { z } from 'zod';
import { defineCommand } from '@/server/commands/command';
import { lockTag, saveMove, tagEntry, tagEvents, tagInput, takePeg } from './shared';

/** Hangs a tool on a peg: left with us by its owner, or cleared off the bench. */
export const hangTool = defineCommand({
  name: 'tag.hang',
  input: tagInput.extend({ peg: z.number().int().min(1).max(999).nullable().default(null) }),
  run: async ({ tx, now }, { tagId, peg: wanted }) => {
    const tag = await lockTag(tx, tagId);
    const peg = await takePeg(tx, tag.meetId, wanted);
    const moved = await saveMove(tx, tag, { kind: 'hang', peg }, now);
    return {
      result: { tagId, peg },
      entry: tagEntry(moved, { peg }),
      events: tagEvents(moved, tag.benchId),
    };
  },
});
