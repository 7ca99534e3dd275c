import { patternTokens, type PatternToken } from './pattern-tokens';

/** Characters that a pattern's atoms are tried against: ASCII, and what units add to it. */
const ALPHABET = [
  ...Array.from({ length: 95 }, (_, index) => String.fromCharCode(32 + index)),
  '\t',
  '·',
  '−',
  'é',
];

/**
 * An upper bound, rough on purpose, of the steps that a pattern can take on the worst line of
 * `length` characters: the ways to share the line between repeats that can take over from each
 * other, times its options and alternatives.
 * @throws RangeError for what cannot be bounded this way: repeated groups, back references, and
 * looking ahead or behind.
 */
export function patternCost(source: string, length: number): number {
  /** For each earlier repeat: the characters that it still shares with what follows. */
  const earlier: Set<string>[] = [];
  let shared = 1;
  let choices = 1;
  for (const token of patternTokens(source)) {
    refuseUnbounded(token);
    if (token.kind === 'bar' || token.quantifier === '?') choices *= 2;
    if (token.kind !== 'atom' || /^[$^]$/u.test(token.text)) continue;
    const taken = charactersOf(token.text);
    if (isRepeat(token)) {
      if (earlier.some((open) => taken.some((character) => open.has(character)))) shared += 1;
    }
    // A piece that every match passes ends the sharing of all characters but its own.
    if (token.sure && !/^(?:[*?]|\{0)/u.test(token.quantifier)) {
      for (const open of earlier) {
        for (const character of open) if (!taken.includes(character)) open.delete(character);
      }
    }
    if (isRepeat(token)) earlier.push(new Set(taken));
  }
  return choices * waysToShare(length, shared);
}

function refuseUnbounded({ kind, text, quantifier }: PatternToken): void {
  if (/^\\(?:k|[1-9])/u.test(text)) throw new RangeError('Back references are not allowed.');
  if (/^\(\?(?:<?[=!])/u.test(text)) {
    throw new RangeError('Looking ahead or behind is not allowed.');
  }
  if (/^\(\?[^:<]/u.test(text)) throw new RangeError('Groups with flags are not allowed.');
  if (kind === 'close' && quantifier !== '' && quantifier !== '?') {
    throw new RangeError('A group must not be repeated.');
  }
}

/** Whether how many characters it takes is open ('?' counts as a choice instead). */
function isRepeat({ quantifier }: PatternToken): boolean {
  return quantifier !== '' && quantifier !== '?' && !/^\{\d+\}/u.test(quantifier);
}

function charactersOf(atom: string): string[] {
  const accepts = new RegExp(`^${atom}$`, 'u');
  return ALPHABET.filter((character) => accepts.test(character));
}

/** The binomial coefficient C(length + parts, parts). */
function waysToShare(length: number, parts: number): number {
  let ways = 1;
  for (let part = 1; part <= parts; part += 1) ways *= (length + part) / part;
  return ways;
}
