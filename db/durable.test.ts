import { mkdirSync, mkdtempSync, utimesSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { beforeEach, expect, it, vi } from 'vitest';
import { createLogSync } from './durable';

const disk = vi.hoisted(() => ({
  /** Files that were brought to the disk, by name. */
  synced: [] as string[],
  names: new Map<number, string>(),
  fails: false,
}));

vi.mock('node:fs', async (original) => {
  const fs = await original<typeof import('node:fs')>();
  type Done = (error: Error | null) => void;
  const toDisk = (handle: number, done: Done) => {
    disk.synced.push(disk.names.get(handle)!);
    setImmediate(() => done(disk.fails ? new Error('EIO') : null));
  };
  return {
    ...fs,
    openSync: (file: string, flags: string) => {
      const handle = fs.openSync(file, flags);
      disk.names.set(handle, path.basename(file));
      return handle;
    },
    fdatasync: toDisk,
    fsync: toDisk,
  };
});

const FIRST = '000000010000000000000001';
const SECOND = '000000010000000000000002';
let dataDir: string;

/** Writes a segment at this second of the file system's clock. */
function write(segment: string, atSecond: number): void {
  const file = path.join(dataDir, 'pg_wal', segment);
  writeFileSync(file, String(Math.random()));
  utimesSync(file, atSecond, atSecond);
}

/** What a flush has brought to the disk. */
async function flushed(log: { flush(): Promise<void> }): Promise<string[]> {
  disk.synced = [];
  await log.flush();
  return disk.synced;
}

beforeEach(() => {
  dataDir = mkdtempSync(path.join(os.tmpdir(), 'pullpost-log-'));
  mkdirSync(path.join(dataDir, 'pg_wal'));
  disk.fails = false;
  write(FIRST, 100);
});

it('brings the segment that was written to the disk, each time', async () => {
  const log = createLogSync(dataDir);
  expect(await flushed(log)).toEqual([FIRST, 'pg_wal']);
  write(FIRST, 101);
  expect(await flushed(log)).toEqual([FIRST]);
});

it('misses no write that shares its tick with the one before, or comes after the clock was set back', async () => {
  const log = createLogSync(dataDir);
  await log.flush();
  write(FIRST, 100);
  expect(await flushed(log)).toEqual([FIRST]);
  write(FIRST, 50);
  expect(await flushed(log)).toEqual([FIRST]);
});

it('follows the log into a new segment, with both ends of a write and the folder’s entry', async () => {
  const log = createLogSync(dataDir);
  await log.flush();
  write(FIRST, 101);
  write(SECOND, 101);
  expect(await flushed(log)).toEqual([FIRST, SECOND, 'pg_wal']);
  write(SECOND, 102);
  await log.flush();
  // The first is done with.
  write(SECOND, 103);
  expect(await flushed(log)).toEqual([SECOND]);
});

it('lets those who come while it works share the next write to the disk', async () => {
  const log = createLogSync(dataDir);
  await log.flush();
  disk.synced = [];
  await Promise.all([log.flush(), log.flush(), log.flush(), log.flush()]);
  expect(disk.synced).toEqual([FIRST, FIRST]);
});

it('goes on refusing once the disk has failed', async () => {
  const log = createLogSync(dataDir);
  disk.fails = true;
  await expect(log.flush()).rejects.toThrow('EIO');
  disk.fails = false;
  await expect(log.flush()).rejects.toThrow('EIO');
});
