import path from 'node:path';
import { and, eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { openStore, type Database } from '@/db/client';
import { lockDataFolder } from '@/db/lock';
import { checks, posts, tags } from '@/db/schema';
import { abandonCheck } from '@/server/commands/check/abandon';
import { startCheck } from '@/server/commands/check/start';
import type { CommandContext } from '@/server/commands/command';
import { recordPull } from '@/server/commands/pull/record';
import { callTag } from '@/server/commands/tag/call';
import { takeOnBench } from '@/server/commands/tag/take-on-bench';
import { actorOf, fixedId, makeWorld } from '../../support/factories';
import { startInput } from '../../support/line';
import { TEST_NOW, TEST_SECRET } from '../../support/store';
import { pullFor, stepsOf } from '../one-check';
import type { AcceptedPull } from './kills';

/** Wherever the one before was killed: the tag lies on the bench and a check has just begun. */
async function beginCheck(ctx: CommandContext): Promise<string> {
  const benchId = fixedId('bench', 1);
  const tagId = fixedId('tag', 1);
  const place = { benchId, tagId };
  const [running] = await ctx.db
    .select({ id: checks.id })
    .from(checks)
    .where(and(eq(checks.tagId, tagId), eq(checks.state, 'running')));
  if (running) {
    await abandonCheck(ctx, uuidv7(), { tagId, to: 'visitor', reason: 'The drill begins again.' });
  }
  const state = await stateOf(ctx.db, tagId);
  if (state === 'waiting') await callTag(ctx, uuidv7(), place);
  if (state !== 'on_bench') await takeOnBench(ctx, uuidv7(), place);
  return (await startCheck(ctx, uuidv7(), startInput(benchId, tagId))).checkId;
}

async function stateOf(db: Database, tagId: string): Promise<string | undefined> {
  return (await db.select({ state: tags.state }).from(tags).where(eq(tags.id, tagId)))[0]?.state;
}

/** Records pulls until it is killed. Says each one once the command has answered, and not before. */
async function main(dataDir: string): Promise<never> {
  await lockDataFolder(dataDir, new Date());
  const store = await openStore({ kind: 'folder', dataDir: path.join(dataDir, 'db') });
  const [there] = await store.db.select({ id: posts.id }).from(posts);
  if (!there) await makeWorld(store.db);
  let diskMs = 0;
  const ctx: CommandContext = {
    db: store.db,
    actor: actorOf({ id: fixedId('staff', 1), sessionVersion: 1 }),
    clock: () => TEST_NOW,
    secret: TEST_SECRET,
    async flush() {
      const began = performance.now();
      await store.flush();
      diskMs = performance.now() - began;
    },
    publish: () => undefined,
  };
  for (;;) {
    const checkId = await beginCheck(ctx);
    for (const step of await stepsOf(store.db, checkId)) {
      const began = performance.now();
      const { pullId } = await recordPull(ctx, uuidv7(), pullFor(checkId, step));
      const said: AcceptedPull = { pullId, commandMs: performance.now() - began, diskMs };
      process.stdout.write(`${JSON.stringify(said)}\n`);
    }
  }
}

main(process.argv[2]!).catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
