import { randomBytes } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { makeFolder } from '@/db/folder';

/**
 * The post's secret: links and sessions rest on it. Kept in a file beside the database, so that a
 * dump of the database does not carry it; PULLPOST_SECRET overrides it.
 */
export function readSecret(dataDir: string, given: string | null): string {
  if (given) return given;
  const file = path.join(dataDir, 'secret');
  try {
    return readFileSync(file, 'utf8').trim();
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error;
  }
  makeFolder(dataDir);
  const secret = randomBytes(48).toString('base64url');
  writeFileSync(file, `${secret}\n`, { mode: 0o600 });
  return secret;
}
