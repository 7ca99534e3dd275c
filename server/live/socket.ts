import { eq } from 'drizzle-orm';
import { unsealData } from 'iron-session';
import { Server } from 'socket.io';
import type { Server as HttpServer } from 'node:http';
import type { Logger } from 'pino';
import type { Reader } from '@/db/client';
import { tags } from '@/db/schema';
import {
  joinRoomInput,
  type ClientToServer,
  type JoinRoomInput,
  type ServerToClient,
} from '@/lib/live/contract';
import type { Actor } from '@/server/access/actor';
import { hashToken } from '@/server/access/links';
import { allows, type Permission } from '@/server/access/policy';
import { SESSION_COOKIE, type SessionData } from '@/server/access/session';
import { standingOf } from '@/server/access/standing';
import { benchSnapshot } from '@/server/queries/bench/snapshot';
import { checkSnapshot } from '@/server/queries/check/snapshot';
import { deskSnapshot } from '@/server/queries/desk/snapshot';
import { lineSnapshot } from '@/server/queries/line/snapshot';
import { ticketSnapshot } from '@/server/queries/ticket/snapshot';
import type { InstrumentManager } from '@/server/instruments/manager';
import { Problem, toProblemDocument } from '@/server/problem';
import type { LiveServer } from './hub';
import { rooms } from './rooms';

interface SocketOptions {
  http: HttpServer;
  db: Reader;
  clock: () => Date;
  secret: string;
  logger: Logger;
  instruments: () => Pick<InstrumentManager, 'status'>;
}

/** How often every screen is told that the post is there; the board shows a loss within 5 s. */
const HEARD_EVERY_MS = 2000;

/** Each entry reads a snapshot: far above what a phone asks for that wakes again and again. */
const MOST_ENTRIES = 30;
const ENTRIES_WINDOW_MS = 10_000;

const cookieValue = (header: string | undefined, name: string): string | undefined =>
  header
    ?.split(';')
    .map((part) => part.trim())
    .find((part) => part.startsWith(`${name}=`))
    ?.slice(name.length + 1);

/** The socket server: who may enter a room, and what they are shown on entering. */
export function createSocketServer(options: SocketOptions): {
  io: LiveServer;
  close(): Promise<void>;
} {
  const { http, db, clock, secret, logger, instruments } = options;
  const io: LiveServer = new Server<ClientToServer, ServerToClient>(http, {
    destroyUpgrade: false,
    serveClient: false,
    pingInterval: 10_000,
    pingTimeout: 8_000,
    maxHttpBufferSize: 100_000,
  });

  async function actorOf(cookie: string | undefined): Promise<Actor> {
    const sealed = cookieValue(cookie, SESSION_COOKIE);
    if (!sealed) return { kind: 'public' };
    const session = await unsealData<SessionData>(decodeURIComponent(sealed), {
      password: secret.slice(0, 64),
    });
    return session.staffId
      ? { kind: 'staff', staffId: session.staffId, sessionVersion: session.sessionVersion ?? 0 }
      : { kind: 'public' };
  }

  io.on('connection', (socket) => {
    const actor = actorOf(socket.handshake.headers.cookie);
    actor.then(
      (who) => who.kind === 'staff' && socket.join(rooms.staff(who.staffId)),
      (error: unknown) => logger.warn({ err: error }, 'a session cookie could not be read'),
    );

    const permit = async (permission: Permission) => {
      const standing = await standingOf(db, await actor);
      if (!allows(permission, standing)) {
        throw new Problem(
          standing === 'public' ? 'sign-in' : 'forbidden',
          'Sign in with a role that may see this.',
        );
      }
    };

    const enter = async (input: JoinRoomInput): Promise<void> => {
      const now = clock();
      switch (input.room) {
        case 'line': {
          // In the room before the read: a change in between reaches it either way.
          await socket.join(rooms.line(input.meetId));
          const snapshot = await lineSnapshot(db, input.meetId, now);
          if (!snapshot) {
            await socket.leave(rooms.line(input.meetId));
            throw new Problem('not-found', 'There is no such meet.');
          }
          socket.emit('line:changed', snapshot);
          return;
        }
        case 'ticket': {
          const [tag] = await db
            .select({ id: tags.id })
            .from(tags)
            .where(eq(tags.ticketHash, hashToken(input.token)));
          if (!tag) throw new Problem('not-found', 'There is no such ticket.');
          await socket.join(rooms.ticket(tag.id));
          const snapshot = await ticketSnapshot(db, tag.id, now, secret);
          if (snapshot) socket.emit('ticket:changed', snapshot);
          return;
        }
        case 'check': {
          await permit('read.bench');
          await socket.join(rooms.check(input.benchId));
          const bench = await benchSnapshot(
            { reader: db, now, secret, instruments: instruments() },
            input.benchId,
          );
          if (!bench) throw new Problem('not-found', 'There is no such bench.');
          socket.emit('bench:changed', bench);
          socket.emit('check:changed', await checkSnapshot(db, input.benchId, now));
          return;
        }
        case 'desk': {
          await permit('read.desk');
          await socket.join(rooms.desk(input.meetId));
          const desk = await deskSnapshot(db, input.meetId, now);
          if (!desk) throw new Problem('not-found', 'There is no such meet.');
          socket.emit('desk:changed', desk);
          return;
        }
      }
    };

    let entries = { sinceMs: 0, count: 0 };
    const isFlood = (): boolean => {
      const nowMs = clock().getTime();
      if (nowMs - entries.sinceMs > ENTRIES_WINDOW_MS) entries = { sinceMs: nowMs, count: 0 };
      entries.count += 1;
      return entries.count > MOST_ENTRIES;
    };

    socket.on('room:join', (raw, ack) => {
      const answer = typeof ack === 'function' ? ack : () => undefined;
      if (isFlood())
        return answer({ ok: false, code: 'too-many', detail: 'Asked too often. Reload the page.' });
      const parsed = joinRoomInput.safeParse(raw);
      if (!parsed.success) return answer({ ok: false, code: 'invalid', detail: 'Unknown room.' });
      enter(parsed.data).then(
        () => answer({ ok: true }),
        (error: unknown) => {
          const problem = toProblemDocument(error);
          if (problem.code === 'internal')
            logger.error({ err: error }, 'a room could not be entered');
          answer({ ok: false, code: problem.code, detail: problem.detail });
        },
      );
    });
  });

  const heard = setInterval(() => io.emit('post:heard', clock().toISOString()), HEARD_EVERY_MS);
  heard.unref();
  return {
    io,
    // The HTTP server is its owner's to close; `io.close` would wait for it and for every sleeping phone.
    async close() {
      clearInterval(heard);
      io.disconnectSockets(true);
      io.engine.close();
      await io.of('/').adapter.close();
    },
  };
}
