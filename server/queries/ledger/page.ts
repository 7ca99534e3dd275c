import { and, desc, eq, gt, inArray, isNull, lt, type SQL } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { checks, ledger, staff, tags, testers } from '@/db/schema';
import { commandWords, detailWords } from './words';

/** One entry of the ledger, in words. */
export interface LedgerRow {
  sequence: number;
  /** ISO 8601 in UTC. */
  at: string;
  /** A person's name of the staff, 'Visitor', a tester's name … */
  who: string;
  what: string;
  tagCode: string | null;
  detail: string;
}

export interface LedgerPage {
  rows: LedgerRow[];
  /** The sequence to go on before, towards older entries; null at the end. */
  older: number | null;
  isNewest: boolean;
}

export interface LedgerFilter {
  /** Null for what belongs to no meet: testers, accounts, sign-ins. */
  meetId: string | null;
  /** Only the entries of this tag and of its checks. */
  tagCode?: string | null;
  /** Only older entries than this sequence. */
  before?: number | null;
}

export const ENTRIES_A_PAGE = 50;

/** A page of the ledger, the newest first; by sequence, so that a growing ledger shifts nothing. */
export async function ledgerPage(
  reader: Reader,
  { meetId, tagCode = null, before = null }: LedgerFilter,
): Promise<LedgerPage> {
  const where: SQL[] = [meetId === null ? isNull(ledger.meetId) : eq(ledger.meetId, meetId)];
  if (tagCode !== null) {
    const subjects = meetId === null ? [] : await subjectsOf(reader, meetId, tagCode);
    if (subjects.length === 0) return { rows: [], older: null, isNewest: true };
    where.push(inArray(ledger.subjectId, subjects));
  }
  const newestFirst = (...also: SQL[]) =>
    reader
      .select()
      .from(ledger)
      .where(and(...where, ...also))
      .orderBy(desc(ledger.sequence));
  const entries = await newestFirst(
    ...(before === null ? [] : [lt(ledger.sequence, before)]),
  ).limit(ENTRIES_A_PAGE + 1);
  const shown = entries.slice(0, ENTRIES_A_PAGE);
  const first = shown[0];
  const newer = first ? await newestFirst(gt(ledger.sequence, first.sequence)).limit(1) : [];
  const names = await actorNames(
    reader,
    shown.map((entry) => entry.actor),
  );
  return {
    rows: shown.map((entry) => ({
      sequence: entry.sequence,
      at: entry.at.toISOString(),
      who: names(entry.actor),
      what: commandWords(entry.command),
      tagCode: typeof entry.detail.code === 'string' ? entry.detail.code : null,
      detail: detailWords(entry.detail),
    })),
    older: entries.length > ENTRIES_A_PAGE ? shown.at(-1)!.sequence : null,
    isNewest: newer.length === 0,
  };
}

/** A tag and its checks: what its ledger entries are about. */
async function subjectsOf(reader: Reader, meetId: string, code: string): Promise<string[]> {
  const rows = await reader
    .select({ tagId: tags.id, checkId: checks.id })
    .from(tags)
    .leftJoin(checks, eq(checks.tagId, tags.id))
    .where(and(eq(tags.meetId, meetId), eq(tags.code, code)));
  return [...new Set(rows.flatMap(({ tagId, checkId }) => (checkId ? [tagId, checkId] : [tagId])))];
}

/** Names of those who acted. Visitors have none here: the ledger knows only their tags. */
async function actorNames(reader: Reader, keys: string[]): Promise<(key: string) => string> {
  const idsOf = (kind: string): string[] => [
    ...new Set(
      keys.filter((key) => key.startsWith(`${kind}:`)).map((key) => key.slice(kind.length + 1)),
    ),
  ];
  const people = idsOf('staff');
  const instruments = idsOf('tester');
  const named = [
    ...(people.length > 0
      ? await reader
          .select({ id: staff.id, name: staff.name })
          .from(staff)
          .where(inArray(staff.id, people))
      : []),
    ...(instruments.length > 0
      ? await reader
          .select({ id: testers.id, name: testers.name })
          .from(testers)
          .where(inArray(testers.id, instruments))
      : []),
  ];
  const nameById = new Map(named.map(({ id, name }) => [id, name]));
  return (key) => {
    const [kind = '', id = ''] = key.split(':');
    if (kind === 'visitor') return 'Visitor';
    if (kind === 'public') return 'Public page';
    if (kind === 'job') return `The post itself (${id})`;
    return nameById.get(id) ?? `${kind} no longer known`;
  };
}
