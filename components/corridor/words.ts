import type { CorridorBasis, CorridorRow } from './types';

/**
 * A per cent with its sign: '+4 %', '−2.0 %', '0 %'. Uses a true minus, and no sign on zero.
 * @param digits decimals; limits as few as they need (up to two) when left out.
 */
export function signedPercent(value: number, digits?: number): string {
  const size = Math.abs(value);
  const figures = digits === undefined ? String(Number(size.toFixed(2))) : size.toFixed(digits);
  const sign = Number(figures) === 0 ? '' : value < 0 ? '\u2212' : '+';
  return `${sign}${figures}\u00a0%`;
}

/** 'clockwise' or 'counter-clockwise'. */
export function directionWord(direction: 'cw' | 'ccw'): string {
  return direction === 'ccw' ? 'counter-clockwise' : 'clockwise';
}

/** The row's set point in words: '204 N·m counter-clockwise'. */
export function rowName(row: CorridorRow): string {
  const direction = row.direction === 'ccw' ? ` ${directionWord(row.direction)}` : '';
  return `${row.label} ${row.unitLabel}${direction}`;
}

function rowDescription(row: CorridorRow): string {
  const deviations = row.readings.map((reading) => reading.deviation);
  if (deviations.length === 0) return `${rowName(row)}: no reading yet.`;
  const count = deviations.length === 1 ? '1 reading' : `${deviations.length} readings`;
  const from = signedPercent(Math.min(...deviations), 1);
  const to = signedPercent(Math.max(...deviations), 1);
  const beyond = row.readings.filter((reading) => reading.beyond).length;
  const parts = [
    from === to ? `${count} at ${from}` : `${count} from ${from} to ${to}`,
    row.mean === null ? null : `mean ${signedPercent(row.mean, 1)}`,
    row.words ?? null,
    row.lower === null || row.upper === null
      ? 'no tolerance here'
      : `${beyond === 0 ? 'none' : beyond} beyond the limits of ${signedPercent(row.lower)} and ${signedPercent(row.upper)}`,
    row.excluded ? 'not counted' : null,
  ];
  return `${rowName(row)}: ${parts.filter((part) => part !== null).join(', ')}.`;
}

/** The whole corridor in a few sentences, for those who hear it instead of seeing it. */
export function corridorDescription(rows: readonly CorridorRow[], basis: CorridorBasis): string {
  const sense =
    basis === 'reference'
      ? 'A positive deviation means that the tool delivers less than it says.'
      : 'A positive deviation means that the tool delivers more than it says.';
  return [...rows.map(rowDescription), sense].join(' ');
}
