import { count, eq } from 'drizzle-orm';
import { benches, pullDecisions, pulls } from '@/db/schema';
import { recordPull } from '@/server/commands/pull/record';
import { fixedId, makeCertificate, makeProof, makeTester } from '../support/factories';
import { beginCheck, endCheck, pullOf, type CheckPlace } from './check';
import { callId, openPost, type BenchPost } from './post';
import { pullByHand } from './pull-by-hand';
import { measurement, say, type Measurement } from './report';
import { assertSameStatements, statementsOf } from './statements';

const PULLS = 300;

/** Bench 2 gets a tester like that of bench 1, so that two alike checks run side by side. */
async function secondPlace({ db, world }: BenchPost): Promise<CheckPlace> {
  const testerId = fixedId('tester', 2);
  await makeTester(db, { id: testerId, name: 'T-02', serial: 'HX-0002' });
  await makeCertificate(db, { id: fixedId('certificate', 2), testerId });
  await makeProof(db, { id: fixedId('proof', 2), testerId });
  await db.update(benches).set({ testerId }).where(eq(benches.id, world.otherBench.id));
  return { benchId: world.otherBench.id, tagId: fixedId('tag', 2) };
}

/** Pulls and decisions that a check has now. */
async function rowsOf({ db }: BenchPost, checkId: string): Promise<string> {
  const [pull] = await db.select({ rows: count() }).from(pulls).where(eq(pulls.checkId, checkId));
  const [decision] = await db
    .select({ rows: count() })
    .from(pullDecisions)
    .where(eq(pullDecisions.checkId, checkId));
  return `${pull!.rows} pulls, ${decision!.rows} decisions`;
}

/**
 * The command that records a pull against the same statements written by hand in one transaction on
 * the same PGlite, in turns over fresh checks.
 */
export async function measureSql(): Promise<Measurement> {
  say('record a pull: opening');
  const post = await openPost({ tags: 2 });
  const byHand = await secondPlace(post);
  const staffId = post.world.staff.operator.id;
  const ctx = { ...post.context().ctx, publish: () => undefined };
  const ours: number[] = [];
  const bare: number[] = [];
  let statements = 0;

  const timed = async (into: number[] | null, work: () => Promise<unknown>): Promise<void> => {
    await new Promise((resolve) => setImmediate(resolve));
    const start = performance.now();
    await work();
    into?.push(performance.now() - start);
  };

  say(`record a pull: ${PULLS} each`);
  for (let warm = true; ours.length < PULLS; warm = false) {
    const one = await beginCheck(post);
    const other = await beginCheck(post, byHand);
    for (const [index, step] of one.plan.steps.entries()) {
      const command = () => recordPull(ctx, callId(), pullOf(one.checkId, step));
      const hand = () =>
        pullByHand(post.client, {
          staffId,
          commandId: callId(),
          input: pullOf(other.checkId, step),
          now: post.clock(),
        });
      if (warm && index % 5 === 0) {
        const seen = await statementsOf(post.client, command);
        assertSameStatements(seen, await statementsOf(post.client, hand));
        statements = seen.length;
        continue;
      }
      // Each goes first every other time.
      const turns = [
        () => timed(warm ? null : ours, command),
        () => timed(warm ? null : bare, hand),
      ];
      for (const turn of index % 2 === 0 ? turns : turns.reverse()) await turn();
    }
    const left = [await rowsOf(post, one.checkId), await rowsOf(post, other.checkId)];
    if (left[0] !== left[1]) throw new Error(`Not the same rows: ${left.join(' by command, ')}.`);
    await endCheck(post);
    await endCheck(post, byHand);
  }
  await post.close();
  return measurement({
    name: 'record-pull',
    what: 'the command that records a pull, against the same statements by hand in one transaction',
    unit: 'ms',
    limit: 1.5,
    ours,
    bare,
    notes: { statements, checks: Math.ceil(ours.length / 20) },
  });
}
