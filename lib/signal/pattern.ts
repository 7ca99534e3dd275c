import { patternCost } from './pattern-cost';

/** A tester's line is no longer than this many characters; longer ones are refused unread. */
export const MAX_LINE_LENGTH = 200;

/** A line pattern is no longer than this many characters. */
export const MAX_PATTERN_LENGTH = 200;

/** Steps that one line may take at the very worst: below a second on a slow machine. */
const MAX_COST = 2e7;

/**
 * What most testers send: an optional sign, a number with a point or a comma, an optional unit.
 * The comma is a decimal comma: '1,234' is read as 1.234.
 */
export const DEFAULT_LINE_PATTERN =
  '(?<sign>[+\\-−])?\\s*(?<value>[\\d.,]+)\\s*(?<unit>\\p{L}[\\p{L}.·⋅•*\\/ \\-]*)?';

/**
 * A line pattern made ready. It has to explain the whole line (blanks at both ends apart): a
 * pattern that matches a part of '1234.5' would turn it into another torque.
 * @param source a JavaScript regular expression (Unicode mode) with a group named `value`, and
 * optionally `sign` and `unit`.
 * @throws RangeError in plain words when it is too long, does not compile, has no group named
 * value, or could take too long on a bad line.
 */
export function compileLinePattern(source: string): RegExp {
  if (source.length > MAX_PATTERN_LENGTH) {
    throw new RangeError(`A line pattern has at most ${MAX_PATTERN_LENGTH} characters.`);
  }
  let compiled: RegExp;
  try {
    compiled = new RegExp(`^(?:${source})$`, 'u');
    // Apart from its frame too: 'a)(?:b' compiles only inside it.
    new RegExp(source, 'u');
  } catch {
    throw new RangeError('The line pattern is not a valid regular expression.');
  }
  if (!/\(\?<value>/u.test(source) || !hasGroup(source)) {
    throw new RangeError('The line pattern needs a group named value: (?<value>…).');
  }
  if (patternCost(source, MAX_LINE_LENGTH) > MAX_COST) {
    throw new RangeError('The line pattern could take too long on a bad line: use fewer repeats.');
  }
  return compiled;
}

/** Whether `value` is truly a group of the pattern, and not text inside a character class. */
function hasGroup(source: string): boolean {
  const groups = new RegExp(`${source}|`, 'u').exec('')?.groups;
  return groups !== undefined && 'value' in groups;
}

/** Why a line pattern cannot be used, in plain words; null when it can. For forms. */
export function linePatternFault(source: string): string | null {
  try {
    compileLinePattern(source);
    return null;
  } catch (error) {
    return error instanceof RangeError ? error.message : String(error);
  }
}
