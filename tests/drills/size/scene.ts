import type { Statement } from './statements';

/** A screen or a command, as often as it was run: the statements of each run. */
export interface Scene {
  name: string;
  runs: Statement[][];
}

export interface SceneResult {
  name: string;
  runs: number;
  /** Statements of one run. */
  statements: number;
  slowest: { medianMs: number; maxMs: number; text: string };
  met: boolean;
}

const round = (value: number): number => Number(value.toFixed(2));

/** @throws RangeError when there is no value. */
export function median(values: readonly number[]): number {
  const sorted = values.toSorted((one, other) => one - other);
  const upper = sorted[Math.floor(sorted.length / 2)];
  const lower = sorted[Math.floor((sorted.length - 1) / 2)];
  if (upper === undefined || lower === undefined) throw new RangeError('A median needs a value.');
  return (lower + upper) / 2;
}

/** The slowest statement of a scene: by text, the median over its runs. */
export function sceneResult({ name, runs }: Scene, limitMs: number): SceneResult {
  const byText = new Map<string, number[]>();
  for (const statements of runs) {
    // A text that stands several times in a run counts with its slowest.
    const inRun = new Map<string, number>();
    for (const { text, ms } of statements) inRun.set(text, Math.max(ms, inRun.get(text) ?? 0));
    for (const [text, ms] of inRun) byText.set(text, [...(byText.get(text) ?? []), ms]);
  }
  const slowest = [...byText]
    .map(([text, ms]) => ({ text, medianMs: round(median(ms)), maxMs: round(Math.max(...ms)) }))
    .sort((one, other) => other.medianMs - one.medianMs)[0];
  if (!slowest) throw new Error(`${name} ran no statement: it measures nothing.`);
  return {
    name,
    runs: runs.length,
    statements: Math.round(median(runs.map(({ length }) => length))),
    slowest,
    met: slowest.medianMs <= limitMs,
  };
}
