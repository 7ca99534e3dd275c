import { eq } from 'drizzle-orm';
import { pulls } from '@/db/schema';
import type { Role } from '@/lib/line/states';
import { voidPullSchema } from '@/lib/record/pull-input';
import { mayVoid, VOIDS_WITHOUT_LEAD } from '@/lib/torque/faults';
import { checkEntry, lockCheck } from '@/server/commands/check/shared';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { insertDecision } from './shared';

/**
 * Voids a pull for a listed fault of the pull, never for its value. It stays and is shown; the step
 * is pulled again.
 */
export const voidPull = defineCommand({
  name: 'pull.void',
  input: voidPullSchema,
  run: async ({ tx, now, staffId, standing }, input) => {
    const [row] = await tx
      .select({ checkId: pulls.checkId })
      .from(pulls)
      .where(eq(pulls.id, input.pullId));
    if (!row) throw new Problem('not-found', 'There is no such pull.');
    const file = await lockCheck(tx, row.checkId);
    const { steps } = file.check.plan;
    const target = file.pulls.find(({ pull }) => pull.id === input.pullId)!;
    if (target.voided) throw new Problem('conflict', 'This pull was voided already.');
    const at = steps[target.pull.stepIndex]!;
    const voidedAtPoint = file.pulls.filter(({ pull, voided }) => {
      const step = steps[pull.stepIndex]!;
      return (
        voided &&
        step.kind === at.kind &&
        step.direction === at.direction &&
        step.target === at.target
      );
    }).length;
    if (!mayVoid({ voidedAtPoint, role: standing as Role })) {
      throw new Problem(
        'forbidden',
        `${VOIDS_WITHOUT_LEAD} pulls at this point are voided already. A lead must void the next one.`,
      );
    }
    const voided = await insertDecision(
      tx,
      target.pull,
      { decision: 'voided', fault: input.fault, note: input.note || null, byStaffId: staffId() },
      now,
    );
    const after = file.pulls.map((one) => (one === target ? { ...one, voided } : one));
    return {
      result: { pullId: input.pullId },
      entry: checkEntry(file, { pullId: input.pullId, fault: input.fault }),
      events: [{ kind: 'check', file: { ...file, pulls: after } }],
    };
  },
});
