import { eq } from 'drizzle-orm';
import { testers } from '@/db/schema';
import { lockTesterSchema } from '@/lib/desk/tester';
import { defineCommand } from '@/server/commands/command';
import { lockTesterRow, testerEvents } from './shared';

/** Bars every verdict on this tester, with a reason that everybody sees, until it is proved again. */
export const lockTester = defineCommand({
  name: 'tester.lock',
  input: lockTesterSchema,
  run: async ({ tx }, { testerId, reason }) => {
    const tester = await lockTesterRow(tx, testerId);
    await tx.update(testers).set({ lockedReason: reason }).where(eq(testers.id, tester.id));
    return {
      result: { testerId, locked: true },
      entry: { subjectId: testerId, detail: { locked: true, reason } },
      events: await testerEvents(tx, testerId),
    };
  },
});
