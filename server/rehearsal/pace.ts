/** How fast the simulated meet goes: from and to, in seconds. Slower than a game, faster than life. */
export const PACE = {
  join: [20, 40],
  call: [4, 9],
  come: [6, 18],
  givenUp: [35, 50],
  comeBack: [80, 160],
  start: [5, 10],
  pull: [1.5, 3],
  signOff: [3, 6],
  handOver: [6, 12],
  collect: [40, 120],
} as const satisfies Record<string, readonly [number, number]>;

/** Milliseconds between two looks at the meet. */
export const STEP_MS = 1000;

/** Nobody joins a longer line than this. */
export const MAX_WAITING = 24;

/** One in so many simulated visitors does not come at the first call. */
export const ABSENT_ONE_IN = 9;

/** The share of joins after which somebody who waits withdraws. */
export const WITHDRAW_SHARE = 0.07;

/** The share of checked tools that are hung on a peg until their owners come. */
export const PEG_SHARE = 0.3;
