import { closeSync, fdatasync, fsync, openSync, readdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { promisify } from 'node:util';

const toDisk = { content: promisify(fdatasync), entries: promisify(fsync) };

/** Waits for the disk off the event loop; opening and closing take microseconds. */
async function sync(file: string, what: keyof typeof toDisk): Promise<void> {
  // Windows keeps a folder's entries by itself and refuses to open one.
  if (what === 'entries' && process.platform === 'win32') return;
  const handle = openSync(file, what === 'entries' ? 'r' : 'r+');
  try {
    await toDisk[what](handle);
  } finally {
    closeSync(handle);
  }
}

const SEGMENT = /^[0-9A-F]{24}$/;

/**
 * Makes what PGlite has written to its log outlast a power cut: PGlite itself never calls fsync. It
 * makes no checkpoint either between opening and closing, so that the log alone holds everything
 * since `syncFolder`. Callers that wait at the same moment share one write to the disk.
 */
export function createLogSync(dataDir: string): { flush(): Promise<void> } {
  const folder = path.join(dataDir, 'pg_wal');
  let seen = new Map<string, bigint>();
  /** Segments that changed last. Two writes can share a tick of the clock: they are synced again. */
  let last: string[] = [];
  let failed: unknown = null;

  async function syncLog(): Promise<void> {
    // Segments are written in the order of their names: those before the last are done with.
    const names = readdirSync(folder)
      .filter((name) => SEGMENT.test(name))
      .sort();
    const now = new Map<string, bigint>();
    for (const name of names.filter((one) => one >= (last[0] ?? ''))) {
      now.set(name, statSync(path.join(folder, name), { bigint: true }).mtimeNs);
    }
    const changed = [...now.keys()].filter((name) => now.get(name) !== seen.get(name));
    for (const name of new Set([...last, ...changed])) {
      await sync(path.join(folder, name), 'content');
    }
    if (changed.some((name) => !seen.has(name))) await sync(folder, 'entries');
    seen = now;
    if (changed.length > 0) last = changed;
  }

  let running: Promise<void> | null = null;
  let next: Promise<void> | null = null;
  const begin = (): Promise<void> => {
    running = syncLog()
      .catch((error: unknown) => {
        // The system may have dropped what it could not write: nothing later stands on it.
        failed ??= error;
      })
      .finally(() => (running = null));
    return running;
  };

  return {
    /** @throws the error of the first write to the disk that failed, from then on. */
    async flush() {
      // One that runs may have begun before our commit: wait for the one after it, with all others.
      if (running) {
        next ??= running.then(() => {
          next = null;
          return begin();
        });
        await next;
      } else {
        await begin();
      }
      if (failed) throw failed;
    },
  };
}

/** Brings every file of a folder to the disk: after opening, which replays the log, and after closing. */
export async function syncFolder(folder: string): Promise<void> {
  for (const entry of readdirSync(folder, { withFileTypes: true })) {
    const at = path.join(folder, entry.name);
    if (entry.isDirectory()) await syncFolder(at);
    else if (entry.isFile()) await sync(at, 'content');
  }
  await sync(folder, 'entries');
}
