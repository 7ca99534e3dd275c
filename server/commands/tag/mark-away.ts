import { defineCommand } from '@/server/commands/command';
import { lockTag, saveMove, tagEntry, tagEvents, tagInput } from './shared';

/** The visitor did not come when called; the bench is free for the next. */
export const markAway = defineCommand({
  name: 'tag.mark-away',
  input: tagInput,
  run: async ({ tx, now }, { tagId }) => {
    const tag = await lockTag(tx, tagId);
    const moved = await saveMove(tx, tag, { kind: 'mark-away' }, now);
    return {
      result: { tagId, state: moved.state },
      entry: tagEntry(moved),
      events: tagEvents(moved, tag.benchId),
    };
  },
});
