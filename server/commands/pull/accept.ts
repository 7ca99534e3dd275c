import { eq } from 'drizzle-orm';
import { pulls } from '@/db/schema';
import { acceptPullSchema } from '@/lib/record/pull-input';
import { checkEntry, lockCheck } from '@/server/commands/check/shared';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { askAbout, checkShown, insertDecision, refuseTooLow } from './shared';

/** The operator takes a value that the tester offered; for an indicating tool with its display. */
export const acceptPull = defineCommand({
  name: 'pull.accept',
  input: acceptPullSchema,
  run: async ({ tx, now, staffId }, input) => {
    const [row] = await tx
      .select({ checkId: pulls.checkId })
      .from(pulls)
      .where(eq(pulls.id, input.pullId));
    if (!row) throw new Problem('not-found', 'There is no such pull.');
    const file = await lockCheck(tx, row.checkId);
    const offered = file.pulls.find(({ pull }) => pull.id === input.pullId)!;
    if (offered.voided || offered.accepted) {
      throw new Problem(
        'conflict',
        `This pull was ${offered.voided ? 'voided' : 'accepted'} already.`,
      );
    }
    const step = file.check.plan.steps[offered.pull.stepIndex]!;
    const { setting } = file.check.plan;
    checkShown(file.check.plan, step, input.toolValue);
    if (input.outcome === 'no-release') {
      if (!setting || step.kind !== 'reading') {
        throw new Problem('invalid', 'Only a reading of a setting tool can end without a release.');
      }
      refuseTooLow(file.check.plan, step, offered.pull.rawNm!);
    } else if (step.kind === 'reading') askAbout(file, step, offered.pull.rawNm!, input.confirmed);
    const accepted = await insertDecision(
      tx,
      offered.pull,
      {
        decision: 'accepted',
        outcome: input.outcome,
        toolValue: setting ? step.target : input.toolValue,
        byStaffId: staffId(),
      },
      now,
    );
    const after = file.pulls.map((one) => (one === offered ? { ...one, accepted } : one));
    return {
      result: { pullId: input.pullId },
      entry: checkEntry(file, { pullId: input.pullId }),
      events: [{ kind: 'check', file: { ...file, pulls: after } }],
    };
  },
});
