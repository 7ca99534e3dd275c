/** One thread of the story. It yields the instant of its next scene before it plays it. */
export type Script = AsyncGenerator<Date, void, void>;

export interface StoryClock {
  now: () => Date;
  moveTo(instant: Date): void;
}

/** A clock that a story moves, and that never goes back. */
export function storyClock(start: Date): StoryClock {
  let current = start;
  return {
    now: () => current,
    moveTo: (instant) => {
      if (instant > current) current = instant;
    },
  };
}

/**
 * Plays scripts side by side, always the one whose scene comes next, so that what happens at two
 * benches at once is written in the order in which it happened.
 */
export async function direct(scripts: readonly Script[], clock: StoryClock): Promise<void> {
  const cues: { script: Script; at: Date }[] = [];
  for (const script of scripts) {
    const first = await script.next();
    if (!first.done) cues.push({ script, at: first.value });
  }
  for (;;) {
    const next = cues.reduce<(typeof cues)[number] | null>(
      (best, cue) => (best === null || cue.at < best.at ? cue : best),
      null,
    );
    if (!next) return;
    clock.moveTo(next.at);
    const scene = await next.script.next();
    if (scene.done) cues.splice(cues.indexOf(next), 1);
    else next.at = scene.value;
  }
}
