import { and, asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, checks, meets, staff, testers } from '@/db/schema';
import type { BenchState } from '@/lib/line/states';
import { reasonWords } from '@/lib/torque/words';
import { testerToday } from '@/server/queries/tester/standing';
import { certificateWords, proofWords } from '@/server/queries/tester/words';

/** A bench as the desk sets it up. */
export interface BenchSetUp {
  id: string;
  number: number;
  state: BenchState;
  operator: string | null;
  testerId: string | null;
  tester: string | null;
  /** 'certificate to 14 Mar 2027', 'proved 07:41 at 100 N·m' */
  testerFacts: string[];
  /** Why it would judge nothing now, in words; empty when it may. */
  barred: string[];
  /** A check runs here: its tester cannot be changed. */
  busy: boolean;
}

/** The benches of a meet, with what their testers rest on today. */
export async function benchList(reader: Reader, meetId: string, now: Date): Promise<BenchSetUp[]> {
  const rows = await reader
    .select({ bench: benches, meet: meets, operator: staff.name, checkId: checks.id })
    .from(benches)
    .innerJoin(meets, eq(meets.id, benches.meetId))
    .leftJoin(staff, eq(staff.id, benches.operatorId))
    .leftJoin(checks, and(eq(checks.benchId, benches.id), eq(checks.state, 'running')))
    .where(eq(benches.meetId, meetId))
    .orderBy(asc(benches.number));
  const list: BenchSetUp[] = [];
  for (const { bench, meet, operator, checkId } of rows) {
    const today = bench.testerId ? await testerToday(reader, bench.testerId, meet, now) : null;
    list.push({
      id: bench.id,
      number: bench.number,
      state: bench.state,
      operator,
      testerId: bench.testerId,
      tester: today?.tester.name ?? null,
      testerFacts: today
        ? [certificateWords(today.certificate), proofWords(today.proof, meet.timeZone)]
        : [],
      barred: today
        ? today.barred.map((code) => reasonWords(code))
        : ['no tester stands on this bench'],
      busy: checkId !== null,
    });
  }
  return list;
}

/** A tester to choose for a bench, with where it stands now. */
export interface TesterChoice {
  id: string;
  name: string;
  /** 'bench 2 of Test Meet'; null when it stands nowhere. */
  where: string | null;
}

export async function testerChoices(reader: Reader): Promise<TesterChoice[]> {
  const rows = await reader
    .select({ id: testers.id, name: testers.name, number: benches.number, meet: meets.name })
    .from(testers)
    .leftJoin(benches, eq(benches.testerId, testers.id))
    .leftJoin(meets, eq(meets.id, benches.meetId))
    .orderBy(asc(testers.name));
  return rows.map(({ id, name, number, meet }) => ({
    id,
    name,
    where: number === null ? null : `bench ${number} of ${meet}`,
  }));
}
