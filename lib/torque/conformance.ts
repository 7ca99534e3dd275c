import normalCdf from '@stdlib/stats-base-dists-normal-cdf';
import { finite, notNegative } from './assert';
import type { Limits } from './claim';

/**
 * Probability that the true value lies within the limits, for a normal distribution about `value`
 * with standard uncertainty `standard` (JCGM 106:2012, 7). A limit left out is infinitely far.
 * All in one unit.
 * @throws {RangeError} for values that are not finite, a negative uncertainty or limits upside down.
 */
export function conformanceProbability(options: {
  value: number;
  standard: number;
  lower?: number;
  upper?: number;
}): number {
  const { value, standard, lower = -Infinity, upper = Infinity } = options;
  finite(value, 'The value');
  notNegative(standard, 'The standard uncertainty');
  // A limit that is NaN fails this comparison as well.
  if (!(lower < upper)) throw new RangeError('The lower limit must be below the upper limit.');
  if (standard === 0) return value >= lower && value <= upper ? 1 : 0;
  // Each tail is taken on its own side: the difference of two values near one loses the digits.
  const below = normalCdf((lower - value) / standard, 0, 1);
  const above = normalCdf((value - upper) / standard, 0, 1);
  return Math.min(1, Math.max(0, 1 - below - above));
}

/**
 * Test uncertainty ratio: the smaller limit over the reference's expanded uncertainty, both in per
 * cent. Infinity for a reference without uncertainty. The quarter rule asks for at least 4.
 * @throws {RangeError} for values that are not finite or a negative uncertainty.
 */
export function testUncertaintyRatio(limits: Limits, referenceExpanded: number): number {
  const smaller = Math.min(
    Math.abs(finite(limits.lower, 'The lower limit')),
    Math.abs(finite(limits.upper, 'The upper limit')),
  );
  return smaller / notNegative(referenceExpanded, 'The expanded uncertainty of the reference');
}
