import { deliveredWords } from '@/lib/format/measured';
import type { CheckView, CorridorPoint, PullView } from '@/lib/live/contract';
import { evaluateCheck, type PointEvaluation } from '@/lib/torque/check';
import { relativeDeviation } from '@/lib/torque/deviation';
import { VOID_FAULT_LABELS } from '@/lib/torque/faults';
import type { CheckPlan } from '@/lib/torque/plan';
import {
  convertTorque,
  decimalsOf,
  formatNumber,
  formatTorque,
  unitText,
} from '@/lib/torque/units';
import { deviationWords, reasonWords } from '@/lib/torque/words';
import { progressWords } from '@/server/queries/line/progress';
import { factsOf, outcomeOf, pullState } from './facts';
import type { CheckFile, PullFile } from './load';
import { stepView } from './step-view';

/** A point of an evaluation as the corridor draws it; also from a signed record. */
export function corridorPoint(
  point: PointEvaluation,
  plan: CheckPlan,
  division: number | null,
  current: boolean,
): CorridorPoint {
  const limits = point.limits ?? point.standardLimits;
  const label = formatNumber(point.target, { division });
  return {
    direction: point.direction,
    target: point.target,
    label,
    unitLabel: unitText(plan.unit),
    lower: limits.lower,
    upper: limits.upper,
    guardPercent: point.guardPercent ?? 0,
    readings: point.readings.map(({ deviation, beyond }) => ({ deviation, beyond })),
    mean: point.summary?.mean ?? null,
    // An error that is not corrected widens what is known of the mean, as on the record.
    meanExpanded: point.budget
      ? point.budget.combined.expanded + point.budget.uncorrectedErrorPercent
      : null,
    words: point.summary ? deviationWords(point.summary.mean, plan.basis) : '',
    excluded: point.excluded,
    current,
    verdict: point.verdict,
    reasons: point.reasons.map(({ words }) => words),
    delivered: point.meanDelivered
      ? deliveredWords(
          { targetLabel: label, setting: plan.setting, unit: plan.unit },
          point.meanDelivered,
        )
      : null,
  };
}

function pullView(file: CheckFile, one: PullFile): PullView {
  const { plan } = file.check;
  const step = plan.steps[one.pull.stepIndex]!;
  const division = file.tool.unit === plan.unit ? file.tool.division : null;
  const outcome = outcomeOf(one);
  const referenceNm = one.pull.rawNm === null ? null : one.pull.rawNm + one.pull.correctionNm;
  const toolValue = one.accepted?.toolValue ?? (plan.setting ? step.target : null);
  // The tester's digits, in the tool's unit: one place more than its step there.
  const testerStep = convertTorque(file.tester.resolutionNm, 'N.m', plan.unit);
  const places = 10 ** -decimalsOf(Number(testerStep.toPrecision(1)));
  const deviation =
    step.kind === 'reading' && outcome === 'reading' && referenceNm && toolValue
      ? relativeDeviation(toolValue, convertTorque(referenceNm, 'N.m', plan.unit), plan.basis)
      : null;
  return {
    id: one.pull.id,
    sequence: one.pull.sequence,
    stepIndex: one.pull.stepIndex,
    kind: step.kind,
    state: pullState(one),
    outcome,
    direction: step.direction,
    target: formatTorque(step.target, plan.unit, { division }),
    reference:
      referenceNm === null
        ? null
        : formatTorque(convertTorque(referenceNm, 'N.m', plan.unit), plan.unit, {
            division: places,
          }),
    tool: toolValue === null ? null : formatTorque(toolValue, plan.unit, { division }),
    deviation,
    words: deviation === null ? null : deviationWords(deviation, plan.basis),
    fault: one.voided?.fault ?? null,
    faultWords: one.voided?.fault ? VOID_FAULT_LABELS[one.voided.fault] : null,
    note: one.voided?.note ?? null,
  };
}

/** A check as the bench sees it, all derived from its file. */
export function checkView(file: CheckFile): CheckView {
  const facts = factsOf(file);
  const evaluation = evaluateCheck(facts);
  const { check, tool } = file;
  const { plan } = check;
  const division = tool.unit === plan.unit ? tool.division : null;
  const index = check.stoppedEarly ? null : evaluation.nextStepIndex;
  const step = index === null ? null : stepView(file, index);
  const pulls = file.pulls.map((one) => pullView(file, one));
  const offered = pulls.find((pull) => pull.state === 'offered') ?? null;
  const offeredStep = offered ? stepView(file, offered.stepIndex) : null;
  const shown = offeredStep ?? step;
  return {
    id: check.id,
    tagCode: file.tag.code,
    paused: check.pausedAt !== null,
    setting: plan.setting,
    unit: plan.unit,
    unitLabel: unitText(plan.unit),
    basis: plan.basis,
    planName: plan.schemeName,
    barred: facts.barred.map(reasonWords),
    step,
    offered,
    offeredStep,
    pulls,
    points: evaluation.points.map((point) =>
      corridorPoint(
        point,
        plan,
        division,
        shown?.kind === 'reading' &&
          shown.direction === point.direction &&
          shown.target === point.target,
      ),
    ),
    progress: evaluation.progress,
    progressWords: progressWords(plan.steps, evaluation.nextStepIndex),
    missing: evaluation.missing,
    notFollowed: evaluation.notFollowed,
    notes: file.notes.map(({ text, at }) => ({ text, at: at.toISOString() })),
    verdict: evaluation.verdict,
    statement: evaluation.statement,
    stoppedEarly: check.stoppedEarly,
  };
}
