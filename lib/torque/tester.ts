import { notNegative, oneOf } from './assert';
import { DIRECTIONS, type Direction } from './terms';

/** One line of a tester's certificate. */
export interface CertificatePoint {
  direction: Direction;
  torqueNm: number;
  /** 100·(shown − true)/true: above zero the tester reads more than is true. */
  errorPercent: number;
  expandedPercent: number;
  /** Coverage factor of `expandedPercent`. */
  k: number;
}

export type CertifiedAt = Pick<CertificatePoint, 'errorPercent' | 'expandedPercent' | 'k'>;

const inDirection = (points: readonly CertificatePoint[], direction: Direction) =>
  points
    .filter((point) => point.direction === direction)
    .sort((one, other) => one.torqueNm - other.torqueNm);

const asCertified = ({ errorPercent, expandedPercent, k }: CertificatePoint): CertifiedAt => ({
  errorPercent,
  expandedPercent,
  k,
});

/**
 * What the certificate says at a torque in the pull's direction: linear between its points.
 * Null outside the certified range, and where the direction is not certified at all.
 * @throws {RangeError} for a negative torque or an unknown direction.
 */
export function certificateAt(options: {
  points: readonly CertificatePoint[];
  direction: Direction;
  torqueNm: number;
}): CertifiedAt | null {
  oneOf(options.direction, DIRECTIONS, 'The direction');
  const torqueNm = notNegative(options.torqueNm, 'The torque');
  const points = inDirection(options.points, options.direction);
  // A target that was converted from another unit may miss an end of the range by its last digits.
  const same = points.find((point) => Math.abs(point.torqueNm - torqueNm) <= 1e-9 * torqueNm);
  if (same) return asCertified(same);
  const above = points.findIndex((point) => point.torqueNm > torqueNm);
  const upper = points[above];
  const lower = points[above - 1];
  if (!upper || !lower) return null;
  const share = (torqueNm - lower.torqueNm) / (upper.torqueNm - lower.torqueNm);
  const between = (of: (point: CertificatePoint) => number) =>
    of(lower) + share * (of(upper) - of(lower));
  const k = between((point) => point.k);
  return {
    errorPercent: between((point) => point.errorPercent),
    // The standard uncertainty is what is linear, also where the coverage factors differ.
    expandedPercent: k * between((point) => point.expandedPercent / point.k),
    k,
  };
}

/**
 * What is added to a raw reading to take the certificate's error off it, N·m: the true torque is
 * raw/(1 + e/100). Past the ends of the certified range the end's error is kept, so that a reading
 * just over an end does not jump; whether it may be judged there is decided elsewhere. 0 when the
 * direction is not certified.
 * @throws {RangeError} for a negative reading or an unknown direction.
 */
export function correctionNm(options: {
  points: readonly CertificatePoint[];
  direction: Direction;
  rawNm: number;
}): number {
  const rawNm = notNegative(options.rawNm, 'The raw reading');
  oneOf(options.direction, DIRECTIONS, 'The direction');
  const points = inDirection(options.points, options.direction);
  const first = points[0];
  const last = points.at(-1);
  if (!first || !last || rawNm === 0) return 0;
  const torqueNm = Math.min(Math.max(rawNm, first.torqueNm), last.torqueNm);
  const at = certificateAt({ points, direction: options.direction, torqueNm });
  return at ? rawNm / (1 + at.errorPercent / 100) - rawNm : 0;
}
