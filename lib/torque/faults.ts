import { notNegative, positive, wholeNumber } from './assert';

/** The faults of a pull for which a value that has been seen may be voided. There are no others. */
export const VOID_FAULTS = [
  'set-wrongly',
  'slipped',
  'knocked',
  'too-fast',
  'too-slow',
  'moved-on',
  'zero-moved',
  'wrong-scale',
] as const;
export type VoidFault = (typeof VOID_FAULTS)[number];

export const VOID_FAULT_LABELS: Record<VoidFault, string> = {
  'set-wrongly': 'Set wrongly',
  slipped: 'The drive slipped',
  knocked: 'The bench or the tool was knocked',
  'too-fast': 'Loaded too fast',
  'too-slow': 'Loaded too slowly',
  'moved-on': 'Moved on past the release before it was held',
  'zero-moved': 'The tester’s zero moved',
  'wrong-scale': 'Wrong scale or unit',
};

/** Voided pulls at one point that an operator may make alone; more need a lead. */
export const VOIDS_WITHOUT_LEAD = 2;

/**
 * May this person void one more pull at a point where `voidedAtPoint` are voided already?
 * @throws {RangeError} for a count that is not a whole number from zero.
 */
export function mayVoid(options: {
  voidedAtPoint: number;
  role: 'operator' | 'lead' | 'owner';
}): boolean {
  wholeNumber(options.voidedAtPoint, 0, 'The number of voided pulls');
  return options.role !== 'operator' || options.voidedAtPoint < VOIDS_WITHOUT_LEAD;
}

export interface Confirmation {
  reason: 'far' | 'wrong-scale';
  words: string;
}

// N·m read as lbf·ft and back, lbf·ft read as lbf·in and back.
const SCALE_RATIOS = [1.3558179483, 1 / 1.3558179483, 12, 1 / 12] as const;
const SCALE_WINDOW = 0.05;
const FAR_RATIO = 2;

/**
 * Should a typed value be asked about before it is taken? A typing guard only: it compares with the
 * target by fixed ratios, knows no tolerance, and never refuses. Both in N·m.
 * @throws {RangeError} for a negative value or a target that is not above zero.
 */
export function needsConfirmation(options: {
  valueNm: number;
  targetNm: number;
}): Confirmation | null {
  const ratio =
    notNegative(options.valueNm, 'The value') / positive(options.targetNm, 'The target');
  if (SCALE_RATIOS.some((scale) => Math.abs(ratio / scale - 1) <= SCALE_WINDOW)) {
    return { reason: 'wrong-scale', words: 'Wrong scale? The value fits another unit or scale.' };
  }
  if (ratio >= FAR_RATIO) {
    return {
      reason: 'far',
      words: 'This is twice the target or more. Is it what the tester shows?',
    };
  }
  if (ratio <= 1 / FAR_RATIO) {
    return {
      reason: 'far',
      words: 'This is half the target or less. Is it what the tester shows?',
    };
  }
  return null;
}
