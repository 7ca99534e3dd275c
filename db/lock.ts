import { createHash } from 'node:crypto';
import { realpathSync, unlinkSync } from 'node:fs';
import net from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { makeFolder } from './folder';

export interface LockHolder {
  pid: number;
  since: string;
}

export class DataFolderLockedError extends Error {
  readonly code = 'data-folder-locked';
  constructor(
    readonly folder: string,
    readonly holder: LockHolder | null,
  ) {
    super(
      `The data folder ${folder} is in use by another Pullpost server` +
        (holder ? ` (process ${holder.pid}, running since ${holder.since}).` : '.') +
        ' Stop that one first, or set PULLPOST_DATA to another folder.',
    );
  }
}

/**
 * Where the lock of a folder listens. An abstract socket (Linux) and a named pipe (Windows) die
 * with their process; elsewhere a socket file may be left behind, and is taken over if nobody answers.
 */
function address(folder: string): string {
  const name = `pullpost-${createHash('sha256').update(folder).digest('hex').slice(0, 24)}`;
  if (process.platform === 'linux') return `\0${name}`;
  if (process.platform === 'win32') return `\\\\.\\pipe\\${name}`;
  return path.join(os.tmpdir(), `${name}.sock`);
}

const listen = (server: net.Server, at: string): Promise<void> =>
  new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(at, () => {
      server.off('error', reject);
      resolve();
    });
  });

/** Asks whoever listens who they are; null when nobody answers. */
const ask = (at: string): Promise<LockHolder | null> =>
  new Promise((resolve) => {
    let text = '';
    const socket = net.connect(at);
    socket.setTimeout(1000, () => socket.destroy());
    socket.on('data', (chunk) => (text += chunk.toString('utf8')));
    socket.on('error', () => resolve(null));
    socket.on('close', () => {
      try {
        resolve(JSON.parse(text) as LockHolder);
      } catch {
        resolve(null);
      }
    });
  });

/**
 * Takes the data folder for this process until `release` or the end of the process. PGlite itself
 * takes no lock, and two processes on one folder lose rows without an error.
 * @throws DataFolderLockedError when another process holds it.
 */
export async function lockDataFolder(
  dataDir: string,
  now: Date,
): Promise<{ release(): Promise<void> }> {
  makeFolder(dataDir);
  const folder = realpathSync(dataDir);
  const at = address(folder);
  const holder: LockHolder = { pid: process.pid, since: now.toISOString() };
  const server = net.createServer((socket) => socket.end(JSON.stringify(holder)));
  server.unref();
  try {
    await listen(server, at);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EADDRINUSE') throw error;
    const other = await ask(at);
    if (other || process.platform === 'linux' || process.platform === 'win32') {
      throw new DataFolderLockedError(folder, other);
    }
    unlinkSync(at);
    await listen(server, at);
  }
  return { release: () => new Promise((resolve) => server.close(() => resolve())) };
}
