/** Which form of the relative deviation is judged (and drawn and printed). */
export type CorridorBasis = 'reference' | 'set';

export interface CorridorReading {
  /** The judged deviation, per cent. */
  deviation: number;
  /** Beyond the tolerance limit at this set point. */
  beyond: boolean;
}

/** One set point. All per cents are of the judged deviation, in its own sign. */
export interface CorridorRow {
  /** The set point as printed: '204'. */
  label: string;
  /** Its unit: 'N·m'. */
  unitLabel: string;
  direction?: 'cw' | 'ccw';
  /** Tolerance limits, per cent; null where no tolerance applies (below the claimed range). */
  lower: number | null;
  upper: number | null;
  /** Half width of the guard zone about a limit, per cent: guard × the reference's expanded. */
  guardPercent: number | null;
  readings: readonly CorridorReading[];
  /** Mean of the readings, per cent; null when there is none. */
  mean: number | null;
  /** Expanded uncertainty of the mean, per cent; null when there is none. */
  meanExpanded: number | null;
  /** The row in words: 'delivers 2.1 % low'. */
  words?: string;
  /** Shown, not counted. */
  excluded?: boolean;
  /** The set point being pulled now. */
  current?: boolean;
}
