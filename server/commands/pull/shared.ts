import { v7 as uuidv7 } from 'uuid';
import type { Transaction } from '@/db/client';
import { pullDecisions, pulls } from '@/db/schema';
import type { CheckPlan, PlanStep } from '@/lib/torque/plan';
import { progressOf } from '@/lib/torque/progress';
import { needsConfirmation } from '@/lib/torque/faults';
import { correctionNm } from '@/lib/torque/tester';
import { convertTorque, formatTorque } from '@/lib/torque/units';
import { Problem } from '@/server/problem';
import type { CheckFile, PullFile } from '@/server/queries/check/load';
import { pullFact } from '@/server/queries/check/facts';

type NewPull = Pick<typeof pulls.$inferInsert, 'rawNm' | 'source' | 'outcome' | 'byStaffId'> & {
  direction: 'cw' | 'ccw' | null;
};

/** The step that the next pull belongs to. @throws Problem when none may be taken now. */
export function stepNow(file: CheckFile): { index: number; step: PlanStep } {
  if (file.check.pausedAt) throw new Problem('wrong-move', 'The check is paused. Go on first.');
  if (file.check.stoppedEarly)
    throw new Problem('wrong-move', 'The pulls were ended early. Sign off, or abandon.');
  const { plan } = file.check;
  // What the tester rests on does not matter here, and takes longer to look at.
  const pulls = file.pulls.map((one) => pullFact(plan, one));
  const index = progressOf({ plan, tool: file.tool, pulls }).nextStepIndex;
  if (index === null) throw new Problem('wrong-move', 'Every pull of the plan has been taken.');
  return { index, step: file.check.plan.steps[index]! };
}

/** Below this no tester tells a torque from none, and a deviation relative to it is no number, N·m. */
const LEAST_NM = 1e-6;

/** Refuses what no tester could have measured. Nothing here looks at tolerance or target. */
export function checkRaw(file: CheckFile, rawNm: number): void {
  if (rawNm < LEAST_NM)
    throw new Problem('invalid', 'A pull needs a torque above zero.', {
      fields: { value: 'Above zero, please.' },
    });
  if (rawNm > file.tester.maxNm * 1.000001) {
    const words = `${formatTorque(rawNm, 'N.m')} is above the tester’s range, which ends at ${formatTorque(file.tester.maxNm, 'N.m')}.`;
    throw new Problem('invalid', words, { fields: { value: words } });
  }
}

/**
 * What an indicating tool's display showed at a reading. It may show nothing at all, except where the
 * deviation is taken relative to it.
 * @throws Problem `invalid` that names the field.
 */
export function checkShown(plan: CheckPlan, step: PlanStep, toolValue: number | null): void {
  if (plan.setting || step.kind !== 'reading') return;
  const refuse = (words: string): never => {
    throw new Problem('invalid', words, { fields: { toolValue: words } });
  };
  if (toolValue === null) refuse('Type what the tool’s own display showed.');
  else if (plan.basis === 'set' && convertTorque(toolValue, plan.unit, 'N.m') < LEAST_NM) {
    refuse(
      'A display that shows nothing gives no deviation from it: void the pull, or mark the tool unfit.',
    );
  }
}

/** Asks once about a value that looks mistyped. It is taken all the same when confirmed. */
export function askAbout(file: CheckFile, step: PlanStep, rawNm: number, confirmed: boolean): void {
  if (confirmed) return;
  const targetNm = convertTorque(step.target, file.check.plan.unit, 'N.m');
  const doubt = needsConfirmation({ valueNm: rawNm, targetNm });
  if (doubt) throw new Problem('confirm', doubt.words, { question: doubt.reason });
}

/** Writes a pull of the current step. `correctionNm` is fixed with it. */
export async function insertPull(
  tx: Transaction,
  file: CheckFile,
  stepIndex: number,
  { direction: _said, ...given }: NewPull,
  now: Date,
): Promise<PullFile> {
  const step = file.check.plan.steps[stepIndex]!;
  const correct = file.tester.correctionApplied && file.certificate !== null && given.rawNm != null;
  const pull = {
    id: uuidv7(),
    checkId: file.check.id,
    sequence: file.pulls.length + 1,
    stepIndex,
    correctionNm: correct
      ? correctionNm({
          points: file.certificate!.points,
          direction: step.direction,
          rawNm: given.rawNm!,
        })
      : 0,
    at: now,
    ...given,
    rawNm: given.rawNm ?? null,
    byStaffId: given.byStaffId ?? null,
  };
  await tx.insert(pulls).values(pull);
  return { pull, accepted: null, voided: null };
}

/** Writes what was decided about a pull. */
export async function insertDecision(
  tx: Transaction,
  pull: PullFile['pull'],
  decision: Pick<
    typeof pullDecisions.$inferInsert,
    'decision' | 'outcome' | 'toolValue' | 'fault' | 'note' | 'byStaffId'
  >,
  now: Date,
): Promise<typeof pullDecisions.$inferSelect> {
  const row = {
    id: uuidv7(),
    pullId: pull.id,
    checkId: pull.checkId,
    at: now,
    decision: decision.decision,
    outcome: decision.outcome ?? null,
    toolValue: decision.toolValue ?? null,
    fault: decision.fault ?? null,
    note: decision.note ?? null,
    byStaffId: decision.byStaffId ?? null,
  };
  await tx.insert(pullDecisions).values(row);
  return row;
}

/** A tool has not failed to let go before it was pulled past its setting. */
export function refuseTooLow(plan: CheckPlan, step: PlanStep, rawNm: number): void {
  if (rawNm > convertTorque(step.target, plan.unit, 'N.m')) return;
  const words = `Pull on past ${formatTorque(step.target, plan.unit)}, up to the stop, before you say that it did not let go.`;
  throw new Problem('invalid', words, { fields: { value: words } });
}
