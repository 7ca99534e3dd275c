import { and, asc, count, eq, inArray, ne, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, checks, meets, pullDecisions, pulls, records, tags, tools } from '@/db/schema';
import { tagLine } from '@/lib/format/tool';
import { waitingOrder } from '@/lib/line/order';
import type { LineBench, LineSnapshot } from '@/lib/live/contract';
import { progressOf } from '@/lib/torque/progress';
import { pullFact } from '@/server/queries/check/facts';
import { gatherPulls } from '@/server/queries/check/load';
import { currentRevision } from '@/server/queries/revision';
import { progressWords } from './progress';

type OpenTag = Awaited<ReturnType<typeof openTags>>[number];

/** Every tag of the meet that the line still shows. */
const openTags = (reader: Reader, meetId: string) =>
  reader
    .select({
      id: tags.id,
      code: tags.code,
      state: tags.state,
      place: tags.place,
      peg: tags.peg,
      benchId: tags.benchId,
      position: tags.position,
      heldUntil: tags.heldUntil,
      calledAt: tags.calledAt,
      toolId: tags.toolId,
    })
    .from(tags)
    .where(
      and(
        eq(tags.meetId, meetId),
        inArray(tags.state, [
          'waiting',
          'called',
          'on_bench',
          'ready',
          'away',
          'withdrawn',
          'unfit',
        ]),
        ne(tags.place, 'returned'),
      ),
    )
    .orderBy(asc(tags.position));

/** The tools that lie on a bench: the line shows no other tool, and it can be long. */
async function toolsOnBenches(
  reader: Reader,
  line: OpenTag[],
): Promise<Map<string, typeof tools.$inferSelect>> {
  const ids = line.filter((tag) => tag.place === 'bench').map((tag) => tag.toolId);
  if (ids.length === 0) return new Map();
  const rows = await reader.select().from(tools).where(inArray(tools.id, ids));
  return new Map(rows.map((tool) => [tool.id, tool]));
}

interface RunningCheck {
  benchId: string;
  words: string;
  progress: { done: number; total: number };
}

/** How far each running check of the meet is. */
async function runningChecks(reader: Reader, meetId: string): Promise<RunningCheck[]> {
  const running = await reader
    .select({ check: checks, tool: tools })
    .from(checks)
    .innerJoin(tags, eq(tags.id, checks.tagId))
    .innerJoin(tools, eq(tools.id, tags.toolId))
    .where(and(eq(checks.meetId, meetId), eq(checks.state, 'running')));
  if (running.length === 0) return [];
  const ids = running.map(({ check }) => check.id);
  // Pulls and decisions are named by their checks, each for itself: in one join with the checks the
  // planner, which knows no counts in PGlite, reads every pull there is.
  const rows = await reader
    .select({ pull: pulls, decision: pullDecisions })
    .from(pulls)
    .leftJoin(
      pullDecisions,
      and(eq(pullDecisions.pullId, pulls.id), inArray(pullDecisions.checkId, ids)),
    )
    .where(inArray(pulls.checkId, ids));
  return running.map(({ check, tool }) => {
    const files = gatherPulls(rows.filter(({ pull }) => pull.checkId === check.id));
    const { progress, nextStepIndex } = progressOf({
      plan: check.plan,
      tool,
      pulls: files.map((one) => pullFact(check.plan, one)),
    });
    return {
      benchId: check.benchId,
      progress,
      words: progressWords(check.plan.steps, nextStepIndex),
    };
  });
}

/** Today's records by verdict: since the service day began, in the meet's own zone. */
const todaysVerdicts = (reader: Reader, meet: typeof meets.$inferSelect, now: Date) => {
  const shift = sql`make_interval(hours => ${meet.dayStartHour})`;
  const local = sql`${now.toISOString()}::timestamptz at time zone ${meet.timeZone}`;
  const dayStart = sql`((date_trunc('day', ${local} - ${shift}) + ${shift}) at time zone ${meet.timeZone})`;
  return reader
    .select({ verdict: records.verdict, count: count() })
    .from(records)
    .where(and(eq(records.meetId, meet.id), sql`${records.signedAt} >= ${dayStart}`))
    .groupBy(records.verdict);
};

function benchOf(
  bench: Pick<typeof benches.$inferSelect, 'id' | 'number' | 'state'>,
  line: OpenTag[],
  toolsById: ReadonlyMap<string, typeof tools.$inferSelect>,
  running: RunningCheck[],
): LineBench {
  const lying = line.find((tag) => tag.benchId === bench.id && tag.place === 'bench');
  const tool = lying && toolsById.get(lying.toolId);
  const called = line.find((tag) => tag.benchId === bench.id && tag.state === 'called');
  const check = running.find((row) => row.benchId === bench.id);
  const words = (): string => {
    if (check) return check.words;
    if (lying)
      return lying.state === 'on_bench'
        ? 'Getting ready'
        : lying.state === 'ready'
          ? 'Checked. Ready to collect'
          : 'Not checked';
    if (bench.state === 'paused') return 'Short break';
    if (bench.state === 'closed') return 'Closed';
    return called ? 'Waiting for its owner' : 'Free';
  };
  return {
    id: bench.id,
    number: bench.number,
    state: bench.state,
    tag: lying && tool ? { code: lying.code, state: lying.state, tool: tagLine(tool) } : null,
    called: called
      ? { code: called.code, calledAt: (called.calledAt ?? new Date(0)).toISOString() }
      : null,
    progress: check?.progress ?? null,
    words: words(),
  };
}

/** The line of a meet as everybody may see it, or null when there is no such meet. */
export async function lineSnapshot(
  reader: Reader,
  meetId: string,
  now: Date,
): Promise<LineSnapshot | null> {
  // The revision is read first: what is read later can only be newer than it says.
  const revision = await currentRevision(reader);
  const [meet] = await reader.select().from(meets).where(eq(meets.id, meetId));
  if (!meet) return null;
  const line = await openTags(reader, meetId);
  const toolsById = await toolsOnBenches(reader, line);
  const running = await runningChecks(reader, meetId);
  const verdicts = await todaysVerdicts(reader, meet, now);
  const rows = await reader
    .select({ id: benches.id, number: benches.number, state: benches.state })
    .from(benches)
    .where(eq(benches.meetId, meetId))
    .orderBy(asc(benches.number));

  const today = { checked: 0, within: 0, outside: 0, 'too-close': 0, 'not-judged': 0 };
  for (const row of verdicts) {
    today[row.verdict] = row.count;
    today.checked += row.count;
  }
  return {
    revision,
    at: now.toISOString(),
    meetId,
    meetName: meet.name,
    timeZone: meet.timeZone,
    joinOpen: meet.joinOpen,
    benches: rows.map((bench) => benchOf(bench, line, toolsById, running)),
    waiting: waitingOrder(line).map((tag) => ({
      code: tag.code,
      held: tag.heldUntil !== null && tag.heldUntil > now,
      withUs: tag.place !== 'visitor',
    })),
    ready: line
      .filter((tag) => tag.state === 'ready')
      .map((tag) => {
        const bench = rows.find((row) => row.id === tag.benchId);
        return {
          code: tag.code,
          where: tag.place === 'peg' ? `peg ${tag.peg}` : `bench ${bench?.number ?? '?'}`,
        };
      }),
    away: line.filter((tag) => tag.state === 'away').map((tag) => tag.code),
    today,
  };
}
