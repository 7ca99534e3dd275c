import { eq } from 'drizzle-orm';
import { checks } from '@/db/schema';
import type { RecordPullInput } from '@/lib/record/pull-input';
import type { CheckPlan, PlanStep } from '@/lib/torque/plan';
import { abandonCheck } from '@/server/commands/check/abandon';
import { startCheck } from '@/server/commands/check/start';
import { callTag } from '@/server/commands/tag/call';
import { takeOnBench } from '@/server/commands/tag/take-on-bench';
import { callId, type BenchPost } from './post';

export interface CheckPlace {
  benchId: string;
  tagId: string;
}

/** Bench 1 and the first tag. */
export const firstPlace = ({ world }: BenchPost): CheckPlace => ({
  benchId: world.bench.id,
  tagId: world.tag.id,
});

/** Calls the tag, takes it on the bench and starts its check, all by commands. */
export async function beginCheck(
  post: BenchPost,
  place: CheckPlace = firstPlace(post),
): Promise<{ checkId: string; plan: CheckPlan }> {
  const { ctx } = post.context();
  await callTag(ctx, callId(), place);
  await takeOnBench(ctx, callId(), place);
  const { checkId } = await startCheck(ctx, callId(), {
    ...place,
    tool: {
      toolClass: 'II-A',
      rangeMin: 60,
      rangeMax: 340,
      unit: 'N.m',
      division: 2,
      claim: { of: 'reading', cwPercent: 4, ccwPercent: null },
    },
    asFound: { testerMode: 'first-peak', temperatureC: 20 },
    scheme: 'standard',
    ownerConfirmed: true,
    cautionsSeen: true,
    testerModeConfirmed: true,
  });
  const [check] = await post.db
    .select({ plan: checks.plan })
    .from(checks)
    .where(eq(checks.id, checkId));
  return { checkId, plan: check!.plan };
}

/** Gives the running check up, so that the next one starts empty. */
export async function endCheck(
  post: BenchPost,
  { tagId }: CheckPlace = firstPlace(post),
): Promise<void> {
  const { ctx } = post.context();
  await abandonCheck(ctx, callId(), {
    tagId,
    to: 'visitor',
    reason: 'The measurement goes on with a fresh check.',
  });
}

/** A typed pull for this step, 1 % under its target. */
export const pullOf = (checkId: string, step: PlanStep): RecordPullInput => ({
  checkId,
  value: Number((step.target * 0.99).toFixed(1)),
  unit: 'N.m',
  toolValue: null,
});
