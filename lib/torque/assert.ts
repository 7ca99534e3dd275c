/** Guards of the computation: bad input stops here and never becomes NaN further down. */

const shown = (value: unknown): string =>
  typeof value === 'number' || typeof value === 'string' ? String(value) : typeof value;

/**
 * The value, when it is a finite number.
 * @throws {TypeError} when it is no number; {RangeError} when it is NaN or infinite.
 */
export function finite(value: number, what: string): number {
  if (typeof value !== 'number')
    throw new TypeError(`${what} must be a number, not ${shown(value)}.`);
  if (!Number.isFinite(value))
    throw new RangeError(`${what} must be a finite number, not ${value}.`);
  return value;
}

/** The value, when it is finite and not negative. Throws like `finite`, and below zero. */
export function notNegative(value: number, what: string): number {
  if (finite(value, what) < 0)
    throw new RangeError(`${what} must not be negative, but is ${value}.`);
  return value;
}

/** The value, when it is finite and above zero. Throws like `finite`, and at or below zero. */
export function positive(value: number, what: string): number {
  if (finite(value, what) <= 0)
    throw new RangeError(`${what} must be above zero, but is ${value}.`);
  return value;
}

/** The value, when it is a whole number of at least `least`. */
export function wholeNumber(value: number, least: number, what: string): number {
  if (!Number.isInteger(finite(value, what)) || value < least) {
    throw new RangeError(`${what} must be a whole number of at least ${least}, but is ${value}.`);
  }
  return value;
}

/**
 * The value, when it is one of the known words.
 * @throws {RangeError} naming the words that are known.
 */
export function oneOf<T extends string>(value: T, known: readonly T[], what: string): T {
  if (!known.includes(value)) {
    throw new RangeError(
      `${what} '${shown(value)}' is not known; it is one of ${known.join(', ')}.`,
    );
  }
  return value;
}

/**
 * A range with its lower end not negative and its upper end above zero.
 * @throws {RangeError} when it is upside down, too.
 */
export function range(value: { min: number; max: number }, what: string): void {
  notNegative(value.min, `The lower end of ${what}`);
  positive(value.max, `The upper end of ${what}`);
  if (value.min > value.max) {
    throw new RangeError(
      `The lower end of ${what} (${value.min}) is above its upper end (${value.max}).`,
    );
  }
}
