import type { LineSnapshot } from '@/lib/live/contract';
import { withProgress, type BenchProgress } from '@/server/queries/line/progress';
import { createThrottle } from './throttle';

/** At most two line snapshots a second, however much happens. */
const LINE_WINDOW_MS = 500;

interface LineChannelOptions {
  /** Does anybody look at this line? What nobody sees is not read. */
  watched: (meetId: string) => boolean;
  read: (meetId: string) => Promise<LineSnapshot | null>;
  emit: (snapshot: LineSnapshot) => void;
  onError: (error: unknown) => void;
  /** Other processes write to the same store: never build on what this one remembers. */
  shared: boolean;
}

/**
 * The line of each meet as it was last shown. A change of the line is read again; a reading on a
 * bench only moves that bench's progress in what was shown, so that it costs no read.
 */
export function createLineChannel({ watched, read, emit, onError, shared }: LineChannelOptions) {
  const shown = new Map<string, LineSnapshot>();
  const stale = new Set<string>();
  const reading = new Set<string>();

  const throttle = createThrottle<string>(
    async (meetId) => {
      if (!watched(meetId)) return void stale.add(meetId);
      if (shared || stale.has(meetId) || !shown.has(meetId)) {
        stale.delete(meetId);
        reading.add(meetId);
        const snapshot = await read(meetId).finally(() => reading.delete(meetId));
        if (!snapshot) return;
        shown.set(meetId, snapshot);
      }
      emit(shown.get(meetId)!);
    },
    LINE_WINDOW_MS,
    onError,
  );

  return {
    changed(meetId: string): void {
      stale.add(meetId);
      throttle.poke(meetId);
    },
    progressed(meetId: string, progress: BenchProgress): void {
      const known = shown.get(meetId);
      if (known && !reading.has(meetId)) shown.set(meetId, withProgress(known, progress));
      else stale.add(meetId);
      throttle.poke(meetId);
    },
    close: () => throttle.close(),
  };
}
