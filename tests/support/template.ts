import { createHash } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';

const MIGRATIONS = path.join(import.meta.dirname, '../../db/migrations');

/** Changes with every migration, so that a template of an older schema is never used. */
function migrationsHash(): string {
  const hash = createHash('sha256').update(process.version);
  for (const file of readdirSync(MIGRATIONS)
    .filter((name) => name.endsWith('.sql'))
    .sort()) {
    hash.update(file).update(readFileSync(path.join(MIGRATIONS, file)));
  }
  hash.update(readFileSync(path.join(MIGRATIONS, 'meta/_journal.json')));
  return hash.digest('hex').slice(0, 16);
}

/**
 * A dump of an empty, migrated store. Made once for each set of migrations and kept in the temporary
 * folder: opening it is several times faster than booting and migrating an empty one.
 */
export async function storeTemplate(): Promise<Blob> {
  const folder = path.join(tmpdir(), 'pullpost-tests');
  const file = path.join(folder, `${migrationsHash()}.tar`);
  try {
    return new Blob([readFileSync(file)]);
  } catch {
    const client = await PGlite.create();
    await migrate(drizzle({ client }), { migrationsFolder: MIGRATIONS });
    const dump = await client.dumpDataDir('none');
    await client.close();
    mkdirSync(folder, { recursive: true });
    // Two workers may make it at once: the rename puts a whole file in its place.
    const draft = `${file}.${process.pid}`;
    writeFileSync(draft, Buffer.from(await dump.arrayBuffer()));
    renameSync(draft, file);
    return dump;
  }
}
