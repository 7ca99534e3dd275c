import { randomInt } from 'node:crypto';
import type { Logger } from 'pino';
import type { Reader } from '@/db/client';
import { isSetUp } from '@/server/queries/staff/any';

// Without letters and digits that are taken for each other.
const ALPHABET = 'ABCDEFGHJKLMNPRTUVWXY346789';

/**
 * A new one-time code while the post has nobody to sign in, printed in the log; else null. Whoever
 * reads the log of the machine may set the post up.
 */
export async function setupCodeFor(db: Reader, logger: Logger): Promise<string | null> {
  if (await isSetUp(db)) return null;
  const letters = Array.from({ length: 8 }, () => ALPHABET.charAt(randomInt(ALPHABET.length))).join(
    '',
  );
  const code = `${letters.slice(0, 4)}-${letters.slice(4)}`;
  logger.warn(
    `This post has no owner yet. Open it in a browser; the one-time set-up code is ${code}`,
  );
  return code;
}
