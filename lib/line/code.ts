/** Letters that cannot be taken for a digit or for each other: no I, O, Q, S, Z. */
export const TAG_LETTERS = 'ABCDEFGHJKLMNPRTUVWXY';

/** How many tags one meet can have. */
export const TAGS_PER_MEET = TAG_LETTERS.length * 99;

/**
 * The code of the n-th tag of a meet (1-based): A01 … A99, B01 … Y99.
 * @throws RangeError when `sequence` is not a whole number from 1 to {@link TAGS_PER_MEET}.
 */
export function tagCode(sequence: number): string {
  if (!Number.isInteger(sequence) || sequence < 1 || sequence > TAGS_PER_MEET) {
    throw new RangeError(`A meet has tags 1 to ${TAGS_PER_MEET}, not ${sequence}.`);
  }
  const letter = TAG_LETTERS.charAt(Math.floor((sequence - 1) / 99));
  return `${letter}${String(((sequence - 1) % 99) + 1).padStart(2, '0')}`;
}

/** A typed code in its canonical form ('a 7' → 'A07'), or null when it cannot be one. */
export function parseTagCode(text: string): string | null {
  const match = /^\s*([A-Za-z])\s*-?\s*(\d{1,2})\s*$/.exec(text);
  if (!match) return null;
  const letter = match[1]!.toUpperCase();
  const number = Number(match[2]);
  return TAG_LETTERS.includes(letter) && number >= 1
    ? `${letter}${String(number).padStart(2, '0')}`
    : null;
}
