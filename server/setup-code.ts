import { randomInt } from 'node:crypto';
import type { Reader } from '@/db/client';
import { isSetUp } from '@/server/queries/staff/any';

// Without letters and digits that are taken for each other.
const ALPHABET = 'ABCDEFGHJKLMNPRTUVWXY346789';

/**
 * A new one-time code while the post has nobody to sign in; else null. It is printed in the log
 * alone: whoever reads the log of the machine may set the post up.
 */
export async function setupCodeFor(db: Reader): Promise<string | null> {
  if (await isSetUp(db)) return null;
  const letters = Array.from({ length: 8 }, () => ALPHABET.charAt(randomInt(ALPHABET.length))).join(
    '',
  );
  return `${letters.slice(0, 4)}-${letters.slice(4)}`;
}

/** What the log says to whoever started a post that has no owner. */
export const setupWords = (code: string, origin: string): string =>
  `This post has no owner yet. Open ${origin} in a browser; the one-time set-up code is ${code}`;
