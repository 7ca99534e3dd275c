import { eq } from 'drizzle-orm';
import { checks } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { checkEntry, checkInput, lockCheck } from './shared';

/** Nothing is taken while a check is paused. */
export const pauseCheck = defineCommand({
  name: 'check.pause',
  input: checkInput,
  run: async ({ tx, now }, { checkId }) => {
    const file = await lockCheck(tx, checkId);
    const pausedAt = file.check.pausedAt ?? now;
    await tx.update(checks).set({ pausedAt }).where(eq(checks.id, checkId));
    return {
      result: { checkId },
      entry: checkEntry(file),
      events: [{ kind: 'check', file: { ...file, check: { ...file.check, pausedAt } } }],
    };
  },
});

/** The check goes on where it was. */
export const resumeCheck = defineCommand({
  name: 'check.resume',
  input: checkInput,
  run: async ({ tx }, { checkId }) => {
    const file = await lockCheck(tx, checkId);
    await tx.update(checks).set({ pausedAt: null }).where(eq(checks.id, checkId));
    return {
      result: { checkId },
      entry: checkEntry(file),
      events: [{ kind: 'check', file: { ...file, check: { ...file.check, pausedAt: null } } }],
    };
  },
});
