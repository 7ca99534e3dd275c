import { relativeDeviation, summarise } from './deviation';
import type { EvaluatedReading, VoidedReading } from './evaluation';
import type { CheckFacts, PullFact } from './facts';
import type { PlanPoint } from './plan';
import type { Tolerance } from './tool';
import { convertTorque } from './units';
import { isBeyond } from './verdict';

/** The reference torque of a pull, N·m: as read plus the correction; null when nobody read it. */
export const referenceOf = (pull: PullFact): number | null =>
  pull.rawNm === null ? null : pull.rawNm + pull.correctionNm;

/** An accepted pull with a value: what counts. */
export const isReading = (pull: PullFact): boolean =>
  pull.state === 'accepted' && pull.outcome === 'reading' && pull.rawNm !== null;

/** A set point with what it is judged by. */
export interface PointContext {
  facts: CheckFacts;
  point: PlanPoint;
  targetNm: number;
  limits: Tolerance | null;
}

/** Deviation of one pull, per cent of the plan's basis; null when nobody read it. */
export function deviationOf({ facts }: PointContext, pull: PullFact): number | null {
  const referenceNm = referenceOf(pull);
  if (referenceNm === null) return null;
  const { unit, basis } = facts.plan;
  return relativeDeviation(convertTorque(pull.toolValue, unit, 'N.m'), referenceNm, basis);
}

/** The readings that count, with their deviations. */
export function readingsOf(context: PointContext, pulls: readonly PullFact[]): EvaluatedReading[] {
  return pulls.filter(isReading).flatMap((pull) => {
    const referenceNm = referenceOf(pull);
    const deviation = deviationOf(context, pull);
    if (referenceNm === null || deviation === null) return [];
    const beyond = context.limits !== null && isBeyond(deviation, context.limits);
    return [{ pullId: pull.id, toolValue: pull.toolValue, referenceNm, deviation, beyond }];
  });
}

/** The voided pulls, shown beside the readings. */
export function voidedOf(context: PointContext, pulls: readonly PullFact[]): VoidedReading[] {
  return pulls
    .filter((pull) => pull.state === 'voided')
    .map((pull) => ({
      pullId: pull.id,
      toolValue: pull.toolValue,
      referenceNm: referenceOf(pull),
      // A voided value may be anything, zero included; then there is no deviation to show.
      deviation: (referenceOf(pull) ?? 0) > 0 ? deviationOf(context, pull) : null,
      fault: pull.fault,
      note: pull.note,
    }));
}

/** Mean of what the tester measured, scaled to the target where the tool said something else. */
export function meanAtTarget(
  { facts, targetNm }: PointContext,
  readings: readonly EvaluatedReading[],
) {
  const scaled = readings.flatMap(({ toolValue, referenceNm }) => {
    const toolNm = convertTorque(toolValue, facts.plan.unit, 'N.m');
    return toolNm > 0 ? [(referenceNm * targetNm) / toolNm] : [];
  });
  return scaled.length > 0 ? summarise(scaled).mean : null;
}

/**
 * What accepted pulls without a release say: the highest torque reached, N·m, and the deviation that
 * the tool has at least passed. That is null when the pull ended at or below what the tool was set
 * to, or at no stated torque: such a pull says nothing of the tool.
 */
export function noReleaseOf(context: PointContext, pulls: readonly PullFact[]) {
  const stuck = pulls.filter((pull) => pull.state === 'accepted' && pull.outcome === 'no-release');
  let highest: PullFact | null = null;
  let noReleaseNm: number | null = null;
  for (const pull of stuck) {
    const referenceNm = referenceOf(pull);
    if (referenceNm !== null && referenceNm > (noReleaseNm ?? 0)) {
      highest = pull;
      noReleaseNm = referenceNm;
    }
  }
  const setNm = highest ? convertTorque(highest.toolValue, context.facts.plan.unit, 'N.m') : 0;
  const passed = highest !== null && noReleaseNm !== null && noReleaseNm > setNm;
  return {
    noRelease: stuck.length > 0,
    noReleaseNm,
    deviation: passed && highest ? deviationOf(context, highest) : null,
  };
}
