import type { Server } from 'socket.io';
import type { Logger } from 'pino';
import type { Reader } from '@/db/client';
import type { ClientToServer, ServerToClient } from '@/lib/live/contract';
import { benchOfTester, benchSnapshot } from '@/server/queries/bench/snapshot';
import { checkView } from '@/server/queries/check/view';
import { deskSnapshot } from '@/server/queries/desk/snapshot';
import { progressOf } from '@/server/queries/line/progress';
import { lineSnapshot } from '@/server/queries/line/snapshot';
import { ticketOfFile, ticketSnapshot } from '@/server/queries/ticket/snapshot';
import type { InstrumentManager } from '@/server/instruments/manager';
import type { LiveEvent } from './events';
import { createLineChannel } from './line-channel';
import { rooms } from './rooms';
import { createThrottle } from './throttle';
import { atOnce, createTurns } from './turns';

export type LiveServer = Server<ClientToServer, ServerToClient>;

export interface LiveHub {
  /** Tells the rooms what a committed command changed. Returns at once. */
  publish(events: LiveEvent[], revision: number): void;
  /** A tester's connection changed: no command did it. */
  instrumentChanged(testerId: string): void;
  /** Tells the bench of this tester something that changed nothing. */
  notice(testerId: string, words: string): void;
  attach(io: LiveServer): void;
  /** For what the process itself must follow, such as a changed tester. */
  onEvent(listener: (event: LiveEvent) => void): void;
  close(): void;
}

interface HubOptions {
  db: Reader;
  clock: () => Date;
  secret: string;
  logger: Logger;
  instruments: () => Pick<InstrumentManager, 'status'>;
  /** True when other processes write to the same store. */
  shared: boolean;
}

/** The only code that turns what commands published into emits. */
export function createHub(options: HubOptions): LiveHub {
  const { db, clock, secret, logger, instruments, shared } = options;
  let io: LiveServer | null = null;
  const listeners: ((event: LiveEvent) => void)[] = [];
  let closed = false;
  const onError = (error: unknown) => {
    // A read that was under way when the store was closed concerns nobody.
    if (!closed) logger.error({ err: error }, 'a live snapshot failed');
  };

  const inTurn = shared ? atOnce : createTurns();
  // Who is connected to another process is not known here.
  const watched = (room: string) => shared || (io?.sockets.adapter.rooms.has(room) ?? false);

  const line = createLineChannel({
    watched: (meetId) => watched(rooms.line(meetId)),
    read: (meetId) => inTurn(() => lineSnapshot(db, meetId, clock())),
    emit: (snapshot) => io?.to(rooms.line(snapshot.meetId)).emit('line:changed', snapshot),
    onError,
    shared,
  });
  const desk = createThrottle<string>(
    async (meetId) => {
      if (!watched(rooms.desk(meetId))) return;
      const snapshot = await inTurn(() => deskSnapshot(db, meetId, clock()));
      if (snapshot) io?.to(rooms.desk(meetId)).emit('desk:changed', snapshot);
    },
    500,
    onError,
  );
  const bench = createThrottle<string>(
    async (benchId) => {
      if (!watched(rooms.check(benchId))) return;
      const snapshot = await inTurn(() =>
        benchSnapshot({ reader: db, now: clock(), secret, instruments: instruments() }, benchId),
      );
      if (snapshot) io?.to(rooms.check(benchId)).emit('bench:changed', snapshot);
    },
    100,
    onError,
  );
  const ticket = createThrottle<string>(
    async (tagId) => {
      if (!watched(rooms.ticket(tagId))) return;
      const snapshot = await inTurn(() => ticketSnapshot(db, tagId, clock(), secret));
      if (snapshot) io?.to(rooms.ticket(tagId)).emit('ticket:changed', snapshot);
    },
    100,
    onError,
  );

  function one(event: LiveEvent, revision: number): void {
    switch (event.kind) {
      case 'line':
        return line.changed(event.meetId);
      case 'tag':
        return ticket.poke(event.tagId);
      case 'bench':
        return bench.poke(event.benchId);
      case 'check': {
        // The facts are in hand: bench and phone get them now, without another read.
        const { file } = event;
        const at = clock().toISOString();
        const check = checkView(file);
        io?.to(rooms.check(file.check.benchId)).emit('check:changed', { revision, at, check });
        io?.to(rooms.ticket(file.tag.id)).emit(
          'ticket:changed',
          ticketOfFile(file, check, { revision, at }),
        );
        line.progressed(file.tag.meetId, progressOf(file.check.benchId, check, { revision, at }));
        return;
      }
      case 'check-ended': {
        const at = clock().toISOString();
        io?.to(rooms.check(event.benchId)).emit('check:changed', { revision, at, check: null });
        return;
      }
      case 'staff':
        io?.in(rooms.staff(event.staffId)).disconnectSockets(true);
        return;
      case 'testers':
        return;
    }
  }

  return {
    publish(events, revision) {
      for (const event of events) {
        // What is committed stays so, whatever becomes of its news: the caller is not told a lie.
        for (const tell of [
          () => one(event, revision),
          ...listeners.map((one) => () => one(event)),
        ]) {
          try {
            tell();
          } catch (error) {
            onError(error);
          }
        }
      }
      // The desk reads the most; it comes after those who wait for their turn.
      for (const event of events) {
        if (event.kind === 'line') desk.poke(event.meetId);
        if (event.kind === 'check') desk.poke(event.file.tag.meetId);
      }
    },
    instrumentChanged(testerId) {
      benchOfTester(db, testerId).then((benchId) => benchId && bench.poke(benchId), onError);
    },
    notice(testerId, words) {
      const at = clock().toISOString();
      benchOfTester(db, testerId).then(
        (benchId) => benchId && io?.to(rooms.check(benchId)).emit('bench:noticed', { at, words }),
        onError,
      );
    },
    attach: (server) => {
      io = server;
    },
    onEvent: (listener) => {
      listeners.push(listener);
    },
    close() {
      closed = true;
      line.close();
      for (const throttle of [desk, bench, ticket]) throttle.close();
      io = null;
    },
  };
}
