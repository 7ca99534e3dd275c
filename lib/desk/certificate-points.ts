import { convertTorque, formatTorque, type TorqueUnit } from '@/lib/torque/units';
import type { CertificatePoint } from '@/lib/torque/tester';
import { directionWords } from '@/lib/torque/words';
import { DIRECTIONS, type Direction } from '@/lib/torque/terms';
import { parseDecimal } from '@/lib/line/join';

/** One line of a certificate as it is printed: the torque is in the certificate's unit. */
export interface PrintedPoint {
  direction: Direction;
  torque: number;
  errorPercent: number;
  expandedPercent: number;
  k: number;
}

const DIRECTION_WORDS: Record<string, Direction> = {
  cw: 'cw',
  clockwise: 'cw',
  right: 'cw',
  '+': 'cw',
  ccw: 'ccw',
  acw: 'ccw',
  'counter-clockwise': 'ccw',
  counterclockwise: 'ccw',
  'anti-clockwise': 'ccw',
  anticlockwise: 'ccw',
  left: 'ccw',
  '-': 'ccw',
  '−': 'ccw',
};

const MAX_ROWS = 60;

/**
 * The cells of a row: by tabs or semicolons where there are any, so that a comma can be a decimal
 * mark; else by a comma with a blank behind it, or by blanks.
 */
const cellsOf = (row: string): string[] =>
  row
    .split(/[\t;]/.test(row) ? / *[\t;] */ : /,\s+|\s+/)
    .map((cell) => cell.trim().replace(/,$/, ''))
    .filter((cell, index, all) => cell !== '' || index < all.length - 1);

const signed = (cell: string): number =>
  parseDecimal(cell.replace(/\s*%$/, '').replace('−', '-')) ?? Number.NaN;

const COLUMNS = 'direction, torque, error %, expanded uncertainty %, k';

/**
 * Rows pasted from a sheet: direction, torque, error %, expanded uncertainty %, k; tabs, semicolons
 * or blanks between, point or comma in the numbers. A first row of headings is passed over.
 * `fault` names the row as it is counted on screen, from 1.
 */
export function parsePoints(
  text: string,
): { points: PrintedPoint[]; rows: number[] } | { fault: string } {
  const rows = text.split(/\r?\n/).map((row, index) => ({ row: row.trim(), number: index + 1 }));
  const filled = rows.filter(({ row }) => row !== '');
  if (filled[0] && !/\d/.test(filled[0].row)) filled.shift();
  if (filled.length === 0) return { fault: `Give the certificate’s points: ${COLUMNS}.` };
  if (filled.length > MAX_ROWS) return { fault: `A certificate has at most ${MAX_ROWS} points.` };
  const points: PrintedPoint[] = [];
  for (const { row, number } of filled) {
    const cells = cellsOf(row);
    if (cells.length !== 5) {
      const found = cells.length === 1 ? 'one value' : `${cells.length} values`;
      return { fault: `Row ${number} has ${found}; it needs five: ${COLUMNS}.` };
    }
    const direction = DIRECTION_WORDS[cells[0]!.toLowerCase()];
    if (!direction)
      return {
        fault: `Row ${number} begins with the direction: cw or ccw, not ‘${cells[0]!.slice(0, 20)}’.`,
      };
    const [torque, errorPercent, expandedPercent, k] = cells.slice(1).map(signed) as [
      number,
      number,
      number,
      number,
    ];
    const bad = cells.slice(1).find((cell) => Number.isNaN(signed(cell)));
    if (bad === '') return { fault: `Row ${number} has an empty cell.` };
    if (bad !== undefined) return { fault: `Row ${number}: ‘${bad.slice(0, 20)}’ is no number.` };
    points.push({ direction, torque, errorPercent, expandedPercent, k });
  }
  return { points, rows: filled.map(({ number }) => number) };
}

function rowFault(point: PrintedPoint): string | null {
  const { torque, errorPercent, expandedPercent, k } = point;
  if (!(torque > 0)) return 'the torque must be above zero';
  if (!(Math.abs(errorPercent) < 10)) return 'an error of 10 % or more is no working tester';
  if (!(expandedPercent > 0)) return 'the uncertainty must be above zero';
  if (!(expandedPercent < 10)) return 'an uncertainty of 10 % or more cannot judge a tool';
  if (!(k >= 1 && k <= 4)) return 'k lies between 1 and 4';
  return null;
}

/**
 * What makes no sense about the points of a certificate, naming the row; null when nothing does.
 * `rows` are the rows as they are counted on screen, where they are not simply 1, 2, 3.
 */
export function pointsFault(
  points: readonly PrintedPoint[],
  rows: readonly number[] = points.map((_, index) => index + 1),
): string | null {
  const last = new Map<Direction, number>();
  for (const [index, point] of points.entries()) {
    const fault = rowFault(point);
    if (fault) return `Row ${rows[index]}: ${fault}.`;
    const before = last.get(point.direction);
    if (before !== undefined && point.torque <= before) {
      return `Row ${rows[index]}: torques rise within a direction, and ${point.torque} comes after ${before}.`;
    }
    last.set(point.direction, point.torque);
  }
  const few = DIRECTIONS.find(
    (direction) => points.filter((point) => point.direction === direction).length === 1,
  );
  if (few)
    return `${capital(directionWords(few))} has one point only; two are needed to stand between.`;
  return points.length === 0 ? 'A certificate needs points.' : null;
}

const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** A certificate may name the full scale a little above the printed range. */
const ABOVE_RANGE = 1.02;

/** A point that the tester cannot show, in words; null when all lie in its range. */
export function outsideRangeFault(
  points: readonly CertificatePoint[],
  tester: { maxNm: number },
  unit: TorqueUnit,
): string | null {
  const index = points.findIndex(({ torqueNm }) => torqueNm > tester.maxNm * ABOVE_RANGE);
  if (index < 0) return null;
  const shown = (nm: number) => formatTorque(convertTorque(nm, 'N.m', unit), unit);
  return `Point ${index + 1}, ${shown(points[index]!.torqueNm)}, is above the tester’s range, which ends at ${shown(tester.maxNm)}. Is the unit right?`;
}

/** Printed points as they are stored, torque in N·m. */
export const pointsInNm = (points: readonly PrintedPoint[], unit: TorqueUnit): CertificatePoint[] =>
  points.map(({ torque, ...rest }) => ({ ...rest, torqueNm: convertTorque(torque, unit, 'N.m') }));
