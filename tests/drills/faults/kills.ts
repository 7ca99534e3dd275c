import { spawn, type ChildProcess } from 'node:child_process';
import path from 'node:path';
import { createInterface } from 'node:readline';
import { count, countDistinct, eq, inArray, sql } from 'drizzle-orm';
import { openStore } from '@/db/client';
import { lockDataFolder } from '@/db/lock';
import { ledger, pullDecisions, pulls } from '@/db/schema';

/** What a writer says of a pull once its command has answered. */
export interface AcceptedPull {
  pullId: string;
  /** From calling the command to its answer, and the part of it that waited for the disk. */
  commandMs: number;
  diskMs: number;
}

export interface Writer {
  pid: number;
  process: ChildProcess;
  /** What it has said so far. */
  accepted: AcceptedPull[];
  /** Kills it at once, and resolves when it is gone and all that it said has been read. */
  kill(): Promise<AcceptedPull[]>;
}

const ROOT = path.join(import.meta.dirname, '../../..');
const WRITER = path.join(import.meta.dirname, 'writer.ts');

/** A process that records pulls in this folder; resolves with its first accepted pull. */
export async function startWriter(dataDir: string): Promise<Writer> {
  const child = spawn(process.execPath, ['--import', 'tsx', WRITER, dataDir], {
    cwd: ROOT,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const accepted: AcceptedPull[] = [];
  let complaint = '';
  child.stderr.on('data', (chunk: Buffer) => (complaint += chunk.toString()));
  const ended = new Promise<void>((resolve) => child.once('close', () => resolve()));
  await new Promise<void>((resolve, reject) => {
    createInterface({ input: child.stdout }).on('line', (line) => {
      // The last line of a killed process can be cut short: that pull was not said to be accepted.
      if (!line.endsWith('}')) return;
      accepted.push(JSON.parse(line) as AcceptedPull);
      resolve();
    });
    void ended.then(() => reject(new Error(`The writer ended: ${complaint}`)));
  });
  return {
    pid: child.pid!,
    process: child,
    accepted,
    async kill() {
      child.kill('SIGKILL');
      await ended;
      return accepted;
    },
  };
}

/** What stands in the folder of a killed writer, against what it had said. */
export interface Aftermath {
  said: number;
  /** Pulls that were said to be accepted and are not there, with their decision and ledger entry. */
  lost: string[];
  /** Ledger entries that share a sequence number with another. */
  ledgerDuplicates: number;
}

/** Takes the lock over, opens the folder and looks for every pull. */
export async function lookAfter(dataDir: string, said: AcceptedPull[]): Promise<Aftermath> {
  const lock = await lockDataFolder(dataDir, new Date());
  const store = await openStore({ kind: 'folder', dataDir: path.join(dataDir, 'db') });
  try {
    const ids = said.map(({ pullId }) => pullId);
    const entryPull = sql<string>`${ledger.detail} ->> 'pullId'`;
    const rows = await store.db
      .select({ id: pulls.id })
      .from(pulls)
      .innerJoin(pullDecisions, eq(pullDecisions.pullId, pulls.id))
      .innerJoin(ledger, eq(entryPull, sql`${pulls.id}::text`))
      .where(inArray(pulls.id, ids));
    const there = new Set(rows.map(({ id }) => id));
    const [entries] = await store.db
      .select({ all: count(), distinct: countDistinct(ledger.sequence) })
      .from(ledger);
    return {
      said: ids.length,
      lost: ids.filter((id) => !there.has(id)),
      ledgerDuplicates: entries!.all - entries!.distinct,
    };
  } finally {
    await store.close();
    await lock.release();
  }
}
