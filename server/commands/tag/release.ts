import { defineCommand } from '@/server/commands/command';
import { lockTag, saveMove, tagEntry, tagEvents, tagInput } from './shared';

/** Ends a hold early. */
export const releaseTag = defineCommand({
  name: 'tag.release',
  input: tagInput,
  run: async ({ tx, now }, { tagId }) => {
    const moved = await saveMove(tx, await lockTag(tx, tagId), { kind: 'release' }, now);
    return { result: { tagId }, entry: tagEntry(moved), events: tagEvents(moved) };
  },
});
