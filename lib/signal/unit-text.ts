import type { TorqueUnit } from '@/lib/torque/units';

/** A unit as a tester writes it: the value times `factor` is in `unit`. */
export interface UnitReading {
  unit: TorqueUnit;
  factor: number;
}

/** Spellings seen on displays and printouts, without case, blanks and joining signs. */
const SPELLINGS: readonly (readonly [TorqueUnit, number, readonly string[]])[] = [
  ['N.m', 1, ['nm', 'newtonmetre', 'newtonmetres', 'newtonmeter', 'newtonmeters']],
  ['N.m', 0.01, ['cnm']],
  ['N.m', 1000, ['knm']],
  ['lbf.ft', 1, ['lbfft', 'lbft', 'lbsft', 'ftlbf', 'ftlb', 'ftlbs', 'poundfoot', 'footpounds']],
  ['lbf.in', 1, ['lbfin', 'lbin', 'lbsin', 'inlbf', 'inlb', 'inlbs', 'poundinch', 'inchpounds']],
  ['ozf.in', 1, ['ozfin', 'ozin', 'inozf', 'inoz', 'ounceinch', 'inchounces']],
  ['kgf.m', 1, ['kgfm', 'kgm', 'mkgf', 'mkg', 'kpm', 'mkp']],
  ['kgf.cm', 1, ['kgfcm', 'kgcm', 'cmkgf', 'cmkg', 'kpcm', 'cmkp']],
];

const BY_SPELLING = new Map<string, UnitReading>(
  SPELLINGS.flatMap(([unit, factor, spellings]) =>
    spellings.map((spelling) => [spelling, { unit, factor }] as const),
  ),
);

/**
 * The unit meant by a text such as 'Nm', 'N·m', 'ft-lb', 'LBF.IN' or 'kgf cm'; null when it is not
 * known, so that a value in a strange unit is refused and never guessed.
 */
export function readUnitText(text: string): UnitReading | null {
  const bare = text.toLowerCase().replace(/[\s.·•∙⋅×*/_-]/gu, '');
  return BY_SPELLING.get(bare) ?? null;
}
