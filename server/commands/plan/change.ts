import { eq } from 'drizzle-orm';
import { meets } from '@/db/schema';
import { nextSettings, planSchema } from '@/lib/desk/plan';
import { defineCommand } from '@/server/commands/command';
import { lockMeet } from '@/server/commands/meet/shared';

/** Changes how the tools of a meet are checked from now on; a running check keeps its plan. */
export const changePlan = defineCommand({
  name: 'plan.change',
  input: planSchema,
  run: async ({ tx }, { meetId, ...choice }) => {
    const meet = await lockMeet(tx, meetId);
    const planSettings = nextSettings(meet.planSettings, choice);
    await tx.update(meets).set({ planSettings }).where(eq(meets.id, meetId));
    return {
      result: { meetId, version: planSettings.version },
      entry: { meetId, subjectId: meetId, detail: { ...planSettings } },
      events: [{ kind: 'line', meetId }],
    };
  },
});
