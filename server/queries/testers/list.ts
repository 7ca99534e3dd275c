import { asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, meets, testers } from '@/db/schema';
import { formatNumber } from '@/lib/torque/units';
import { reasonWords } from '@/lib/torque/words';
import { currentMeet } from '@/server/queries/meets/list';
import { testerToday } from '@/server/queries/tester/standing';
import { certificateWords, proofWords } from '@/server/queries/tester/words';

/** What a tester's day is counted in when it stands on no bench and there is no meet. */
const NOWHERE = { timeZone: 'UTC', dayStartHour: 0 };

type Where = { timeZone: string; dayStartHour: number };

export interface TesterSummary {
  id: string;
  name: string;
  /** 'Harrowgate HX 500' */
  model: string;
  serial: string;
  /** '10–500 N·m' */
  range: string;
  maxNm: number;
  /** 'bench 1 of Test Meet'; null when it stands nowhere. */
  bench: string | null;
  certificate: string;
  proof: string;
  lockedReason: string | null;
  /** Why it judges nothing today, in words. */
  barred: string[];
}

/** Whose day counts for this tester: its bench's meet, else the meet that is on. */
export async function whereOf(
  reader: Reader,
  testerId: string,
  now: Date,
): Promise<{ where: Where; bench: string | null; benchId: string | null }> {
  const [row] = await reader
    .select({ benchId: benches.id, number: benches.number, meet: meets })
    .from(benches)
    .innerJoin(meets, eq(meets.id, benches.meetId))
    .where(eq(benches.testerId, testerId));
  if (row) {
    const bench = `bench ${row.number} of ${row.meet.name}`;
    return { where: row.meet, bench, benchId: row.benchId };
  }
  return { where: (await currentMeet(reader, now)) ?? NOWHERE, bench: null, benchId: null };
}

/** Every tester of the post with what it rests on today. */
export async function testerList(reader: Reader, now: Date): Promise<TesterSummary[]> {
  const rows = await reader.select().from(testers).orderBy(asc(testers.name));
  const list: TesterSummary[] = [];
  for (const tester of rows) {
    const { where, bench } = await whereOf(reader, tester.id, now);
    const today = await testerToday(reader, tester.id, where, now);
    list.push({
      id: tester.id,
      name: tester.name,
      model: `${tester.maker} ${tester.model}`,
      serial: tester.serial,
      range: `${formatNumber(tester.minNm)}–${formatNumber(tester.maxNm)} N·m`,
      maxNm: tester.maxNm,
      bench,
      certificate: certificateWords(today?.certificate ?? null),
      proof: proofWords(today?.proof ?? null, where.timeZone),
      lockedReason: tester.lockedReason,
      barred: today?.barred.map((code) => reasonWords(code)) ?? [],
    });
  }
  return list;
}
