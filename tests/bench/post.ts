import { createServer } from 'node:http';
import { PGlite } from '@electric-sql/pglite';
import { sealData } from 'iron-session';
import pino from 'pino';
import { v7 as uuidv7 } from 'uuid';
import { openStore, type Database } from '@/db/client';
import type { Actor } from '@/server/access/actor';
import { SESSION_COOKIE, type SessionData } from '@/server/access/session';
import type { CommandContext } from '@/server/commands/command';
import { createHub } from '@/server/live/hub';
import { createSocketServer } from '@/server/live/socket';
import { actorOf, makeTag, makeWorld } from '../support/factories';
import { TEST_NOW, TEST_SECRET } from '../support/store';
import { sharedMs } from './clock';
import { listen } from './listen';

export type World = Awaited<ReturnType<typeof makeWorld>>;

export interface BenchPost {
  db: Database;
  /** The same store without Drizzle. */
  client: PGlite;
  world: World;
  url: string;
  secret: string;
  clock: () => Date;
  operator: Actor;
  /** The operator's cookie, as a browser sends it. */
  cookie: string;
  /** For a command by the operator; `committed` says when it was committed and at which revision. */
  context(): { ctx: CommandContext; committed: () => { atMs: number; revision: number } };
  close(): Promise<void>;
}

/** The real store, commands, hub and socket server, with a line of `tags` waiting tags. */
export async function openPost({ tags }: { tags: number }): Promise<BenchPost> {
  const store = await openStore({ kind: 'memory' });
  const { db } = store;
  const world = await makeWorld(db);
  for (let number = 2; number <= tags; number += 1) await makeTag(db, number);

  const began = Date.now();
  const clock = () => new Date(TEST_NOW.getTime() + Date.now() - began);
  const logger = pino({ level: 'error' }, pino.destination(2));
  const instruments = () => ({ status: () => null });
  const http = createServer();
  const shared = { db, clock, secret: TEST_SECRET, logger, instruments };
  const hub = createHub({ ...shared, shared: false });
  const sockets = createSocketServer({ ...shared, http });
  hub.attach(sockets.io);

  const operator = actorOf(world.staff.operator);
  const session: SessionData = {
    staffId: world.staff.operator.id,
    sessionVersion: world.staff.operator.sessionVersion,
  };
  const sealed = await sealData(session, { password: TEST_SECRET.slice(0, 64) });

  return {
    db,
    client: clientOf(db),
    world,
    clock,
    operator,
    secret: TEST_SECRET,
    url: await listen(http),
    cookie: `${SESSION_COOKIE}=${encodeURIComponent(sealed)}`,
    context() {
      let done: { atMs: number; revision: number } | null = null;
      const publish: CommandContext['publish'] = (events, revision) => {
        done = { atMs: sharedMs(), revision };
        hub.publish(events, revision);
      };
      return {
        ctx: { db, actor: operator, clock, secret: TEST_SECRET, publish },
        committed: () => {
          if (!done) throw new Error('The command has published nothing.');
          return done;
        },
      };
    },
    async close() {
      hub.close();
      await sockets.close();
      await store.close();
    },
  };
}

function clientOf(db: Database): PGlite {
  const client = '$client' in db ? db.$client : null;
  if (!(client instanceof PGlite)) throw new Error('The store is no PGlite.');
  return client;
}

/** The id of one call of a command. */
export const callId = (): string => uuidv7();
