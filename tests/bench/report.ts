/** One measurement: ours against the bare thing, in the same run. */
export interface Measurement {
  name: string;
  /** What the ratio says, in words. */
  what: string;
  unit: 'ms' | 'bytes';
  /** Ours divided by the bare one; rounded to three decimals. */
  ratio: number;
  limit: number;
  met: boolean;
  ours: Figure;
  bare: Figure;
  /** Facts of the set-up, and figures for information. */
  notes: Record<string, unknown>;
}

export interface Figure {
  median: number;
  p90: number;
  count: number;
}

const round = (value: number, places = 3): number => Number(value.toFixed(places));

/**
 * The value below which `share` (0 to 1) of `values` lie, interpolated.
 * @throws RangeError when there is none.
 */
export function quantile(values: readonly number[], share: number): number {
  if (values.length === 0) throw new RangeError('A quantile needs at least one value.');
  const sorted = values.toSorted((one, other) => one - other);
  const at = (sorted.length - 1) * share;
  const low = sorted[Math.floor(at)]!;
  return low + (sorted[Math.ceil(at)]! - low) * (at - Math.floor(at));
}

export const figure = (values: readonly number[]): Figure => ({
  median: round(quantile(values, 0.5)),
  p90: round(quantile(values, 0.9)),
  count: values.length,
});

interface Measured {
  name: string;
  what: string;
  unit: Measurement['unit'];
  limit: number;
  ours: readonly number[];
  bare: readonly number[];
  notes?: Record<string, unknown>;
}

/** The ratio of the medians, and whether it keeps within its limit. */
export function measurement({ ours, bare, notes = {}, ...rest }: Measured): Measurement {
  const ratio = round(quantile(ours, 0.5) / quantile(bare, 0.5));
  return {
    ...rest,
    ratio,
    met: ratio <= rest.limit,
    ours: figure(ours),
    bare: figure(bare),
    notes,
  };
}

/** Progress for the person who waits. The result alone goes to stdout. */
export const say = (words: string): void => void process.stderr.write(`${words}\n`);

export const sleep = (ms: number): Promise<void> =>
  new Promise((resolve) => setTimeout(resolve, ms));
