'use client';

import { useEffect, useRef, useState } from 'react';
import type { JoinRoomInput, ServerToClient, Snapshot } from '@/lib/live/contract';
import { liveSocket } from './socket';

type SnapshotEvent = {
  [Name in keyof ServerToClient]: Parameters<ServerToClient[Name]>[0] extends Snapshot
    ? Name
    : never;
}[keyof ServerToClient];

export interface RoomState {
  /** False from the moment that nothing was heard for {@link SILENCE_MS}, or the line broke. */
  connected: boolean;
  /** When the post was last heard; null before the first time. */
  heardAt: Date | null;
  /** The post refused the room: signed out, or no such thing. */
  refused: string | null;
}

/** The post speaks every two seconds; twice missed is a loss. The board must show it within five. */
const SILENCE_MS = 4500;

/** Keeps this page in a live room, also after sleep and reconnection. Each event goes to `on`. */
export function useRoom(
  room: JoinRoomInput,
  on: { [Name in SnapshotEvent]?: (snapshot: Parameters<ServerToClient[Name]>[0]) => void } & {
    'bench:noticed'?: ServerToClient['bench:noticed'];
  },
): RoomState {
  const [state, setState] = useState<RoomState>({ connected: true, heardAt: null, refused: null });
  const handlers = useRef(on);
  useEffect(() => {
    handlers.current = on;
  });
  const key = JSON.stringify(room);

  useEffect(() => {
    const socket = liveSocket();
    const input = JSON.parse(key) as JoinRoomInput;
    let silence: ReturnType<typeof setTimeout> | undefined;

    const lost = () =>
      setState((before) => (before.connected ? { ...before, connected: false } : before));
    const heard = () => {
      clearTimeout(silence);
      silence = setTimeout(lost, SILENCE_MS);
      setState((before) => ({ ...before, connected: true, heardAt: new Date() }));
    };
    const join = () =>
      socket.emit('room:join', input, (answer) =>
        setState((before) => ({ ...before, refused: answer.ok ? null : answer.detail })),
      );

    const listeners = Object.keys(handlers.current).map((name) => {
      const listener = (snapshot: never) => {
        heard();
        const handler = handlers.current[name as keyof typeof on] as
          ((value: never) => void) | undefined;
        handler?.(snapshot);
      };
      socket.on(name as SnapshotEvent, listener as never);
      return () => socket.off(name as SnapshotEvent, listener as never);
    });
    const onConnect = () => {
      heard();
      join();
    };
    socket.on('connect', onConnect);
    socket.on('disconnect', lost);
    socket.on('connect_error', lost);
    socket.on('post:heard', heard);
    if (socket.connected) onConnect();
    else silence = setTimeout(lost, SILENCE_MS);

    // A phone that slept may hold a dead connection: ask anew when it wakes.
    const onWake = () => {
      if (document.visibilityState !== 'visible') return;
      if (socket.connected) join();
      else socket.connect();
    };
    document.addEventListener('visibilitychange', onWake);
    return () => {
      clearTimeout(silence);
      document.removeEventListener('visibilitychange', onWake);
      socket.off('connect', onConnect);
      socket.off('disconnect', lost);
      socket.off('connect_error', lost);
      socket.off('post:heard', heard);
      for (const stop of listeners) stop();
    };
  }, [key]);

  return state;
}

/** The newest snapshot: an older one that arrives late is dropped. */
export function useNewest<Kind extends Snapshot>(initial: Kind): [Kind, (next: Kind) => void];
export function useNewest<Kind extends Snapshot>(
  initial: Kind | null,
): [Kind | null, (next: Kind) => void];
export function useNewest<Kind extends Snapshot>(
  initial: Kind | null,
): [Kind | null, (next: Kind) => void] {
  const [newest, setNewest] = useState(initial);
  return [
    newest,
    (next) =>
      setNewest((before) => {
        const older =
          before !== null &&
          (next.revision < before.revision ||
            (next.revision === before.revision && next.at < before.at));
        return older ? before : next;
      }),
  ];
}
