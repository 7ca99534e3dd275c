import { convertTorque, type TorqueUnit } from '@/lib/torque/units';
import { compileLinePattern, MAX_LINE_LENGTH } from './pattern';
import { readUnitText } from './unit-text';

/** The way round that a tester reports, seen from the handle's side. */
export type PullDirection = 'cw' | 'ccw';

/** One line of a tester, understood or not. */
export type ParsedLine =
  | {
      ok: true;
      /** Magnitude in N·m, 0 or more. */
      valueNm: number;
      /** null when the line does not say. */
      direction: PullDirection | null;
    }
  | { ok: false; reason: string };

export interface LineOptions {
  /** Regular expression source, as for {@link compileLinePattern}. */
  pattern: string;
  /** The unit of lines that name none. */
  unit: TorqueUnit;
}

const NUMBER = /^([+\-−–]?)\s*(\d+(?:[.,]\d+)?|[.,]\d+)$/u;

/** Blanks and control characters (framing bytes of some testers) around a line. */
const EDGES = /^[\s\p{Cc}]+|[\s\p{Cc}]+$/gu;

/**
 * A parser for the lines of one tester: one line is one pull. Never throws on a line, never gives
 * NaN; what it does not understand it refuses with the reason.
 * @throws RangeError when the pattern cannot be used.
 */
export function createLineParser({ pattern, unit }: LineOptions): (line: string) => ParsedLine {
  const compiled = compileLinePattern(pattern);
  return (line) => {
    if (line.length > MAX_LINE_LENGTH) {
      return refuse(`the line is longer than ${MAX_LINE_LENGTH} characters`);
    }
    const groups = compiled.exec(line.replace(EDGES, ''))?.groups;
    if (!groups) return refuse('it does not look like a reading');
    return readGroups(groups, unit);
  };
}

/**
 * Reads one line of a tester, see {@link createLineParser}.
 * @throws RangeError when the pattern cannot be used.
 * @example parseTesterLine('-3.2', { pattern: DEFAULT_LINE_PATTERN, unit: 'N.m' })
 * // { ok: true, valueNm: 3.2, direction: 'ccw' }
 */
export function parseTesterLine(line: string, options: LineOptions): ParsedLine {
  return createLineParser(options)(line);
}

function readGroups(groups: Record<string, string | undefined>, unit: TorqueUnit): ParsedLine {
  const number = NUMBER.exec(groups.value?.trim() ?? '');
  if (!number) return refuse('it holds no number');
  const sign = groups.sign?.trim() || number[1] || '';
  if (groups.sign?.trim() && number[1]) return refuse('it has two signs');
  const direction = readDirection(sign);
  if (direction === undefined) return refuse(`its sign '${sign}' is not known`);

  const unitText = groups.unit?.trim() ?? '';
  const reading = unitText === '' ? { unit, factor: 1 } : readUnitText(unitText);
  if (!reading) return refuse(`its unit '${unitText}' is not known`);

  const value = Number((number[2] ?? '').replace(',', '.')) * reading.factor;
  const valueNm = convertTorque(value, reading.unit, 'N.m');
  if (!Number.isFinite(valueNm)) return refuse('its number is too large');
  return { ok: true, valueNm, direction };
}

/** The direction a sign stands for: null without one, undefined when it is not known. */
function readDirection(sign: string): PullDirection | null | undefined {
  if (sign === '') return null;
  if (sign === '+' || /^cw$/iu.test(sign)) return 'cw';
  if (/^[-−–]$/u.test(sign) || /^ccw$/iu.test(sign)) return 'ccw';
  return undefined;
}

function refuse(reason: string): ParsedLine {
  return { ok: false, reason };
}
