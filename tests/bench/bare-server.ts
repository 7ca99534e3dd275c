import { createServer } from 'node:http';
import { Server } from 'socket.io';
import { listen } from './listen';
import { sharedMs } from './clock';

export interface BareServer {
  url: string;
  /** Sends one message to everybody, and gives the time just before. */
  emit(event: string, message: unknown): number;
  close(): Promise<void>;
}

/** A socket.io server with nothing in it: what ours is held against. */
export async function bareServer(): Promise<BareServer> {
  const http = createServer();
  const io = new Server(http, { serveClient: false });
  return {
    url: await listen(http),
    emit(event, message) {
      const atMs = sharedMs();
      io.emit(event, message);
      return atMs;
    },
    close: () => io.close(),
  };
}
