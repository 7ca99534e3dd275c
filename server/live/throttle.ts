/**
 * Runs `work` for a key at once, and then at most every `windowMs`; calls in between are folded into
 * one at the window's end. Never two at a time for one key.
 */
export function createThrottle<Key>(
  work: (key: Key) => Promise<void>,
  windowMs: number,
  onError: (error: unknown) => void,
) {
  const states = new Map<Key, { again: boolean; timer: NodeJS.Timeout | null }>();
  let closed = false;

  const start = async (key: Key): Promise<void> => {
    const state = states.get(key)!;
    state.again = false;
    try {
      await work(key);
    } catch (error) {
      onError(error);
    }
    if (closed) return;
    state.timer = setTimeout(() => {
      state.timer = null;
      if (state.again) void start(key);
      else states.delete(key);
    }, windowMs);
    state.timer.unref();
  };

  return {
    poke(key: Key): void {
      if (closed) return;
      const state = states.get(key);
      if (state) {
        state.again = true;
        return;
      }
      states.set(key, { again: false, timer: null });
      void start(key);
    },
    close(): void {
      closed = true;
      for (const state of states.values()) if (state.timer) clearTimeout(state.timer);
      states.clear();
    },
  };
}
