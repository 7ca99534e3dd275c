import { existsSync, mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { lockDataFolder } from '@/db/lock';
import type { Env } from '@/server/env';

/** Stands in the data folder of a rehearsal, so that nobody's real records are ever taken for one. */
const MARKER = 'rehearsal.txt';
const MARKER_WORDS = 'This folder holds a rehearsal: a made-up meet. It may be removed.\n';

/** Everything that a rehearsal keeps in its data folder; the marker goes last. */
const KEPT = ['db', 'secret', MARKER];

type Where = Pick<Env, 'dataDir' | 'databaseUrl'>;

export function markAsRehearsal({ dataDir, databaseUrl }: Where): void {
  if (databaseUrl) return;
  mkdirSync(dataDir, { recursive: true });
  writeFileSync(path.join(dataDir, MARKER), MARKER_WORDS);
}

const refuse = (why: string): never => {
  throw new Error(`The configuration cannot be used with --fresh: ${why}`);
};

/**
 * Removes what an earlier rehearsal left in its data folder, and nothing else.
 * @throws Error for a database server, for a folder that is no rehearsal's, and while another server
 * uses the folder.
 */
export async function startOver({ dataDir, databaseUrl }: Where, now = new Date()): Promise<void> {
  if (databaseUrl) refuse('DATABASE_URL is set, and a database server is never emptied from here.');
  if (!existsSync(dataDir) || readdirSync(dataDir).length === 0) return;
  if (!existsSync(path.join(dataDir, MARKER))) {
    refuse(
      `${dataDir} is not the folder of a rehearsal. Remove it yourself if that is what you want.`,
    );
  }
  const lock = await lockDataFolder(dataDir, now);
  try {
    for (const name of KEPT) rmSync(path.join(dataDir, name), { recursive: true, force: true });
  } finally {
    await lock.release();
  }
}
