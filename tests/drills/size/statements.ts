import type { PGlite, Transaction } from '@electric-sql/pglite';
import type { Database } from '@/db/client';

export interface Statement {
  text: string;
  /** From handing it to PGlite to having its rows, milliseconds. */
  ms: number;
}

/** The PGlite client below a Drizzle database. @throws Error when it stands on something else. */
export function clientOf(db: Database): PGlite {
  if (!('$client' in db)) throw new Error('This database has no PGlite client.');
  return db.$client as PGlite;
}

/**
 * Times every statement on the client, inside transactions too, and the commit as one of its own.
 * `during` gives the statements that ran while `work` did.
 */
export function watchStatements(client: PGlite) {
  let heard: Statement[] = [];
  const timed = async <Result>(text: string, work: () => Promise<Result>): Promise<Result> => {
    const began = performance.now();
    try {
      return await work();
    } finally {
      heard.push({ text, ms: performance.now() - began });
    }
  };
  const watch = (target: Pick<Transaction, 'query'>): void => {
    const query = target.query.bind(target);
    target.query = (text, params, options) => timed(text, () => query(text, params, options));
  };
  watch(client);
  const transaction = client.transaction.bind(client);
  client.transaction = async (work) => {
    let ended = performance.now();
    const result = await transaction(async (tx) => {
      watch(tx);
      const done = await work(tx);
      ended = performance.now();
      return done;
    });
    heard.push({ text: 'commit', ms: performance.now() - ended });
    return result;
  };
  return {
    async during<Result>(
      work: () => Promise<Result>,
    ): Promise<{ result: Result; statements: Statement[] }> {
      heard = [];
      const result = await work();
      return { result, statements: heard };
    },
  };
}
