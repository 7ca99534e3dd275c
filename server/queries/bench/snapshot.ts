import { and, asc, desc, eq, inArray, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, meets, records, staff, tags } from '@/db/schema';
import { waitingOrder } from '@/lib/line/order';
import type { BenchSnapshot } from '@/lib/live/contract';
import { parseRecord } from '@/lib/record/record';
import { formatTorque } from '@/lib/torque/units';
import { reasonWords } from '@/lib/torque/words';
import { linkToken } from '@/server/access/links';
import type { InstrumentManager } from '@/server/instruments/manager';
import { currentRevision } from '@/server/queries/revision';
import { certificateWords, proofWords } from '@/server/queries/tester/words';
import { testerToday } from '@/server/queries/tester/standing';
import { staffTags, tagView, toolOnBench, type StaffTagRow } from './tag-view';

interface BenchScope {
  reader: Reader;
  now: Date;
  secret: string;
  instruments: Pick<InstrumentManager, 'status'>;
}

/** How many of the next tags a bench shows. */
const NEXT = 5;

/** The bench that a tester stands on, or null. */
export async function benchOfTester(reader: Reader, testerId: string): Promise<string | null> {
  const [bench] = await reader
    .select({ id: benches.id })
    .from(benches)
    .where(eq(benches.testerId, testerId));
  return bench?.id ?? null;
}

async function testerOf(scope: BenchScope, testerId: string, meet: typeof meets.$inferSelect) {
  const today = await testerToday(scope.reader, testerId, meet, scope.now);
  if (!today) return null;
  const status = scope.instruments.status(testerId);
  return {
    id: today.tester.id,
    name: today.tester.name,
    maximum: formatTorque(today.tester.maxNm, 'N.m'),
    minNm: today.tester.minNm,
    maxNm: today.tester.maxNm,
    kind: today.tester.connection.kind,
    certificate: certificateWords(today.certificate),
    proof: proofWords(today.proof, meet.timeZone),
    barred: today.barred.map((code) =>
      code === 'tester-locked'
        ? `${reasonWords(code)}: ${today.tester.lockedReason}`
        : reasonWords(code),
    ),
    instrument: {
      state: status?.state ?? ('detached' as const),
      message: status?.message ?? 'Not attached.',
    },
  };
}

/** The record of the tool that lies on the bench, once its check is signed. */
async function recordOf(
  { reader, secret }: BenchScope,
  row: StaffTagRow | undefined,
): Promise<BenchSnapshot['record']> {
  if (!row || row.tag.state !== 'ready') return null;
  const [record] = await reader
    .select()
    .from(records)
    .where(eq(records.tagId, row.tag.id))
    .orderBy(desc(records.signedAt))
    .limit(1);
  if (!record) return null;
  const signed = parseRecord(record.canonical);
  return {
    number: record.number,
    verdict: record.verdict,
    statement: signed.evaluation.statement,
    path: `/r/${linkToken(secret, 'record', record.id, record.linkVersion)}`,
    lowestMark: signed.plan.setting ? formatTorque(row.tool.rangeMin, row.tool.unit) : null,
  };
}

/** Everything on a bench but its check, or null when there is no such bench. */
export async function benchSnapshot(
  scope: BenchScope,
  benchId: string,
): Promise<BenchSnapshot | null> {
  const { reader, now } = scope;
  const revision = await currentRevision(reader);
  const [head] = await reader
    .select({ bench: benches, meet: meets, operator: { id: staff.id, name: staff.name } })
    .from(benches)
    .innerJoin(meets, eq(meets.id, benches.meetId))
    .leftJoin(staff, eq(staff.id, benches.operatorId))
    .where(eq(benches.id, benchId));
  if (!head) return null;
  const { bench, meet } = head;
  const rows = await staffTags(reader)
    .where(
      and(
        eq(tags.meetId, meet.id),
        or(
          eq(tags.state, 'waiting'),
          and(eq(tags.benchId, bench.id), inArray(tags.place, ['visitor', 'bench'])),
        ),
      ),
    )
    .orderBy(asc(tags.position));
  const lying = rows.find(({ tag }) => tag.benchId === bench.id && tag.place === 'bench');
  const called = rows.find(({ tag }) => tag.benchId === bench.id && tag.state === 'called');
  const byId = new Map(rows.map((row) => [row.tag.id, row]));
  const waiting = waitingOrder(rows.map(({ tag }) => tag));
  return {
    revision,
    at: now.toISOString(),
    bench: {
      id: bench.id,
      number: bench.number,
      state: bench.state,
      pausedReason: bench.pausedReason,
      operator: head.operator,
    },
    meet: {
      id: meet.id,
      slug: meet.slug,
      name: meet.name,
      timeZone: meet.timeZone,
      plan: meet.planSettings,
    },
    tester: bench.testerId ? await testerOf(scope, bench.testerId, meet) : null,
    tag: lying ? tagView(lying) : null,
    tool: lying ? toolOnBench(lying) : null,
    called: called
      ? { ...tagView(called), calledAt: (called.tag.calledAt ?? called.tag.joinedAt).toISOString() }
      : null,
    next: waiting.slice(0, NEXT).map((tag) => tagView(byId.get(tag.id)!)),
    waitingCount: waiting.length,
    record: await recordOf(scope, lying),
  };
}
