/** Words that several files of the computation share. */

export const DIRECTIONS = ['cw', 'ccw'] as const;
/** The way a tool turns: clockwise or counter-clockwise. */
export type Direction = (typeof DIRECTIONS)[number];

export const BASES = ['reference', 'set'] as const;
/**
 * What a deviation is relative to. `reference`: 100·(x_a − x_r)/x_r, ISO 6789.
 * `set`: 100·(x_r − x_a)/x_a, common in US documents; its sign is the other way round.
 */
export type Basis = (typeof BASES)[number];
