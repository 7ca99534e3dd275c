import { finite, notNegative, wholeNumber } from './assert';
import type { Limits } from './claim';

export { conformanceProbability, testUncertaintyRatio } from './conformance';
export { delivered, type DeliveredPoint } from './delivered';
export { extensionTorque } from './extension';

export const VERDICTS = ['within', 'outside', 'too-close', 'not-judged'] as const;
export type Verdict = (typeof VERDICTS)[number];

/** Why nothing may be judged at all, however the readings fall. */
export const BARRED_REASONS = [
  'tester-out-of-date',
  'tester-locked',
  'not-proved-today',
  'not-bracketed',
  'outside-certified-range',
] as const;
export type BarredReason = (typeof BARRED_REASONS)[number];

export interface PointJudgement {
  verdict: Verdict;
  /** Codes; a barred reason stands as it was given. Words: `reasonWords`. */
  reasons: string[];
  /** The answer with guard 0. */
  simpleVerdict: Verdict;
}

export interface PointToJudge {
  /** Relative deviations of every reading, per cent of the basis. */
  deviations: readonly number[];
  limits: Limits;
  /** Expanded uncertainty of the reference, per cent, with an uncorrected error added. */
  referenceExpanded: number;
  /** Guard band as a share of `referenceExpanded`: 0 simple, 0.83 ISO 14253-1, 1 ILAC-G8. */
  guard?: number;
  requiredReadings?: number;
  barred?: readonly string[];
  /**
   * The deviation that a setting tool has at least passed when it had not released by the torque at
   * which the pull was stopped; it counts as a reading that can only be worse.
   */
  noRelease?: number | null;
  /** Codes of what the plan asks for and the pulls did not do. */
  unmet?: readonly string[];
}

/** Values that differ by rounding alone, per cent, are equal: a limit itself is inside it. */
const ROUNDING = 1e-9;

const beyond = (value: number, { lower, upper }: Limits, by: number): boolean =>
  value > upper + by + ROUNDING || value < lower - by - ROUNDING;

/** Is a deviation beyond its limits, without any guard band? The limits themselves are inside. */
export const isBeyond = (deviation: number, limits: Limits): boolean =>
  beyond(deviation, limits, 0);

/** Is the reference worse than a quarter of the smaller limit? */
export function isReferenceTooCoarse(limits: Limits, referenceExpanded: number): boolean {
  const smaller = Math.min(Math.abs(limits.lower), Math.abs(limits.upper));
  return referenceExpanded > smaller / 4 + ROUNDING;
}

function check(point: PointToJudge, guard: number, requiredReadings: number): void {
  for (const deviation of point.deviations) finite(deviation, 'A deviation');
  finite(point.limits.lower, 'The lower limit');
  finite(point.limits.upper, 'The upper limit');
  if (point.limits.lower >= point.limits.upper) {
    throw new RangeError('The lower limit must be below the upper limit.');
  }
  notNegative(point.referenceExpanded, 'The expanded uncertainty of the reference');
  notNegative(guard, 'The guard');
  wholeNumber(requiredReadings, 1, 'The number of required readings');
}

function judge(point: PointToJudge, guard: number, requiredReadings: number) {
  const { deviations, limits, referenceExpanded } = point;
  const barred = [...(point.barred ?? [])];
  if (isReferenceTooCoarse(limits, referenceExpanded)) barred.push('reference-too-coarse');
  if (barred.length > 0) return { verdict: 'not-judged' as const, reasons: barred };

  const g = guard * referenceExpanded;
  const outside: string[] = [];
  if (deviations.some((value) => beyond(value, limits, g))) outside.push('reading-beyond-limits');
  if (point.noRelease != null && beyond(point.noRelease, limits, g)) outside.push('no-release');
  if (outside.length > 0) return { verdict: 'outside' as const, reasons: outside };

  const unmet = [...(point.unmet ?? [])];
  if (deviations.length === 0) unmet.push('no-readings');
  else if (deviations.length < requiredReadings) unmet.push('readings-missing');
  if (point.noRelease != null) unmet.push('no-release-unproven');
  if (unmet.length > 0) return { verdict: 'not-judged' as const, reasons: unmet };

  const inside = deviations.every((value) => !beyond(value, limits, -g));
  return inside
    ? { verdict: 'within' as const, reasons: ['all-within'] }
    : { verdict: 'too-close' as const, reasons: ['in-guard-band'] };
}

/**
 * The verdict of one set point. Every reading counts, not the mean (ISO 6789-1); the guard band is
 * guard × the reference's expanded uncertainty (ILAC-G8). In this order: barred or too coarse a
 * reference, beyond the widened limits, something missing, inside the shrunk limits, else too close.
 * @throws {RangeError} for values that are not finite, limits upside down, a negative guard or
 * uncertainty, or when no reading is there and none is required.
 */
export function judgePoint(point: PointToJudge): PointJudgement {
  const guard = point.guard ?? 1;
  const requiredReadings = point.requiredReadings ?? point.deviations.length;
  check(point, guard, requiredReadings);
  return {
    ...judge(point, guard, requiredReadings),
    simpleVerdict: judge(point, 0, requiredReadings).verdict,
  };
}

/**
 * The verdict of a whole check from its points; an excluded point is shown and not counted.
 * No counted point: not judged. Else outside, not judged, too close in this order if any point is so.
 */
export function judgeCheck(points: readonly { verdict: Verdict; excluded?: boolean }[]): Verdict {
  const counted = points.filter((point) => !point.excluded).map((point) => point.verdict);
  if (counted.length === 0) return 'not-judged';
  for (const verdict of ['outside', 'not-judged', 'too-close'] as const) {
    if (counted.includes(verdict)) return verdict;
  }
  return 'within';
}
