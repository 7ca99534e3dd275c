import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { staff } from '@/db/schema';
import { Problem } from '@/server/problem';
import { verifyPassword } from './password';
import { countSignIn, forgetSignIn } from './tries';

/**
 * The id of the person whose name and password these are. An unknown name, a wrong password and an
 * account that is switched off get the same words, after the same time.
 * @throws Problem `sign-in`, or `too-many`.
 */
export async function checkPassword(
  reader: Reader,
  { login, password, address }: { login: string; password: string; address: string },
): Promise<string> {
  const name = login.trim().toLowerCase().slice(0, 100);
  await countSignIn(name, address);
  const [person] = await reader.select().from(staff).where(eq(staff.login, name));
  const known = person?.active ? person : null;
  if (!(await verifyPassword(known?.passwordHash ?? null, password.slice(0, 1000))) || !known) {
    throw new Problem('sign-in', 'This name and password do not belong together.');
  }
  await forgetSignIn(name, address);
  return known.id;
}
