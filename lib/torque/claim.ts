import { notNegative, oneOf } from './assert';
import type { Basis, Direction } from './terms';

export const CLAIM_KINDS = ['reading', 'full-scale'] as const;
export type ClaimKind = (typeof CLAIM_KINDS)[number];

/** What the maker claims for a tool, as the plate or the visitor gives it. */
export interface Claim {
  /** Per cent of the reading, or of the tool's maximum. */
  of: ClaimKind;
  /** ± per cent clockwise. */
  cwPercent: number;
  /** ± per cent counter-clockwise; null when the claim says nothing about that direction. */
  ccwPercent: number | null;
  /** The claim holds from this share of the maximum, per cent; 20 when left out. */
  fromPercent?: number;
  /** A further ± in N·m, such as one or two display steps. */
  plusNm?: number;
}

export const USUAL_FROM_PERCENT = 20;

/** Limits in per cent of the basis. */
export interface Limits {
  lower: number;
  upper: number;
}

/**
 * Limits of a claim of `percent` of reading plus `absoluteNm`, at the tool value `toolNm`.
 * On the set basis ±(p + 100·A/x). On the reference basis the reference is the unknown:
 * |x − x_r| ≤ p·x_r + A gives −(p·x + 100·A)/(x + A) to (p·x + 100·A)/(x − A), which for p = 0
 * is −100·A/(x + A) to 100·A/(x − A). Null when A is not less than x: no limit is left.
 */
export function claimLimits(
  percent: number,
  absoluteNm: number,
  toolNm: number,
  basis: Basis,
): Limits | null {
  notNegative(percent, 'A claimed per cent');
  notNegative(absoluteNm, 'A claimed torque');
  if (absoluteNm >= toolNm) return null;
  const size = percent * toolNm + 100 * absoluteNm;
  if (size <= 0) throw new RangeError('A claim must leave a tolerance above zero.');
  // Without an absolute part the limits are the claimed number itself, not a rounding of it.
  if (absoluteNm === 0) return { lower: -percent, upper: percent };
  if (basis === 'set') return { lower: -size / toolNm, upper: size / toolNm };
  return { lower: -size / (toolNm + absoluteNm), upper: size / (toolNm - absoluteNm) };
}

/**
 * The limits of a claim at a target. `rangeMaxNm` and `targetNm` in N·m.
 * `below`: the target lies below the share of the range that the claim covers.
 * `silent`: the claim says nothing about this direction, so the standard stands.
 */
export function claimAt(options: {
  claim: Claim;
  rangeMaxNm: number;
  direction: Direction;
  targetNm: number;
  basis: Basis;
}): Limits | 'below' | 'silent' {
  const { claim, rangeMaxNm, direction, targetNm, basis } = options;
  oneOf(claim.of, CLAIM_KINDS, 'The kind of claim');
  const percent = direction === 'cw' ? claim.cwPercent : claim.ccwPercent;
  if (percent === null) return 'silent';
  const from = notNegative(
    claim.fromPercent ?? USUAL_FROM_PERCENT,
    'The share a claim starts from',
  );
  // A target on the edge itself is inside, whatever the units were converted from.
  if (targetNm < (from / 100) * rangeMaxNm * (1 - 1e-9)) return 'below';
  const fullScaleNm = claim.of === 'full-scale' ? (percent / 100) * rangeMaxNm : 0;
  const limits = claimLimits(
    claim.of === 'reading' ? percent : 0,
    fullScaleNm + (claim.plusNm ?? 0),
    targetNm,
    basis,
  );
  return limits ?? 'below';
}
