import { eq } from 'drizzle-orm';
import { testers } from '@/db/schema';
import { changeTesterSchema } from '@/lib/desk/tester';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { isChecking, lockTesterRow, refuseTakenName, testerEvents, testerValues } from './shared';

/** What a running check is computed from; none of it may move under the check. */
const MEASURING = [
  'minNm',
  'maxNm',
  'resolutionNm',
  'yearlyDriftPercent',
  'temperatureCoefficientPercentPerK',
  'correctionApplied',
] as const;

/** Changes a tester. Its name, plate and connection may change in mid-check; its numbers may not. */
export const changeTester = defineCommand({
  name: 'tester.change',
  input: changeTesterSchema,
  run: async ({ tx }, input) => {
    const tester = await lockTesterRow(tx, input.testerId);
    const values = testerValues(input.tester);
    await refuseTakenName(tx, values.name, tester.id);
    const measuring = MEASURING.filter((key) => values[key] !== tester[key]);
    if (measuring.length > 0 && (await isChecking(tx, tester.id))) {
      throw new Problem(
        'wrong-move',
        `A check is running on ${tester.name}. Its range, resolution, limits and correction can be changed when that check has ended.`,
      );
    }
    await tx.update(testers).set(values).where(eq(testers.id, tester.id));
    return {
      result: { testerId: tester.id },
      entry: { subjectId: tester.id, detail: { ...values } },
      events: await testerEvents(tx, tester.id),
    };
  },
});
