import { and, eq, ne } from 'drizzle-orm';
import { z } from 'zod';
import { tags } from '@/db/schema';
import { positionAt } from '@/lib/line/order';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { lockTag, reason, tagEntry, tagEvents, tagInput } from './shared';

/** A lead puts a waiting tag at another place in the line, and says why. */
export const moveInLine = defineCommand({
  name: 'tag.move',
  input: tagInput.extend({
    place: z.coerce.number().int('A place is a whole number.').min(1, 'The first place is 1.'),
    reason,
  }),
  run: async ({ tx }, input) => {
    const tag = await lockTag(tx, input.tagId);
    if (tag.state !== 'waiting') throw new Problem('wrong-move', `${tag.code} is not waiting.`);
    const others = await tx
      .select()
      .from(tags)
      .where(and(eq(tags.meetId, tag.meetId), eq(tags.state, 'waiting'), ne(tags.id, tag.id)));
    const position = positionAt(others, input.place);
    await tx.update(tags).set({ position }).where(eq(tags.id, tag.id));
    return {
      result: { tagId: tag.id, place: input.place },
      entry: tagEntry(tag, { toPlace: input.place, reason: input.reason }),
      // Every phone finds its own place in the line.
      events: tagEvents(tag),
    };
  },
});
