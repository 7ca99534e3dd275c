import { positive } from './assert';

// A mark that is missed by rounding of decimals alone is still that mark.
const SLACK = 1e-9;

/** Marks of a scale that lie inside a range: whole multiples of its division, in the tool's unit. */
export interface Marks {
  lowest: number;
  highest: number;
  /** The highest mark at or below a value; the lowest mark when there is none. */
  atOrBelow(value: number): number;
  /** The nearest mark inside the range; a tie goes down. */
  nearest(value: number): number;
}

/** Without a division every value inside the range can be a target. */
function anyValue(range: { min: number; max: number }): Marks {
  const inside = (value: number) => Math.min(Math.max(value, range.min), range.max);
  return { lowest: range.min, highest: range.max, atOrBelow: inside, nearest: inside };
}

/**
 * The marks of a scale. `range` and `division` are in the tool's unit.
 * @throws {RangeError} when no mark lies inside the range.
 */
export function marksOf(range: { min: number; max: number }, division?: number | null): Marks {
  if (division == null) return anyValue(range);
  positive(division, 'The division');
  // A mark at zero is no set point.
  const first = Math.max(1, Math.ceil(range.min / division - SLACK));
  const last = Math.floor(range.max / division + SLACK);
  if (first > last) {
    throw new RangeError(
      `No mark of a scale with division ${division} lies between ${range.min} and ${range.max}.`,
    );
  }
  const mark = (index: number): number =>
    Number((Math.min(Math.max(index, first), last) * division).toPrecision(12));
  return {
    lowest: mark(first),
    highest: mark(last),
    atOrBelow: (value) => mark(Math.floor(value / division + SLACK)),
    nearest: (value) => mark(Math.ceil(value / division - 0.5 - SLACK)),
  };
}
