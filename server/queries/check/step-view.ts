import type { StepView } from '@/lib/live/contract';
import type { VoidFault } from '@/lib/torque/faults';
import type { CheckPlan, PlanStep } from '@/lib/torque/plan';
import { stopTorque } from '@/lib/torque/stop';
import { isFixedTool, isWithoutScale } from '@/lib/torque/tool';
import { convertTorque, formatNumber, formatTorque, unitText } from '@/lib/torque/units';
import { directionWords } from '@/lib/torque/words';
import type { CheckFile } from './load';

const alike = (one: PlanStep, other: PlanStep): boolean =>
  one.kind === other.kind && one.direction === other.direction && one.target === other.target;

/** A preset tool has nothing to set, and one without a scale is checked as it was found. */
const keepsItsSetting = ({ toolClass, points }: CheckPlan): boolean =>
  isFixedTool(toolClass) ||
  (isWithoutScale(toolClass) && points.every(({ target }) => target === points[0]?.target));

/** Faults after which the tool is not where it should stand. */
const SET_ANEW: readonly (VoidFault | undefined)[] = ['set-wrongly', 'wrong-scale'];

/** Does the tool still stand where this step needs it? A voided pull may lead back to another setting. */
function isSetAlready({ check, pulls }: CheckFile, step: PlanStep): boolean {
  const last = pulls.at(-1);
  const there = last && check.plan.steps[last.pull.stepIndex];
  return (
    there !== undefined &&
    alike(there, step) &&
    !SET_ANEW.includes(last?.voided?.fault ?? undefined)
  );
}

/** One instruction in plain words. Each setting is approached from below. */
function instructionFor(plan: CheckPlan, step: PlanStep, isSet: boolean, label: string): string {
  if (!plan.setting) {
    return step.kind === 'exercise'
      ? `Pull slowly until the tool shows ${label}. Then let go, and see that it shows zero.`
      : `Pull slowly until the tool shows ${label}, and hold. Read both.`;
  }
  if (keepsItsSetting(plan)) return 'Leave it as it is set. Pull smoothly until it lets go.';
  if (isSet)
    return step.kind === 'exercise'
      ? 'Again, smoothly, until it lets go.'
      : `Leave it at ${label}. Pull again until it lets go.`;
  return `Set ${label}, coming up from below. Pull smoothly until it lets go.`;
}

/** The step that is due, as the bench shows it. */
export function stepView(file: CheckFile, index: number): StepView {
  const { plan } = file.check;
  const division = file.tool.unit === plan.unit ? file.tool.division : null;
  const step = plan.steps[index]!;
  const same = plan.steps.flatMap((other, at) => (alike(step, other) ? [at] : []));
  const points = plan.points.filter((point) => point.direction === step.direction);
  const point = points.findIndex(({ target }) => target === step.target) + 1;
  const direction = directionWords(step.direction);
  const label = formatTorque(step.target, plan.unit, { division });
  const number = same.indexOf(index) + 1;
  const stopNm = stopTorque({
    targetNm: convertTorque(step.target, plan.unit, 'N.m'),
    toolMaxNm: convertTorque(file.tool.rangeMax, file.tool.unit, 'N.m'),
    testerMaxNm: file.tester.maxNm,
  });
  return {
    index,
    kind: step.kind,
    direction: step.direction,
    target: step.target,
    targetLabel: formatNumber(step.target, { division }),
    unitLabel: unitText(plan.unit),
    heading:
      step.kind === 'exercise'
        ? `Exercise pulls, ${direction}`
        : `Set point ${point} of ${points.length}, ${direction}`,
    pullWords: `Pull ${number} of ${same.length}`,
    number,
    of: same.length,
    stopLabel: plan.setting
      ? formatTorque(convertTorque(stopNm, 'N.m', plan.unit), plan.unit)
      : null,
    instruction: instructionFor(plan, step, isSetAlready(file, step), label),
  };
}
