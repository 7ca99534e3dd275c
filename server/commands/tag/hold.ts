import { z } from 'zod';
import { defineCommand } from '@/server/commands/command';
import { lockTag, saveMove, tagEntry, tagEvents, tagInput } from './shared';

const MAX_HOLD_MINUTES = 600;

/** Holds a turn for some minutes: the tag keeps its place and is passed over until then. */
export const holdTag = defineCommand({
  name: 'tag.hold',
  input: tagInput.extend({
    minutes: z.coerce
      .number()
      .int('Whole minutes, please.')
      .min(1, 'Hold for at least one minute.')
      .max(MAX_HOLD_MINUTES, 'A hold ends within ten hours.'),
  }),
  run: async ({ tx, now }, { tagId, minutes }) => {
    const tag = await lockTag(tx, tagId);
    const until = new Date(now.getTime() + minutes * 60_000);
    const moved = await saveMove(tx, tag, { kind: 'hold', until }, now);
    return {
      result: { tagId, heldUntil: until.toISOString() },
      entry: tagEntry(moved, { until: until.toISOString() }),
      events: tagEvents(moved),
    };
  },
});
