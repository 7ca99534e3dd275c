import { EventEmitter } from 'node:events';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { Socket } from 'node:net';
import type { Duplex } from 'node:stream';
import next from 'next';

export interface WebServer {
  http: Server;
  /** Builds or loads the application; after this, requests are answered. */
  prepare(): Promise<void>;
  /** Takes no more, and ends every connection, also those of sleeping phones. */
  close(): Promise<void>;
}

interface WebServerOptions {
  dev: boolean;
  dir: string;
  /** Next fetches its own pages there after a form's redirect. */
  port: number;
}

/**
 * Next and the live channel on one port. Next adds an `upgrade` listener to the server that it is
 * given; it gets an emitter of its own, and only what is not the live channel's.
 */
export function createWebServer({ dev, dir, port }: WebServerOptions): WebServer {
  const upgrades = new EventEmitter();
  const app = next({ dev, dir, port, httpServer: upgrades as Server });
  let handle: ((req: IncomingMessage, res: ServerResponse) => Promise<void>) | null = null;

  const http = createServer((req, res) => {
    // Limits count by address: the one on the wire, never one that the client names.
    req.headers['x-forwarded-for'] = req.socket.remoteAddress;
    if (handle) void handle(req, res);
    else res.writeHead(503, { 'Retry-After': '5' }).end('Starting. Try again in a moment.');
  });
  http.on('upgrade', (req: IncomingMessage, socket: Duplex, head: Buffer) => {
    if (req.url?.startsWith('/socket.io/')) return;
    if (!upgrades.emit('upgrade', req, socket, head)) socket.destroy();
  });

  const connections = new Set<Socket>();
  http.on('connection', (socket) => {
    connections.add(socket);
    socket.once('close', () => connections.delete(socket));
  });

  return {
    http,
    async prepare() {
      await app.prepare();
      handle = app.getRequestHandler();
    },
    async close() {
      const closed = new Promise<void>((resolve) => http.close(() => resolve()));
      for (const socket of connections) socket.destroy();
      await closed;
      await app.close();
    },
  };
}
