import { hash, verify } from '@node-rs/argon2';

// OWASP's first choice for argon2id: 19 MiB, two passes, one lane. The library's default algorithm
// is argon2id; its enum cannot be named under isolated modules.
const PARAMETERS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** A password as it is stored: argon2id with its own salt and parameters in the text. */
export const hashPassword = (password: string): Promise<string> => hash(password, PARAMETERS);

// Of a password that nobody has: what an unknown sign-in name is verified against.
const DUMMY =
  '$argon2id$v=19$m=19456,t=2,p=1$/8+RpFJpBPxbQ+P3qfUW8Q$KneVGbau7qE0AflJxn7D1Xr04Y0l/Mr9lj7VHBk8c3I';

/**
 * Whether the password belongs to the hash. Without a hash (unknown name, account switched off) it
 * takes as long and says no.
 */
export async function verifyPassword(
  passwordHash: string | null,
  password: string,
): Promise<boolean> {
  const matches = await verify(passwordHash ?? DUMMY, password);
  return passwordHash !== null && matches;
}
