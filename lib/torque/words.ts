import { finite } from './assert';
import type { Basis, Direction } from './terms';
import type { ToolClass } from './tool';
import type { Verdict } from './verdict';

const VERDICT_WORDS: Record<Verdict, string> = {
  within: 'Within',
  outside: 'Outside',
  'too-close': 'Too close to call',
  'not-judged': 'Not judged',
};
export const verdictWords = (verdict: Verdict): string => VERDICT_WORDS[verdict];

export const directionWords = (direction: Direction): string =>
  direction === 'cw' ? 'clockwise' : 'counter-clockwise';

/**
 * A deviation as people read it: `delivers 2.1 % low`, `delivers 0.4 % high`, `delivers as set`.
 * `deviation` in per cent of the basis; the two bases have opposite signs.
 */
export function deviationWords(deviation: number, basis: Basis): string {
  const size = Math.abs(finite(deviation, 'A deviation')).toFixed(1);
  if (Number(size) === 0) return 'delivers as set';
  const low = basis === 'reference' ? deviation > 0 : deviation < 0;
  return `delivers ${size} % ${low ? 'low' : 'high'}`;
}

const BASIS_WORDS: Record<Basis, string> = {
  reference: 'relative to what the tester measured (ISO 6789)',
  set: 'relative to what the tool says',
};
export const basisWords = (basis: Basis): string => BASIS_WORDS[basis];

export const limitSourceWords = (source: 'claim' | 'standard'): string =>
  source === 'claim' ? 'the maker’s claim' : 'the standard’s limit';

const TOOL_KIND_WORDS: Record<ToolClass, string> = {
  'I-A': 'Bar deflection wrench',
  'I-B': 'Dial wrench',
  'I-C': 'Electronic wrench',
  'I-D': 'Dial screwdriver',
  'I-E': 'Electronic screwdriver',
  'II-A': 'Click wrench',
  'II-B': 'Preset wrench',
  'II-C': 'Wrench without a scale',
  'II-D': 'Torque screwdriver',
  'II-E': 'Preset screwdriver',
  'II-F': 'Screwdriver without a scale',
  'II-G': 'Bar wrench with a scale',
};
/** The kind of a tool in words that its owner knows. */
export const toolKindWords = (toolClass: ToolClass): string => TOOL_KIND_WORDS[toolClass];

const REASON_WORDS: Record<string, string> = {
  'tester-out-of-date': 'the tester has no certificate that is valid today',
  'tester-locked': 'the tester is locked',
  'not-proved-today': 'the tester was not proved today',
  'not-bracketed': 'the tester was not proved again after the check',
  'outside-certified-range': 'the tester is not certified at this torque in this direction',
  'reference-too-coarse': 'the tester is not fine enough for this tolerance',
  'reading-beyond-limits': 'a reading is beyond the limits by more than the uncertainty',
  'no-release': 'the tool did not let go',
  'no-release-unproven': 'the tool did not let go, but the pull ended too low to tell',
  'exercise-missing': 'exercise pulls are missing',
  'no-readings': 'no readings yet',
  'readings-missing': 'readings are missing',
  'all-within': 'every reading is inside the limits by more than the uncertainty',
  'in-guard-band': 'a reading is nearer to a limit than the uncertainty',
  'below-claimed-range': 'the point is below the claimed range',
};
/** A reason in words; a code that is not known is shown as it stands. */
export const reasonWords = (code: string): string => REASON_WORDS[code] ?? code;

/** 'a', 'a and b', 'a, b and c'. */
export function listWords(items: readonly string[]): string {
  if (items.length < 2) return items.join('');
  return `${items.slice(0, -1).join(', ')} and ${items.at(-1)}`;
}
