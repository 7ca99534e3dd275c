import { defineCommand } from '@/server/commands/command';
import { lockTag, saveMove, tagEntry, tagEvents, tagInput } from './shared';

/** A called or absent visitor waits again, with the place that the tag had. */
export const returnToLine = defineCommand({
  name: 'tag.return-to-line',
  input: tagInput,
  run: async ({ tx, now }, { tagId }) => {
    const tag = await lockTag(tx, tagId);
    const moved = await saveMove(tx, tag, { kind: 'return-to-line' }, now);
    return {
      result: { tagId, state: moved.state },
      entry: tagEntry(moved),
      events: tagEvents(moved, tag.benchId),
    };
  },
});
