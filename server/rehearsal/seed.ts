import { eq, ne } from 'drizzle-orm';
import { commandRuns, posts } from '@/db/schema';
import type { Database } from '@/db/client';
import { mulberry32 } from '@/lib/signal/random';
import type { Runtime } from '@/server/runtime';
import { openBench } from '@/server/commands/bench/set-state';
import { addAccounts, CREW } from './accounts';
import { benchScripts } from './bench-script';
import { direct, storyClock } from './director';
import { BENCH_IDS, CURTAIN, POST_ID } from './ids';
import { lineScripts } from './line-script';
import { addMeet, addPost } from './place';
import { proofScripts } from './proofs';
import { as, staffActor } from './stage';
import { telling } from './told';
import { addTesters } from './testers';

const SEED = 20_260_613;
/** Minutes before the rehearsal opens at which the post was set up. */
const SET_UP_AT = 175;

/** @throws Error when the store holds somebody's own post. */
export async function refuseOthers(db: Database): Promise<void> {
  const [other] = await db.select({ name: posts.name }).from(posts).where(ne(posts.id, POST_ID));
  if (!other) return;
  throw new Error(
    `The configuration cannot be used for a rehearsal: this store belongs to the post ${other.name}. ` +
      'Set PULLPOST_DATA to another folder, or leave it out.',
  );
}

/**
 * Tells the story of a made-up morning, through the commands that people use and with a clock that
 * runs through the last three hours. Does nothing when it has been told; when it was cut short, every
 * command has a fixed id, so that it is told again without doing anything twice.
 */
export async function seed(runtime: Pick<Runtime, 'store' | 'secret' | 'clock'>): Promise<void> {
  const { db } = runtime.store;
  const [told] = await db
    .select({ id: commandRuns.id })
    .from(commandRuns)
    .where(eq(commandRuns.id, CURTAIN));
  if (told) return;

  const opened = runtime.clock();
  const setUpAt = new Date(opened.getTime() - SET_UP_AT * 60_000);
  await addPost(db, setUpAt);
  await addAccounts(db, setUpAt);
  await addTesters(db, setUpAt);
  await addMeet(db, opened, setUpAt);

  const clock = storyClock(setUpAt);
  // Nobody listens yet, so nothing is published.
  const stage = { db, secret: runtime.secret, clock: clock.now, publish: () => undefined };
  const story = telling(stage, mulberry32(SEED), opened);
  await direct([...proofScripts(story), ...lineScripts(story), ...benchScripts(story)], clock);
  await openBench(as(stage, staffActor(CREW[0]!.id)), CURTAIN, { benchId: BENCH_IDS[0] });
}
