import { eq, ne } from 'drizzle-orm';
import { commandRuns, posts } from '@/db/schema';
import type { Database } from '@/db/client';
import { mulberry32 } from '@/lib/signal/random';
import { openBench } from '@/server/commands/bench/set-state';
import type { Runtime } from '@/server/runtime';
import { benchScripts } from './bench-script';
import { direct, storyClock } from './director';
import { CURTAIN, POST_ID } from './ids';
import { lineScripts } from './line-script';
import { proofScripts } from './proof-script';
import { setUp } from './set-up';
import { fixedIds, runner, type Stage } from './stage';
import type { Telling } from './told';

const SEED = 20_260_613;
/** How long before the rehearsal opens the post was set up, in milliseconds. */
const STORY_MS = 175 * 60_000;

/** @throws Error when the store holds somebody's own post. */
export async function refuseOthers(db: Database): Promise<void> {
  const [other] = await db.select({ name: posts.name }).from(posts).where(ne(posts.id, POST_ID));
  if (!other) return;
  throw new Error(
    `The configuration cannot be used for a rehearsal: this store belongs to the post ${other.name}. ` +
      'Set PULLPOST_DATA to another folder, or leave it out.',
  );
}

/** When the story opens: now, unless one that was cut short had begun. */
async function openingOf(db: Database, now: Date): Promise<Date> {
  const [post] = await db.select().from(posts).where(eq(posts.id, POST_ID));
  return post ? new Date(post.createdAt.getTime() + STORY_MS) : now;
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

  const opened = await openingOf(db, runtime.clock());
  const clock = storyClock(new Date(opened.getTime() - STORY_MS));
  // Nobody listens yet, so nothing is published.
  const stage: Stage = { db, secret: runtime.secret, clock: clock.now, publish: () => undefined };
  const run = runner(stage, fixedIds());
  const setting = await setUp(stage, run, opened);
  const random = mulberry32(SEED);
  const story: Telling = { stage, run, setting, random, opened, tags: new Map() };
  await direct([...proofScripts(story), ...lineScripts(story), ...benchScripts(story)], clock);
  await openBench({ ...stage, actor: setting.lead }, CURTAIN, {
    benchId: setting.benches[0]!.id,
  });
}
