import { and, desc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, checks, records, tags } from '@/db/schema';
import type { CheckView, TicketSnapshot } from '@/lib/live/contract';
import { parseRecord } from '@/lib/record/record';
import { linkToken } from '@/server/access/links';
import { loadCheckFile, type CheckFile } from '@/server/queries/check/load';
import { checkView } from '@/server/queries/check/view';
import { currentRevision } from '@/server/queries/revision';

/** What the phone shows of a running check: accepted readings only. */
const ticketCheck = (view: CheckView): NonNullable<TicketSnapshot['check']> => ({
  progress: view.progress,
  points: view.points,
  basis: view.basis,
  readings: view.pulls
    .filter((pull) => pull.kind === 'reading' && pull.state === 'accepted')
    .map((pull) => ({
      label: pull.target,
      reference: pull.reference ?? '',
      words:
        pull.outcome === 'no-release' ? `did not let go by ${pull.reference}` : (pull.words ?? ''),
    })),
});

/** The ticket while its tool is checked, from the facts in hand. */
export const ticketOfFile = (
  file: CheckFile,
  view: CheckView,
  { revision, at }: { revision: number; at: string },
): TicketSnapshot => ({
  revision,
  at,
  code: file.tag.code,
  state: 'on_bench',
  place: 'bench',
  held: false,
  benchNumber: file.benchNumber,
  peg: null,
  unfitReason: null,
  check: ticketCheck(view),
  result: null,
});

/** What the holder of a ticket may see, or null when there is no such tag. */
export async function ticketSnapshot(
  reader: Reader,
  tagId: string,
  now: Date,
  secret: string,
): Promise<TicketSnapshot | null> {
  const revision = await currentRevision(reader);
  const [row] = await reader
    .select({ tag: tags, benchNumber: benches.number })
    .from(tags)
    .leftJoin(benches, eq(benches.id, tags.benchId))
    .where(eq(tags.id, tagId));
  if (!row) return null;
  const { tag } = row;
  const at = now.toISOString();

  if (tag.state === 'on_bench') {
    const [running] = await reader
      .select({ id: checks.id })
      .from(checks)
      .where(and(eq(checks.tagId, tag.id), eq(checks.state, 'running')));
    const file = running ? await loadCheckFile(reader, { checkId: running.id }) : null;
    if (file) return ticketOfFile(file, checkView(file), { revision, at });
  }
  const [record] = await reader
    .select()
    .from(records)
    .where(eq(records.tagId, tag.id))
    .orderBy(desc(records.signedAt))
    .limit(1);
  return {
    revision,
    at,
    code: tag.code,
    state: tag.state,
    place: tag.place,
    held: tag.heldUntil !== null && tag.heldUntil > now,
    benchNumber: row.benchNumber,
    peg: tag.peg,
    unfitReason: tag.unfitReason,
    check: null,
    result: record
      ? {
          verdict: record.verdict,
          statement: parseRecord(record.canonical).evaluation.statement,
          path: `/r/${linkToken(secret, 'record', record.id, record.linkVersion)}`,
        }
      : null,
  };
}
