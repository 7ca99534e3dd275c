import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { lockTag, saveMove, tagEntry, tagEvents, tagInput } from './shared';

/** Leaves the line: by the holder of the ticket for their own tag, or by a lead. */
export const withdrawTag = defineCommand({
  name: 'tag.withdraw',
  input: tagInput,
  run: async ({ tx, now, actor }, { tagId }) => {
    if (actor.kind === 'visitor' && actor.tagId !== tagId) {
      throw new Problem('not-found', 'There is no such ticket.');
    }
    const tag = await lockTag(tx, tagId);
    const moved = await saveMove(tx, tag, { kind: 'withdraw' }, now);
    return {
      result: { tagId, state: moved.state },
      entry: tagEntry(moved),
      events: tagEvents(moved, tag.benchId),
    };
  },
});
