import { createHash, timingSafeEqual } from 'node:crypto';
import { plainCode } from '@/lib/desk/set-up';
import { Problem } from '@/server/problem';
import { countSetUp } from './tries';

const digest = (text: string): Buffer => createHash('sha256').update(plainCode(text)).digest();

/**
 * Compares a typed set-up code with the post's, in constant time.
 * @throws Problem `invalid` when it is another one, `too-many` after too many tries.
 */
export async function checkSetUpCode(expected: string, given: string): Promise<void> {
  await countSetUp();
  if (timingSafeEqual(digest(expected), digest(given))) return;
  const message = 'This is not the code in the server’s log. It changes at each start.';
  throw new Problem('invalid', message, { fields: { setupCode: message } });
}
