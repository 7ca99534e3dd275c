import type { CheckEvaluation, PointEvaluation } from './evaluation';
import type { CheckFacts, PullFact } from './facts';
import type { PlanPoint, PlanStep } from './plan';
import { evaluatePoint } from './point';
import { progressOf } from './progress';
import { statementOf } from './statement';
import { formatNumber, formatTorque } from './units';
import { judgeCheck } from './verdict';
import { directionWords } from './words';

export type * from './evaluation';
export type * from './facts';

/** Ambient temperature that the standard asks for, °C (ISO 6789-1). */
export const AMBIENT_C = { min: 18, max: 28 } as const;

const isSamePoint = (one: PlanPoint, other: PlanPoint): boolean =>
  one.direction === other.direction && one.target === other.target;

function temperatureWords(temperatureC: number | null): string[] {
  if (temperatureC === null) return ['The ambient temperature was not recorded.'];
  if (temperatureC >= AMBIENT_C.min && temperatureC <= AMBIENT_C.max) return [];
  const range = `${AMBIENT_C.min} to ${AMBIENT_C.max} °C`;
  return [`Ambient temperature ${formatNumber(temperatureC)} °C, outside ${range}.`];
}

/** Points that were pulled again after a later one, such as for a voided pull: not in ascending order. */
function repeatedLater(facts: CheckFacts, pulls: readonly PullFact[]): PlanStep[] {
  const { steps } = facts.plan;
  const found: PlanStep[] = [];
  let latest = -1;
  for (const pull of pulls) {
    const step = steps[pull.stepIndex];
    if (step?.kind !== 'reading' || pull.state !== 'accepted') continue;
    const after = steps[latest];
    const isBack = after !== undefined && pull.stepIndex < latest && !isSamePoint(after, step);
    if (isBack && !found.some((one) => isSamePoint(one, step))) found.push(step);
    latest = Math.max(latest, pull.stepIndex);
  }
  return found;
}

function notFollowedOf(
  facts: CheckFacts,
  inSequence: readonly PullFact[],
  points: readonly PointEvaluation[],
  missing: number,
) {
  const { plan, tool } = facts;
  const division = tool.unit === plan.unit ? tool.division : null;
  const reason = facts.stopReason?.trim();
  const why = reason ? `: ${reason.replace(/\.$/, '')}` : '';
  const left = missing > 0 ? `, ${missing} ${missing === 1 ? 'pull' : 'pulls'} not made` : '';
  return [
    ...plan.departures,
    ...(facts.stoppedEarly ? [`Stopped early${left}${why}.`] : []),
    ...points
      .filter((point) => point.noRelease && point.readings.length < point.requiredReadings)
      .map(
        (point) =>
          `No further readings at ${formatTorque(point.target, plan.unit, { division })} ` +
          `${directionWords(point.direction)}: the tool had not let go.`,
      ),
    ...repeatedLater(facts, inSequence).map(
      (step) =>
        `${formatTorque(step.target, plan.unit, { division })} ${directionWords(step.direction)} ` +
        'was pulled again after a later set point.',
    ),
    ...temperatureWords(facts.temperatureC),
  ];
}

function deliveredOf(points: readonly PointEvaluation[]): CheckEvaluation['delivered'] {
  return [...new Set(points.map((point) => point.direction))].map((direction) => ({
    direction,
    points: points.flatMap(({ direction: own, targetNm, meanDelivered }) =>
      own === direction && meanDelivered
        ? [
            {
              settingNm: targetNm,
              meanNm: meanDelivered.valueNm,
              expandedNm: meanDelivered.expandedNm,
            },
          ]
        : [],
    ),
  }));
}

/**
 * Everything that is said of a check, from its facts alone: used at every pull by the bench and the
 * phone, and at sign-off for the record. It can be called at any moment of a check.
 * @throws {RangeError} for facts that make no sense, such as a pull of a step that the plan lacks.
 */
export function evaluateCheck(facts: CheckFacts): CheckEvaluation {
  const { plan, tool } = facts;
  const division = tool.unit === plan.unit ? tool.division : null;
  const inSequence = [...facts.pulls].sort((one, other) => one.sequence - other.sequence);
  for (const pull of inSequence) {
    if (!plan.steps[pull.stepIndex])
      throw new RangeError(`The plan has no step ${pull.stepIndex}.`);
  }
  const { nextStepIndex, progress, missing, exerciseMissing } = progressOf(facts);

  const belongsTo = (point: PlanPoint) => (pull: PullFact) => {
    const step = plan.steps[pull.stepIndex];
    return step?.kind === 'reading' && isSamePoint(step, point);
  };
  const points = plan.points.map((point) =>
    evaluatePoint({
      facts,
      point,
      pulls: inSequence.filter(belongsTo(point)),
      requiredReadings: plan.readingsPerPoint,
      exerciseMissing: exerciseMissing.has(point.direction),
    }),
  );
  const verdict = judgeCheck(points);
  return {
    points,
    verdict,
    simpleVerdict: judgeCheck(
      points.map(({ simpleVerdict, excluded }) => ({ verdict: simpleVerdict, excluded })),
    ),
    statement: statementOf({ plan, points, verdict, division }),
    nextStepIndex,
    progress,
    missing,
    notFollowed: notFollowedOf(facts, inSequence, points, missing.length),
    delivered: deliveredOf(points),
  };
}
