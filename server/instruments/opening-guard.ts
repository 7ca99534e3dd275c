import type { Schedule } from './instrument';

/**
 * A port can be opened while its tester is in the middle of a line: the end of '112.5' reads as
 * '2.5'. What comes before the line has been quiet for this long is not trusted.
 */
const QUIET_MS = 100;
/** A tester that is never quiet is let through after this many milliseconds, at a line's end. */
const RESTLESS_MS = 1000;

export interface OpeningGuard {
  start(): void;
  stop(): void;
  /** Whether what comes now is still held back. */
  holds(): boolean;
  /** Keeps what came, and waits for quiet again. */
  keep(texts: string[]): void;
}

/** Holds back what a tester sends while its port opens; `onSettled` is handed all of it. */
export function createOpeningGuard(options: {
  schedule: Schedule;
  onSettled(early: string[], restless: boolean): void;
}): OpeningGuard {
  const { schedule, onSettled } = options;
  let early: string[] = [];
  let holding = false;
  let cancelQuiet = () => {};
  let cancelRestless = () => {};

  function stop(): void {
    holding = false;
    cancelQuiet();
    cancelRestless();
  }

  function settle(restless: boolean): void {
    stop();
    onSettled(early, restless);
  }

  function awaitQuiet(): void {
    cancelQuiet();
    cancelQuiet = schedule(() => settle(false), QUIET_MS);
  }

  return {
    start() {
      stop();
      early = [];
      holding = true;
      awaitQuiet();
      cancelRestless = schedule(() => settle(true), RESTLESS_MS);
    },
    stop,
    holds: () => holding,
    keep(texts) {
      early.push(...texts);
      awaitQuiet();
    },
  };
}
