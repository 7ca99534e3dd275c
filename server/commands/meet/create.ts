import { newMeetSchema } from '@/lib/desk/meet';
import { defineCommand } from '@/server/commands/command';
import { postIdOf } from '@/server/commands/staff/shared';
import { insertMeet } from './shared';

/** Makes a meet with its benches. Its testers are put on them one by one. */
export const createMeet = defineCommand({
  name: 'meet.create',
  input: newMeetSchema,
  run: async ({ tx, now, staffId }, input) => {
    const postId = await postIdOf(tx, staffId());
    const meet = await insertMeet(tx, { postId, ...input }, now);
    return {
      result: { meetId: meet.id, slug: meet.slug },
      entry: { meetId: meet.id, subjectId: meet.id, detail: { benches: input.benches } },
      events: [{ kind: 'line', meetId: meet.id }],
    };
  },
});
