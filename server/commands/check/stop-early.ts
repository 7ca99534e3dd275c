import { eq } from 'drizzle-orm';
import { checks } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { reason } from '@/server/commands/tag/shared';
import { checkEntry, checkInput, lockCheck } from './shared';

/** Ends the pulls before the plan is through. The record says so, and why. */
export const stopEarly = defineCommand({
  name: 'check.stop-early',
  input: checkInput.extend({ reason }),
  run: async ({ tx }, input) => {
    const file = await lockCheck(tx, input.checkId);
    const change = { stoppedEarly: true, stopReason: input.reason, pausedAt: null };
    await tx.update(checks).set(change).where(eq(checks.id, input.checkId));
    return {
      result: { checkId: input.checkId },
      entry: checkEntry(file, { reason: input.reason }),
      events: [{ kind: 'check', file: { ...file, check: { ...file.check, ...change } } }],
    };
  },
});
