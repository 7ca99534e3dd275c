import type { InstrumentProblem, InstrumentTime } from './instrument';

/** Problems told one by one in a window; the rest are counted and told together at its end. */
const TOLD_PER_WINDOW = 5;
const WINDOW_MS = 10_000;

export interface ProblemLimiter {
  tell(problem: InstrumentProblem): void;
  /** Tells what has been counted and ends the window. */
  flush(): void;
}

/** A tester at the wrong speed sends garbage without end: this keeps it from flooding a screen. */
export function createProblemLimiter(
  emit: (problem: InstrumentProblem) => void,
  { now, schedule }: InstrumentTime,
): ProblemLimiter {
  let told = 0;
  let counted = 0;
  let cancel = () => {};

  function flush(): void {
    cancel();
    const rest = counted;
    told = 0;
    counted = 0;
    if (rest === 0) return;
    const message = `${rest} more ${rest === 1 ? 'line' : 'lines'} like this from the tester. Check its speed and its line pattern.`;
    emit({ code: 'unreadable-line', message, raw: '', at: now() });
  }

  return {
    tell(problem) {
      if (told === 0) cancel = schedule(flush, WINDOW_MS);
      if (told < TOLD_PER_WINDOW) {
        told += 1;
        emit(problem);
      } else {
        counted += 1;
      }
    },
    flush,
  };
}
