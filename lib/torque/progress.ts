import type { CheckFacts, PullFact, ToolFacts } from './facts';
import type { CheckPlan, PlanStep } from './plan';
import { isReading } from './readings';
import { formatTorque } from './units';
import { directionWords } from './words';

const sameAt = (one: PlanStep, other: PlanStep): boolean =>
  one.kind === other.kind && one.direction === other.direction && one.target === other.target;

/** 'reading 3 of 5 at 204 N·m clockwise', 'exercise pull 2 of 5 clockwise'. */
export function stepWords(plan: CheckPlan, stepIndex: number, division: number | null): string {
  const step = plan.steps[stepIndex];
  if (!step) throw new RangeError(`The plan has no step ${stepIndex}.`);
  const alike = plan.steps.flatMap((other, index) => (sameAt(step, other) ? [index] : []));
  const place = `${alike.indexOf(stepIndex) + 1} of ${alike.length}`;
  const direction = directionWords(step.direction);
  return step.kind === 'exercise'
    ? `exercise pull ${place} ${direction}`
    : `reading ${place} at ${formatTorque(step.target, plan.unit, { division })} ${direction}`;
}

const isNoRelease = (pull: PullFact): boolean =>
  pull.state === 'accepted' && pull.outcome === 'no-release';

export interface Progress {
  nextStepIndex: number | null;
  progress: { done: number; total: number };
  missing: string[];
  /** Directions in which an exercise pull is missing. */
  exerciseMissing: Set<PlanStep['direction']>;
}

/**
 * How far a check has come. A point at which the tool did not let go is settled: nobody is asked to
 * pull it there again.
 */
export function progressOf(
  facts: Pick<CheckFacts, 'plan' | 'pulls'> & { tool: Pick<ToolFacts, 'unit' | 'division'> },
): Progress {
  const { plan, pulls } = facts;
  const division = facts.tool.unit === plan.unit ? facts.tool.division : null;
  const byStep = new Map<number, PullFact[]>();
  for (const pull of pulls) {
    const known = byStep.get(pull.stepIndex);
    if (known) known.push(pull);
    else byStep.set(pull.stepIndex, [pull]);
  }
  const settled = plan.steps.filter(
    (step, index) => step.kind === 'reading' && byStep.get(index)?.some(isNoRelease),
  );

  const missing: string[] = [];
  const exerciseMissing: Progress['exerciseMissing'] = new Set();
  let done = 0;
  let nextStepIndex: number | null = null;
  plan.steps.forEach((step, index) => {
    const own = byStep.get(index) ?? [];
    const accepted =
      step.kind === 'exercise'
        ? own.some((pull) => pull.state === 'accepted')
        : own.some(isReading);
    if (accepted || settled.some((other) => sameAt(step, other))) {
      done += 1;
      return;
    }
    const offered = own.some((pull) => pull.state === 'offered');
    if (!offered) nextStepIndex ??= index;
    if (step.kind === 'exercise') exerciseMissing.add(step.direction);
    missing.push(`${stepWords(plan, index, division)}${offered ? ' (waits to be accepted)' : ''}`);
  });
  return { nextStepIndex, progress: { done, total: plan.steps.length }, missing, exerciseMissing };
}
