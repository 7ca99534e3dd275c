import { and, asc, desc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import {
  benches,
  certificates,
  checkNotes,
  checks,
  meets,
  pullDecisions,
  pulls,
  tags,
  testerProofs,
  testers,
  tools,
} from '@/db/schema';

/** Everything that a running or finished check rests on. */
export interface CheckFile {
  check: typeof checks.$inferSelect;
  tag: Pick<typeof tags.$inferSelect, 'id' | 'meetId' | 'code' | 'consent' | 'place' | 'peg'>;
  tool: typeof tools.$inferSelect;
  tester: typeof testers.$inferSelect;
  certificate: typeof certificates.$inferSelect | null;
  proof: typeof testerProofs.$inferSelect | null;
  meet: Pick<typeof meets.$inferSelect, 'timeZone' | 'dayStartHour'>;
  benchNumber: number;
  pulls: PullFile[];
  notes: { text: string; at: Date }[];
}

export interface PullFile {
  pull: typeof pulls.$inferSelect;
  accepted: typeof pullDecisions.$inferSelect | null;
  voided: typeof pullDecisions.$inferSelect | null;
}

type Which = { checkId: string } | { runningOnBench: string };

/**
 * Loads a check with its pulls, or null. `lock` takes the check's row for the transaction, so that
 * two pulls of one check are written one after the other on a PostgreSQL server too.
 */
export async function loadCheckFile(
  reader: Reader,
  which: Which,
  options: { lock?: boolean } = {},
): Promise<CheckFile | null> {
  const query = reader
    .select({
      check: checks,
      tag: {
        id: tags.id,
        meetId: tags.meetId,
        code: tags.code,
        consent: tags.consent,
        place: tags.place,
        peg: tags.peg,
      },
      tool: tools,
      tester: testers,
      certificate: certificates,
      proof: testerProofs,
      meet: { timeZone: meets.timeZone, dayStartHour: meets.dayStartHour },
      benchNumber: benches.number,
    })
    .from(checks)
    .innerJoin(tags, eq(tags.id, checks.tagId))
    .innerJoin(tools, eq(tools.id, tags.toolId))
    .innerJoin(testers, eq(testers.id, checks.testerId))
    .innerJoin(benches, eq(benches.id, checks.benchId))
    .innerJoin(meets, eq(meets.id, checks.meetId))
    .leftJoin(certificates, eq(certificates.id, checks.certificateId))
    .leftJoin(testerProofs, eq(testerProofs.id, checks.proofId))
    .where(
      'checkId' in which
        ? eq(checks.id, which.checkId)
        : and(eq(checks.benchId, which.runningOnBench), eq(checks.state, 'running')),
    );
  const [head] = await (options.lock ? query.for('update', { of: checks }) : query);
  if (!head) return null;

  const rows = await reader
    .select({ pull: pulls, decision: pullDecisions })
    .from(pulls)
    // By the check as well: else the planner may read every decision there is to find these.
    .leftJoin(
      pullDecisions,
      and(eq(pullDecisions.pullId, pulls.id), eq(pullDecisions.checkId, head.check.id)),
    )
    .where(eq(pulls.checkId, head.check.id))
    .orderBy(asc(pulls.sequence));
  const notes = await reader
    .select({ text: checkNotes.text, at: checkNotes.at })
    .from(checkNotes)
    .where(eq(checkNotes.checkId, head.check.id))
    .orderBy(desc(checkNotes.at));
  return { ...head, pulls: gatherPulls(rows), notes };
}

/** Pulls in their order, each with its decisions, from rows of the two joined. */
export function gatherPulls(
  rows: {
    pull: typeof pulls.$inferSelect | null;
    decision: typeof pullDecisions.$inferSelect | null;
  }[],
): PullFile[] {
  const byId = new Map<string, PullFile>();
  for (const { pull, decision } of rows) {
    if (!pull) continue;
    const file = byId.get(pull.id) ?? { pull, accepted: null, voided: null };
    if (decision) file[decision.decision] = decision;
    byId.set(pull.id, file);
  }
  return [...byId.values()];
}
