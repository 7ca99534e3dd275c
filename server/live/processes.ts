import type { LiveServer } from './hub';

/**
 * With a PostgreSQL server, several app processes share one line: what one of them emits reaches the
 * clients of all. Alone, there is nothing to connect.
 */
export async function connectProcesses(
  io: LiveServer,
  databaseUrl: string | null,
): Promise<{ close(): Promise<void> }> {
  if (!databaseUrl) return { close: async () => undefined };
  const [{ default: pg }, { createAdapter }] = await Promise.all([
    import('pg'),
    import('@socket.io/postgres-adapter'),
  ]);
  const pool = new pg.Pool({ connectionString: databaseUrl, max: 2 });
  // A connection that breaks is opened again by the adapter and by the next statement.
  pool.on('error', () => undefined);
  await pool.query(
    `create table if not exists socket_io_attachments (
      id bigserial unique, created_at timestamptz default now(), payload bytea)`,
  );
  io.adapter(createAdapter(pool));
  return { close: () => pool.end() };
}
