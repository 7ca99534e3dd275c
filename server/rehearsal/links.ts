import { and, asc, desc, eq, ne } from 'drizzle-orm';
import { benches, records, tags } from '@/db/schema';
import type { Reader } from '@/db/client';
import type { TagState } from '@/lib/line/states';
import type { Verdict } from '@/lib/torque/verdict';
import { linkToken } from '@/server/access/links';
import { MEET_ID } from './ids';

export interface PrintedLinks {
  benches: { number: number; path: string }[];
  tickets: { code: string; state: TagState; path: string }[];
  results: { number: string; verdict: Verdict; path: string }[];
}

const SHOWN = 4;

/** A ticket of each of some states, and the newest result of each verdict. */
export async function printedLinks(db: Reader, secret: string): Promise<PrintedLinks> {
  const bench = await db
    .select({ id: benches.id, number: benches.number })
    .from(benches)
    .where(eq(benches.meetId, MEET_ID))
    .orderBy(asc(benches.number));
  const ticketRows = await db
    .select({ id: tags.id, code: tags.code, state: tags.state, version: tags.linkVersion })
    .from(tags)
    .where(and(eq(tags.meetId, MEET_ID), ne(tags.state, 'returned')))
    .orderBy(asc(tags.position));
  const recordRows = await db
    .select({
      id: records.id,
      number: records.number,
      verdict: records.verdict,
      version: records.linkVersion,
    })
    .from(records)
    .where(eq(records.meetId, MEET_ID))
    .orderBy(desc(records.signedAt))
    .limit(50);
  return {
    benches: bench.map(({ id, number }) => ({ number, path: `/bench/${id}` })),
    tickets: firstOfEach(ticketRows, ({ state }) => state).map(({ id, code, state, version }) => ({
      code,
      state,
      path: `/t/${linkToken(secret, 'ticket', id, version)}`,
    })),
    results: firstOfEach(recordRows, ({ verdict }) => verdict).map((row) => ({
      number: row.number,
      verdict: row.verdict,
      path: `/r/${linkToken(secret, 'record', row.id, row.version)}`,
    })),
  };
}

function firstOfEach<Row>(rows: readonly Row[], kindOf: (row: Row) => string): Row[] {
  const byKind = new Map<string, Row>();
  for (const row of rows) if (!byKind.has(kindOf(row))) byKind.set(kindOf(row), row);
  return [...byKind.values()].slice(0, SHOWN);
}
