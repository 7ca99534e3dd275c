import path from 'node:path';
import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core';
import { createLogSync, syncFolder } from './durable';
import { makeFolder } from './folder';
import * as schema from './schema';

export type Database = PgDatabase<PgQueryResultHKT, typeof schema>;
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];
/** Reads take either; writes only ever get a transaction. */
export type Reader = Database | Transaction;

export interface Store {
  db: Database;
  kind: 'pglite' | 'postgres';
  /** Resolves once everything committed so far would outlast a power cut. */
  flush(): Promise<void>;
  close(): Promise<void>;
}

export type StoreOptions =
  | { kind: 'folder'; dataDir: string }
  | { kind: 'memory' }
  | { kind: 'dump'; dump: Blob }
  | { kind: 'postgres'; url: string };

/** A server writes its log before it answers; what is in memory outlasts nothing. */
const NO_FLUSH = async (): Promise<void> => undefined;

/** Any number that no other program on the database server is likely to lock. */
const MIGRATION_LOCK = 7_085_507;

const MIGRATIONS = path.join(import.meta.dirname, 'migrations');

/** Opens the store and brings it to the newest schema. */
export async function openStore(options: StoreOptions): Promise<Store> {
  return options.kind === 'postgres' ? openPostgres(options.url) : openPglite(options);
}

async function openPostgres(url: string): Promise<Store> {
  const [{ default: pg }, { drizzle }, { migrate }] = await Promise.all([
    import('pg'),
    import('drizzle-orm/node-postgres'),
    import('drizzle-orm/node-postgres/migrator'),
  ]);
  const pool = new pg.Pool({ connectionString: url, max: 10 });
  // An idle connection that breaks is no fault of anybody: the next statement opens another.
  pool.on('error', () => undefined);
  const db = drizzle({ client: pool, schema });
  const client = await pool.connect();
  try {
    // Processes that start together bring the schema up one after the other.
    await client.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await migrate(drizzle({ client, schema }), { migrationsFolder: MIGRATIONS });
  } finally {
    // Closed with its connection, the lock is let go also when a migration failed.
    client.release(true);
  }
  return { db, kind: 'postgres', flush: NO_FLUSH, close: () => pool.end() };
}

async function openPglite(options: Exclude<StoreOptions, { kind: 'postgres' }>): Promise<Store> {
  const [{ openForDrizzle }, { drizzle }, { migrate }] = await Promise.all([
    import('./pglite'),
    import('drizzle-orm/pglite'),
    import('drizzle-orm/pglite/migrator'),
  ]);
  if (options.kind === 'folder') makeFolder(options.dataDir);
  const client = await openForDrizzle(
    options.kind === 'folder'
      ? { dataDir: options.dataDir }
      : options.kind === 'dump'
        ? { loadDataDir: options.dump }
        : {},
  );
  const db = drizzle({ client, schema });
  if (options.kind !== 'dump') await migrate(db, { migrationsFolder: MIGRATIONS });
  if (options.kind !== 'folder') {
    return { db, kind: 'pglite', flush: NO_FLUSH, close: () => client.close() };
  }
  const { dataDir } = options;
  await syncFolder(dataDir);
  return {
    db,
    kind: 'pglite',
    flush: createLogSync(dataDir).flush,
    async close() {
      await client.close();
      await syncFolder(dataDir);
    },
  };
}
