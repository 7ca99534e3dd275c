import { fork } from 'node:child_process';
import path from 'node:path';
import type { JoinRoomInput, ServerToClient } from '@/lib/live/contract';

export interface Client {
  rooms: JoinRoomInput[];
  /** What the client waits for. */
  event: keyof ServerToClient;
  cookie?: string;
}

export interface ClientOrder {
  url: string;
  clients: Client[];
}

export type ClientReport =
  | { kind: 'connected' }
  | { kind: 'failed'; words: string }
  | { kind: 'heard'; revision: number; atMs: number };

export interface Clients {
  /**
   * When the last client had this revision, on the shared clock.
   * @throws Error when it has not come within ten seconds.
   */
  lastHeard(revision: number): Promise<number>;
  close(): void;
}

const PATIENCE_MS = 10_000;

/** Connects clients to a socket server, in a process of their own. */
export async function connectClients(order: ClientOrder): Promise<Clients> {
  const child = fork(path.join(import.meta.dirname, 'client-process.ts'));
  const heard = new Map<number, number>();
  const waiting = new Map<number, (atMs: number) => void>();

  await new Promise<void>((resolve, reject) => {
    child.on('message', (report: ClientReport) => {
      if (report.kind === 'connected') return resolve();
      if (report.kind === 'failed') return reject(new Error(report.words));
      heard.set(report.revision, report.atMs);
      waiting.get(report.revision)?.(report.atMs);
    });
    child.once('exit', (code) => reject(new Error(`The clients' process ended (${code}).`)));
    child.send(order);
  });

  return {
    lastHeard: (revision) =>
      new Promise((resolve, reject) => {
        const known = heard.get(revision);
        if (known !== undefined) return resolve(known);
        const timer = setTimeout(
          () => reject(new Error(`Revision ${revision} has not reached every client.`)),
          PATIENCE_MS,
        );
        waiting.set(revision, (atMs) => {
          clearTimeout(timer);
          waiting.delete(revision);
          resolve(atMs);
        });
      }),
    close: () => child.disconnect(),
  };
}
