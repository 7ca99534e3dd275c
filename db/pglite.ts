import { PGlite, types, type PGliteOptions, type Transaction } from '@electric-sql/pglite';

const asText = (text: string): string => text;

/** What Drizzle wants as text: it makes dates of it by itself. */
const SCALARS = [types.TIMESTAMP, types.TIMESTAMPTZ, types.INTERVAL, types.DATE];
/** Their arrays, and that of numeric, by their type numbers in PostgreSQL. */
const ARRAYS = [1115, 1185, 1187, 1182, 1231];

type Queryable = Pick<Transaction, 'query'>;

function withoutOwnParsers<Target extends Queryable>(target: Target): Target {
  const query = target.query.bind(target) as Queryable['query'];
  target.query = (sql, params, options) =>
    query(sql, params, options && { ...options, parsers: undefined });
  return target;
}

/**
 * Opens PGlite for Drizzle. Drizzle brings the same few parsers with every query, and for each PGlite
 * then copies its own table of several hundred, 0.1 ms a statement: here they are set once.
 */
export async function openForDrizzle(options: PGliteOptions): Promise<PGlite> {
  const client = await PGlite.create(options);
  for (const type of [...SCALARS, ...ARRAYS]) client.parsers[type] = asText;
  const transaction = client.transaction.bind(client);
  client.transaction = (callback) => transaction((tx) => callback(withoutOwnParsers(tx)));
  return withoutOwnParsers(client);
}
