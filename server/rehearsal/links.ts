import { and, asc, desc, eq, inArray } from 'drizzle-orm';
import { records, tags } from '@/db/schema';
import type { Reader } from '@/db/client';
import type { TagState } from '@/lib/line/states';
import type { Verdict } from '@/lib/torque/verdict';
import { linkToken } from '@/server/access/links';

export interface PrintedLinks {
  tickets: { code: string; state: TagState; path: string }[];
  results: { number: string; verdict: Verdict; path: string }[];
}

/** The states whose tickets are worth a look, in the order in which they are printed. */
const TICKET_STATES: TagState[] = ['waiting', 'called', 'on_bench', 'ready'];
const NEWEST = 50;

/** A ticket of each of some states, and the newest result of each verdict, with secret addresses. */
export async function printedLinks(
  db: Reader,
  secret: string,
  meetId: string,
): Promise<PrintedLinks> {
  const ticketRows = await db
    .select({
      id: tags.id,
      code: tags.code,
      state: tags.state,
      version: tags.linkVersion,
      heldUntil: tags.heldUntil,
    })
    .from(tags)
    .where(and(eq(tags.meetId, meetId), inArray(tags.state, TICKET_STATES)))
    .orderBy(asc(tags.position));
  const recordRows = await db
    .select({
      id: records.id,
      number: records.number,
      verdict: records.verdict,
      version: records.linkVersion,
    })
    .from(records)
    .where(eq(records.meetId, meetId))
    .orderBy(desc(records.signedAt))
    .limit(NEWEST);
  return {
    tickets: firstOfEach(
      // A held turn says so on its ticket: one that moves up is the better example.
      [...ticketRows].sort((one, other) => Number(!!one.heldUntil) - Number(!!other.heldUntil)),
      ({ state }) => state,
    )
      .sort((one, other) => TICKET_STATES.indexOf(one.state) - TICKET_STATES.indexOf(other.state))
      .map(({ id, code, state, version }) => ({
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
  return [...byKind.values()];
}
