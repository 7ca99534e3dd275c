import { RateLimiterMemory, type RateLimiterRes } from 'rate-limiter-flexible';

/** All phones of a meet may share one address, so the limit is far above an honest crowd. */
const PER_ADDRESS = 60;
/** An address can be made up by whoever sends it; this one holds for the post as a whole. */
const PER_POST = 240;
const WINDOW_SECONDS = 60;

interface Limits {
  address: RateLimiterMemory;
  post: RateLimiterMemory;
}

// A module may be loaded more than once in one process; the counts must not be.
const holder = globalThis as typeof globalThis & { pullpostJoinLimits?: Limits };

const limits = (): Limits =>
  (holder.pullpostJoinLimits ??= {
    address: new RateLimiterMemory({ points: PER_ADDRESS, duration: WINDOW_SECONDS }),
    post: new RateLimiterMemory({ points: PER_POST, duration: WINDOW_SECONDS }),
  });

const isRefusal = (error: unknown): error is RateLimiterRes =>
  error !== null && typeof error === 'object' && 'msBeforeNext' in error;

/** Counts one try to join; the seconds to wait when there were too many, else null. */
export async function countJoin(address: string): Promise<number | null> {
  try {
    await limits().address.consume(address);
    await limits().post.consume('post');
    return null;
  } catch (error) {
    if (!isRefusal(error)) throw error;
    return Math.max(1, Math.ceil(error.msBeforeNext / 1000));
  }
}
