import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';
import { Problem } from '@/server/problem';

interface Tries {
  signInByLogin: RateLimiterMemory;
  signInByAddress: RateLimiterMemory;
  setUp: RateLimiterMemory;
}

const createTries = (): Tries => ({
  signInByLogin: new RateLimiterMemory({ points: 10, duration: 5 * 60 }),
  signInByAddress: new RateLimiterMemory({ points: 40, duration: 5 * 60 }),
  // One code, one post: counted for everybody together.
  setUp: new RateLimiterMemory({ points: 10, duration: 5 * 60 }),
});

// Pages and actions may load their own copies of this module: one count for the process.
const holder = globalThis as typeof globalThis & { pullpostTries?: Tries };
const tries = (): Tries => (holder.pullpostTries ??= createTries());

/** Counts a try. @throws Problem `too-many` that says how long to wait. */
async function count(limiter: RateLimiterMemory, key: string): Promise<void> {
  try {
    await limiter.consume(key);
  } catch (error) {
    if (!(error instanceof RateLimiterRes)) throw error;
    const minutes = Math.max(1, Math.ceil(error.msBeforeNext / 60_000));
    const wait = minutes === 1 ? 'a minute' : `${minutes} minutes`;
    throw new Problem('too-many', `Too many tries. Wait ${wait} and try again.`);
  }
}

/** Counts a sign-in before its password is looked at, for its name and for its address. */
export async function countSignIn(login: string, address: string): Promise<void> {
  await count(tries().signInByAddress, address);
  await count(tries().signInByLogin, login);
}

/** A right password clears its name, and takes its own try off its address. */
export async function forgetSignIn(login: string, address: string): Promise<void> {
  await tries().signInByLogin.delete(login);
  await tries().signInByAddress.reward(address);
}

/** Counts a try at the set-up code. */
export const countSetUp = (): Promise<void> => count(tries().setUp, 'post');

/** Forgets every try; for tests. */
export function forgetTries(): void {
  holder.pullpostTries = createTries();
}
