import { eq } from 'drizzle-orm';
import { meets } from '@/db/schema';
import { changeMeetSchema } from '@/lib/desk/meet';
import { defineCommand } from '@/server/commands/command';
import { lockMeet } from './shared';

/**
 * Changes what is known of a meet, or opens and closes it for visitors who want to join. Its
 * address stays: it is printed on posters.
 */
export const changeMeet = defineCommand({
  name: 'meet.change',
  input: changeMeetSchema,
  run: async ({ tx }, { meetId, details, joinOpen }) => {
    const meet = await lockMeet(tx, meetId);
    const change = { ...details, joinOpen: joinOpen ?? meet.joinOpen };
    await tx.update(meets).set(change).where(eq(meets.id, meet.id));
    return {
      result: { meetId, joinOpen: change.joinOpen },
      entry: { meetId, subjectId: meetId, detail: { ...change } },
      events: [{ kind: 'line', meetId }],
    };
  },
});
