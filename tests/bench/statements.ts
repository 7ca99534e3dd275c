import type { PGlite, Transaction } from '@electric-sql/pglite';

/** One statement as it reached the database: enough to see that two lists do the same work. */
export interface Statement {
  /** Verb and main table: 'select checks', 'insert ledger'. */
  kind: string;
  parameters: number;
  fields: number;
  rows: number;
}

const kindOf = (sql: string): string => {
  const text = sql.trim().replaceAll('"', '').toLowerCase();
  const verb = /^\w+/.exec(text)?.[0] ?? '?';
  const table = /\b(?:from|into|update)\s+(\w+)/.exec(text)?.[1] ?? '?';
  return `${verb} ${table}${/\bfor update\b/.test(text) ? ' for update' : ''}`;
};

/** Runs `work` once and lists the statements of its transactions. */
export async function statementsOf(
  client: PGlite,
  work: () => Promise<unknown>,
): Promise<Statement[]> {
  const seen: Statement[] = [];
  const watched = (tx: Transaction): Transaction => {
    const query: Transaction['query'] = async <Row>(
      ...[sql, params, options]: Parameters<Transaction['query']>
    ) => {
      const result = await tx.query<Row>(sql, params, options);
      seen.push({
        kind: kindOf(sql),
        parameters: params?.length ?? 0,
        fields: result.fields.length,
        rows: result.rows.length,
      });
      return result;
    };
    return Object.create(tx, { query: { value: query } }) as Transaction;
  };
  const plain = client.transaction.bind(client);
  client.transaction = (callback) => plain((tx) => callback(watched(tx)));
  try {
    await work();
  } finally {
    client.transaction = plain;
  }
  return seen;
}

/** @throws Error that shows both lists when they differ in number, kind or size. */
export function assertSameStatements(command: Statement[], hand: Statement[]): void {
  const show = (list: Statement[]) => list.map((one) => `  ${JSON.stringify(one)}`).join('\n');
  if (show(command) === show(hand)) return;
  throw new Error(
    `The command has changed: write its statements by hand anew.\nThe command:\n${show(command)}\nBy hand:\n${show(hand)}`,
  );
}
