/** A source of numbers in [0, 1). */
export type RandomSource = () => number;

/**
 * A small seeded generator (the public-domain mulberry32): the same seed gives the same numbers on
 * every machine. For simulated tools and tests only, never for tokens or ids.
 * @param seed any whole number; only its lowest 32 bits count.
 * @throws RangeError when `seed` is not a whole number.
 */
export function mulberry32(seed: number): RandomSource {
  if (!Number.isSafeInteger(seed)) throw new RangeError(`A seed is a whole number, not ${seed}.`);
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 0x1_0000_0000;
  };
}

/**
 * One draw from the normal distribution with mean 0 and standard deviation 1 (Box and Muller,
 * 1958). Takes exactly two numbers from `random`, so that a sequence can be told in advance.
 */
export function standardNormal(random: RandomSource): number {
  const radius = Math.sqrt(-2 * Math.log(1 - random()));
  return radius * Math.cos(2 * Math.PI * random());
}
