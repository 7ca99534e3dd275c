import type { InstrumentTime } from '@/server/instruments/instrument';

/** A clock and timers that move only when told. */
export interface ManualTime extends InstrumentTime {
  /** Moves on by `ms` milliseconds, running what falls due in its order, promises between. */
  advance(ms: number): Promise<void>;
  /** Delays of the timers that are set, in milliseconds from now, the next first. */
  pending(): number[];
}

export function createManualTime(start = '2026-06-13T08:00:00Z'): ManualTime {
  let nowMs = Date.parse(start);
  let timers: { dueMs: number; run: () => void }[] = [];
  const settle = () => new Promise<void>((resolve) => setImmediate(resolve));

  return {
    now: () => new Date(nowMs),
    schedule(run, delayMs) {
      const timer = { dueMs: nowMs + delayMs, run };
      timers.push(timer);
      return () => (timers = timers.filter((other) => other !== timer));
    },
    async advance(ms) {
      const endMs = nowMs + ms;
      await settle();
      for (;;) {
        const next = timers
          .filter(({ dueMs }) => dueMs <= endMs)
          .sort((a, b) => a.dueMs - b.dueMs)[0];
        if (!next) break;
        timers = timers.filter((timer) => timer !== next);
        nowMs = next.dueMs;
        next.run();
        await settle();
      }
      nowMs = endMs;
    },
    pending: () => timers.map(({ dueMs }) => dueMs - nowMs).sort((a, b) => a - b),
  };
}
