import type { RandomSource } from '@/lib/signal/random';
import { PACE } from './pace';

/** Forgotten after so long: whoever it was about has gone, or a person has taken over. */
const STALE_MS = 600_000;

export interface Timing {
  /**
   * Has the time for this come? The first question about a key draws its time; once the answer was
   * yes, the key is new again.
   */
  isDue(what: keyof typeof PACE, key: string): boolean;
}

export function createTiming(clock: () => Date, random: RandomSource): Timing {
  const due = new Map<string, number>();
  return {
    isDue(what, key) {
      const now = clock().getTime();
      const name = `${what} ${key}`;
      const at = due.get(name);
      if (at === undefined || now - at > STALE_MS) {
        const [from, to] = PACE[what];
        due.set(name, now + 1000 * (from + (to - from) * random()));
        for (const [other, then] of due) if (now - then > STALE_MS) due.delete(other);
        return false;
      }
      if (now < at) return false;
      due.delete(name);
      return true;
    },
  };
}
