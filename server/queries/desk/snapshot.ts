import { and, asc, eq, ne, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, meets, staff, tags, testers } from '@/db/schema';
import type { DeskSnapshot } from '@/lib/live/contract';
import { reasonWords } from '@/lib/torque/words';
import { staffTags, tagView } from '@/server/queries/bench/tag-view';
import { lineSnapshot } from '@/server/queries/line/snapshot';
import { testerToday } from '@/server/queries/tester/standing';

/** The whole line as the lead sees it: with names, pegs and what each bench lacks. */
export async function deskSnapshot(
  reader: Reader,
  meetId: string,
  now: Date,
): Promise<DeskSnapshot | null> {
  const line = await lineSnapshot(reader, meetId, now);
  const [meet] = await reader.select().from(meets).where(eq(meets.id, meetId));
  if (!line || !meet) return null;
  const rows = await staffTags(reader)
    .where(and(eq(tags.meetId, meetId), or(ne(tags.place, 'returned'), eq(tags.state, 'away'))))
    .orderBy(asc(tags.position));
  const posts = await reader
    .select({ bench: benches, operator: staff.name, tester: testers.name })
    .from(benches)
    .leftJoin(staff, eq(staff.id, benches.operatorId))
    .leftJoin(testers, eq(testers.id, benches.testerId))
    .where(eq(benches.meetId, meetId))
    .orderBy(asc(benches.number));
  const numbers = new Map(posts.map(({ bench }) => [bench.id, bench.number]));
  const barredOf = async (testerId: string | null): Promise<string[]> => {
    if (!testerId) return ['No tester stands on this bench.'];
    const today = await testerToday(reader, testerId, meet, now);
    return today?.barred.map((code) => reasonWords(code)) ?? [];
  };
  const deskBenches: DeskSnapshot['benches'] = [];
  for (const { bench, operator, tester } of posts) {
    deskBenches.push({
      id: bench.id,
      number: bench.number,
      operator,
      tester,
      barred: await barredOf(bench.testerId),
    });
  }
  return {
    revision: line.revision,
    at: line.at,
    line,
    tags: rows.map((row) => ({
      ...tagView(row),
      benchNumber: row.tag.benchId ? (numbers.get(row.tag.benchId) ?? null) : null,
    })),
    benches: deskBenches,
  };
}
