/** One piece of a regular expression. */
export interface PatternToken {
  kind: 'atom' | 'open' | 'close' | 'bar';
  text: string;
  /** The quantifier behind it, '' without one. */
  quantifier: string;
  /** Whether every match passes it: no option and no alternative stands around it. */
  sure: boolean;
}

/** Escapes, classes, the opening of a group, or a single character; then a quantifier. */
const TOKEN =
  /(\\[pP]\{[^}]*\}|\\u\{[^}]*\}|\\u[\da-fA-F]{4}|\\x[\da-fA-F]{2}|\\c.|\\k<[^>]*>|\\.|\[(?:\\.|[^\]\\])*\]|\(\?<[A-Za-z]\w*>|\(\?(?:<[=!]|.)|.)((?:[*+?]|\{\d+(?:,\d*)?\})?)\??/gsu;

const KINDS: Record<string, PatternToken['kind']> = { ')': 'close', '|': 'bar' };

/** Cuts a regular expression that compiles (Unicode mode) into its pieces. */
export function patternTokens(source: string): PatternToken[] {
  const tokens = [...source.matchAll(TOKEN)].map(([, text = '', quantifier = '']): PatternToken => {
    const kind = text.startsWith('(') ? 'open' : (KINDS[text] ?? 'atom');
    return { kind, text, quantifier, sure: true };
  });
  markUnsure(tokens);
  return tokens;
}

/** What stands in a group with alternatives, or in an optional group, may be passed by. */
function markUnsure(tokens: PatternToken[]): void {
  const groups = [{ start: 0, hasBar: false }];
  const close = (end: number, optional: boolean) => {
    const group = groups.pop();
    if (!group || !(group.hasBar || optional)) return;
    for (const token of tokens.slice(group.start, end)) token.sure = false;
  };
  tokens.forEach((token, index) => {
    if (token.kind === 'open') groups.push({ start: index, hasBar: false });
    if (token.kind === 'bar') groups[groups.length - 1]!.hasBar = true;
    if (token.kind === 'close') close(index, token.quantifier !== '');
  });
  close(tokens.length, false);
}
