import { io, type Socket } from 'socket.io-client';
import type { ClientToServer, ServerToClient } from '@/lib/live/contract';

export type LiveSocket = Socket<ServerToClient, ClientToServer>;

let shared: LiveSocket | null = null;

/** The one connection of this page. It reconnects by itself, at most every three seconds. */
export function liveSocket(): LiveSocket {
  shared ??= io({
    transports: ['websocket', 'polling'],
    reconnectionDelayMax: 3000,
    timeout: 5000,
  });
  return shared;
}
