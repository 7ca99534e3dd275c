import { notNegative, oneOf, positive, range as checkRange } from './assert';
import { claimAt, type Claim, type Limits } from './claim';
import { BASES, DIRECTIONS, type Basis, type Direction } from './terms';

export type { Basis, Direction } from './terms';

/** The classes of hand torque tools, ISO 6789-1: Type I indicates, Type II is set and signals. */
export const TOOL_CLASSES = [
  'I-A',
  'I-B',
  'I-C',
  'I-D',
  'I-E',
  'II-A',
  'II-B',
  'II-C',
  'II-D',
  'II-E',
  'II-F',
  'II-G',
] as const;
export type ToolClass = (typeof TOOL_CLASSES)[number];

const ALWAYS_SIX: readonly ToolClass[] = ['I-A', 'I-D', 'II-D', 'II-E', 'II-F', 'II-G'];

/** Is it set beforehand and signals (Type II)? Throws a RangeError for an unknown class. */
export function isSettingTool(toolClass: ToolClass): boolean {
  return oneOf(toolClass, TOOL_CLASSES, 'The tool class').startsWith('II-');
}

/** Has it one value only (II-B, II-E)? */
export const isFixedTool = (toolClass: ToolClass): boolean =>
  toolClass === 'II-B' || toolClass === 'II-E';

/** Is it adjusted without a scale (II-C, II-F)? */
export const isWithoutScale = (toolClass: ToolClass): boolean =>
  toolClass === 'II-C' || toolClass === 'II-F';

/**
 * Permissible relative deviation, ± per cent, by class and the tool's maximum torque in N·m (not the
 * test point). ISO 6789:2003: I-A, I-D and II-D to II-G 6; the others 6 up to 10 N·m, 4 above.
 * @throws {RangeError} for an unknown class or a maximum that is not above zero.
 */
export function permissibleDeviation(toolClass: ToolClass, maxTorqueNm: number): number {
  oneOf(toolClass, TOOL_CLASSES, 'The tool class');
  positive(maxTorqueNm, 'The maximum torque');
  return ALWAYS_SIX.includes(toolClass) || maxTorqueNm <= 10 ? 6 : 4;
}

/** Limits of the deviation in per cent of the basis, and where they come from. */
export interface Tolerance extends Limits {
  source: 'claim' | 'standard';
}

/** The standard's own limits, shown beside a claim. `maxTorqueNm` in N·m. */
export function standardTolerance(toolClass: ToolClass, maxTorqueNm: number): Tolerance {
  const percent = permissibleDeviation(toolClass, maxTorqueNm);
  return { lower: -percent, upper: percent, source: 'standard' };
}

/**
 * The limits that a check is judged against at a target: the maker's claim where there is one for
 * this direction, else the standard's. `range` and `targetNm` in N·m; limits in per cent of `basis`.
 * Null below the claimed range, and below the range of the tool itself.
 * @throws {RangeError} for a negative target, a range upside down, or unknown words.
 */
export function toleranceAt(options: {
  claim?: Claim | null;
  toolClass: ToolClass;
  range: { min: number; max: number };
  direction: Direction;
  targetNm: number;
  basis: Basis;
}): Tolerance | null {
  const { claim, toolClass, range, direction, targetNm, basis } = options;
  oneOf(direction, DIRECTIONS, 'The direction');
  oneOf(basis, BASES, 'The basis');
  checkRange(range, 'the tool’s range');
  notNegative(targetNm, 'The target');
  const standard = standardTolerance(toolClass, range.max);
  if (targetNm === 0 || targetNm < range.min * (1 - 1e-9)) return null;
  if (!claim) return standard;
  const limits = claimAt({ claim, rangeMaxNm: range.max, direction, targetNm, basis });
  if (limits === 'below') return null;
  return limits === 'silent' ? standard : { ...limits, source: 'claim' };
}
