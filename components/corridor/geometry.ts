import type { CorridorBasis, CorridorRow } from './types';
import { swarmOffsets } from './swarm';

/** What a drawing must say about its own size, so that dots are spread without touching. */
export interface CorridorMetrics {
  /** Narrowest width the plot is drawn at, px. */
  plotWidthPx: number;
  dotRadiusPx: number;
  /** Height that the centres of the dots may take, px. */
  swarmHeightPx: number;
}

/** A stretch of the plot; 0 is its left edge, 1 its right edge. */
export interface Span {
  from: number;
  to: number;
}

export interface CorridorMark {
  at: number;
  /** From the swarm's middle line, px; negative is up. */
  offsetPx: number;
  beyond: boolean;
  /** Set when the reading lies past the axis: the mark stands at the edge as an arrow. */
  pastEdge: 'left' | 'right' | null;
}

export interface CorridorRowLayout {
  band: Span | null;
  guards: Span[];
  /** Left one first. `value` is the limit in the deviation's own sign, per cent. */
  limits: { at: number; value: number }[];
  marks: CorridorMark[];
  mean: (Span & { at: number; pastEdge: 'left' | 'right' | null }) | null;
}

export interface CorridorLayout {
  /** Half width of the axis, per cent. */
  extentPercent: number;
  /** Every row has the same limits: one axis serves all. */
  sharedLimits: boolean;
  rows: CorridorRowLayout[];
}

/** Room beside the widest limit, stepped so that a new reading seldom moves the others. */
const extentSteps = [1.4, 1.8, 2.4];
const extentWithoutLimits = 5;

/**
 * Half width of the axis, per cent: the smallest step that holds every reading. Readings past the
 * last step are drawn at the edge. Rows without limits alone are scaled by their readings.
 */
export function corridorExtent(rows: readonly CorridorRow[]): number {
  const widest = Math.max(0, ...rows.flatMap((row) => [row.lower, row.upper].map(magnitude)));
  const furthest = Math.max(
    0,
    ...rows.flatMap((row) => row.readings.map((reading) => Math.abs(reading.deviation))),
  );
  if (widest === 0) return Math.max(extentWithoutLimits, furthest * 1.1);
  const step = extentSteps.find((factor) => furthest <= widest * factor * 0.95);
  return widest * (step ?? extentSteps[extentSteps.length - 1] ?? 1);
}

function magnitude(value: number | null): number {
  return value === null ? 0 : Math.abs(value);
}

/**
 * Places everything of the corridor across a plot of width 1. 'Delivers less' is on the left: on
 * the reference basis a positive deviation means that, so its axis runs from right to left.
 * @throws RangeError when a limit, reading or mean is not a finite number.
 */
export function layoutCorridor(
  rows: readonly CorridorRow[],
  basis: CorridorBasis,
  metrics: CorridorMetrics,
): CorridorLayout {
  rows.forEach(refuseNotFinite);
  const extentPercent = corridorExtent(rows);
  const turn = basis === 'reference' ? -1 : 1;
  const place = (percent: number) => 0.5 + (turn * percent) / (2 * extentPercent);
  const first = rows[0];
  return {
    extentPercent,
    sharedLimits: rows.every((row) => row.lower === first?.lower && row.upper === first?.upper),
    rows: rows.map((row) => layoutRow(row, place, metrics)),
  };
}

function layoutRow(
  row: CorridorRow,
  place: (percent: number) => number,
  metrics: CorridorMetrics,
): CorridorRowLayout {
  const edge = metrics.dotRadiusPx / metrics.plotWidthPx;
  const placed = row.readings.map((reading) => place(reading.deviation));
  const held = placed.map((at) => Math.min(1 - edge, Math.max(edge, at)));
  const offsets = swarmOffsets(held, metrics);
  return {
    ...layoutBand(row, place),
    marks: row.readings.map((reading, index) => ({
      at: held[index] ?? 0.5,
      offsetPx: offsets[index] ?? 0,
      beyond: reading.beyond,
      pastEdge: pastEdge(placed[index] ?? 0.5),
    })),
    mean: row.mean === null ? null : layoutMean(row.mean, row.meanExpanded ?? 0, place),
  };
}

function layoutBand(
  row: CorridorRow,
  place: (percent: number) => number,
): Pick<CorridorRowLayout, 'band' | 'guards' | 'limits'> {
  const { lower, upper } = row;
  if (lower === null || upper === null) return { band: null, guards: [], limits: [] };
  const limits = [lower, upper]
    .map((value) => ({ at: place(value), value }))
    .sort((a, b) => a.at - b.at);
  // Inside the band the two zones may meet but not cross.
  const guard = row.guardPercent ?? 0;
  const inner = Math.min(guard, (upper - lower) / 2);
  const zones = [
    [lower - guard, lower + inner],
    [upper - inner, upper + guard],
  ];
  return {
    band: span(place(lower), place(upper)),
    guards: guard > 0 ? zones.map(([a = 0, b = 0]) => span(place(a), place(b))) : [],
    limits,
  };
}

function layoutMean(mean: number, expanded: number, place: (percent: number) => number) {
  const at = place(mean);
  return {
    ...span(place(mean - expanded), place(mean + expanded)),
    at: clamp(at),
    pastEdge: pastEdge(at),
  };
}

function span(a: number, b: number): Span {
  return { from: clamp(Math.min(a, b)), to: clamp(Math.max(a, b)) };
}

function clamp(at: number): number {
  return Math.min(1, Math.max(0, at));
}

function pastEdge(at: number): 'left' | 'right' | null {
  if (at < 0) return 'left';
  return at > 1 ? 'right' : null;
}

function refuseNotFinite(row: CorridorRow): void {
  const numbers = [
    row.lower,
    row.upper,
    row.guardPercent,
    row.mean,
    row.meanExpanded,
    ...row.readings.map((reading) => reading.deviation),
  ];
  if (numbers.some((value) => value !== null && !Number.isFinite(value))) {
    throw new RangeError(`The corridor row ${row.label} holds a value that is not a number.`);
  }
}
