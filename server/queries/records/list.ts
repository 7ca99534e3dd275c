import { count, desc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { records } from '@/db/schema';
import { rangeWords, toolWords } from '@/lib/format/tool';
import { parseRecord } from '@/lib/record/record';
import type { Verdict } from '@/lib/torque/verdict';
import { linkToken } from '@/server/access/links';

/** A signed record as the desk lists it. */
export interface RecordRow {
  id: string;
  number: string;
  tagCode: string;
  /** 'Click wrench, ½ in drive · 60–340 N·m', as it was signed. */
  tool: string;
  verdict: Verdict;
  /** ISO 8601 in UTC. */
  signedAt: string;
  /** The result page. */
  path: string;
}

export interface RecordPage {
  rows: RecordRow[];
  /** Of the whole meet. */
  total: number;
  page: number;
  pages: number;
}

/** Each row is read from its signed text: few enough to stay well under 50 ms. */
export const RECORDS_A_PAGE = 40;

/** One page of a meet's records, the newest first. `page` counts from 1 and is kept in range. */
export async function recordsOfMeet(
  reader: Reader,
  secret: string,
  meetId: string,
  page = 1,
): Promise<RecordPage> {
  const [counted] = await reader
    .select({ total: count() })
    .from(records)
    .where(eq(records.meetId, meetId));
  const total = counted?.total ?? 0;
  const pages = Math.max(1, Math.ceil(total / RECORDS_A_PAGE));
  const at = Math.min(Math.max(1, page), pages);
  const rows = await reader
    .select({
      id: records.id,
      number: records.number,
      verdict: records.verdict,
      canonical: records.canonical,
      linkVersion: records.linkVersion,
      signedAt: records.signedAt,
    })
    .from(records)
    .where(eq(records.meetId, meetId))
    .orderBy(desc(records.signedAt), desc(records.sequence))
    .limit(RECORDS_A_PAGE)
    .offset((at - 1) * RECORDS_A_PAGE);
  return {
    total,
    page: at,
    pages,
    rows: rows.map(({ id, number, verdict, canonical, linkVersion, signedAt }) => {
      const signed = parseRecord(canonical);
      const { min, max } = signed.tool.range;
      return {
        id,
        number,
        verdict,
        tagCode: signed.tagCode,
        tool: `${toolWords(signed.tool)} · ${rangeWords({ ...signed.tool, rangeMin: min, rangeMax: max })}`,
        signedAt: signedAt.toISOString(),
        path: `/r/${linkToken(secret, 'record', id, linkVersion)}`,
      };
    }),
  };
}
