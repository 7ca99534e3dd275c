import { finite, notNegative, oneOf } from './assert';
import { BASES, type Basis } from './terms';

/**
 * Relative deviation in per cent, of what the tool says (`toolValue`: its setting or display) and
 * what the tester measured (`referenceValue`), both in the same unit. ISO 6789:
 * 100·(x_a − x_r)/x_r, positive when the tool says more than it delivers. On the `set` basis
 * 100·(x_r − x_a)/x_a, positive when it delivers more than it says.
 * @throws {RangeError} for negative or non-finite values, or when the value divided by is zero.
 */
export function relativeDeviation(
  toolValue: number,
  referenceValue: number,
  basis: Basis = 'reference',
): number {
  notNegative(toolValue, 'The tool’s value');
  notNegative(referenceValue, 'The reference value');
  oneOf(basis, BASES, 'The basis');
  const [value, by] =
    basis === 'reference' ? [toolValue, referenceValue] : [referenceValue, toolValue];
  if (by === 0) throw new RangeError('A deviation relative to zero does not exist.');
  return (100 * (value - by)) / by;
}

export interface Summary {
  n: number;
  mean: number;
  /** Of the sample (n − 1); null for a single value. */
  standardDeviation: number | null;
  min: number;
  max: number;
  /** max − min */
  spread: number;
}

/** Sum with the rounding carried along (Neumaier). */
function sum(values: readonly number[]): number {
  let total = 0;
  let carried = 0;
  for (const value of values) {
    const next = total + value;
    carried += Math.abs(total) >= Math.abs(value) ? total - next + value : value - next + total;
    total = next;
  }
  return total + carried;
}

/**
 * Mean, sample standard deviation and extent of a series, in the unit of the values. Works on the
 * differences from the first value, in two passes, so that a large offset does not eat the digits.
 * @throws {RangeError} for an empty series or a value that is not finite.
 */
export function summarise(values: readonly number[]): Summary {
  const first = values[0];
  if (first === undefined) throw new RangeError('An empty series has no summary.');
  for (const value of values) finite(value, 'A value of the series');

  const n = values.length;
  const shifted = values.map((value) => value - first);
  const shiftedMean = sum(shifted) / n;
  const rest = shifted.map((value) => value - shiftedMean);
  // The second term takes off what the rounding of the mean left in the squares.
  const squares = sum(rest.map((value) => value * value)) - sum(rest) ** 2 / n;
  let min = first;
  let max = first;
  for (const value of values) {
    if (value < min) min = value;
    if (value > max) max = value;
  }
  return {
    n,
    mean: first + shiftedMean,
    standardDeviation: n > 1 ? Math.sqrt(Math.max(0, squares) / (n - 1)) : null,
    min,
    max,
    spread: max - min,
  };
}
