import type { CheckView, LineBench, LineSnapshot, Progress } from '@/lib/live/contract';
import type { PlanStep } from '@/lib/torque/plan';

export interface BenchProgress {
  benchId: string;
  progress: Progress;
  words: string;
  revision: number;
  at: string;
}

/** How far a check is, as the board says it: 'Reading 9 of 15', 'Exercise pull 2 of 5'. */
export function progressWords(steps: readonly PlanStep[], nextIndex: number | null): string {
  if (nextIndex === null) return 'All readings taken';
  const kind = steps[nextIndex]!.kind;
  const same = steps
    .map((step, index) => ({ step, index }))
    .filter(({ step }) => step.kind === kind);
  const number = same.findIndex(({ index }) => index === nextIndex) + 1;
  return `${kind === 'reading' ? 'Reading' : 'Exercise pull'} ${number} of ${same.length}`;
}

export const progressOf = (
  benchId: string,
  check: CheckView,
  { revision, at }: { revision: number; at: string },
): BenchProgress => ({
  benchId,
  progress: check.progress,
  words: check.progressWords,
  revision,
  at,
});

/** The line as it was shown, with one bench's check moved on. */
export function withProgress(line: LineSnapshot, change: BenchProgress): LineSnapshot {
  const benches = line.benches.map((bench): LineBench =>
    bench.id === change.benchId
      ? { ...bench, progress: change.progress, words: change.words }
      : bench,
  );
  return { ...line, benches, revision: Math.max(line.revision, change.revision), at: change.at };
}
