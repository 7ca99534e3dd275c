import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import type { Database } from '@/db/client';
import { checks } from '@/db/schema';
import type { PlanStep } from '@/lib/torque/plan';
import type { CommandContext } from '@/server/commands/command';
import { recordPull } from '@/server/commands/pull/record';

/** A typed pull for this step: 1 % under its target. */
export const pullFor = (checkId: string, step: PlanStep) => ({
  checkId,
  value: Number((step.target * 0.99).toFixed(1)),
  unit: 'N.m' as const,
  toolValue: null,
});

/** The steps of a check's plan, in the order in which they are pulled. */
export async function stepsOf(db: Database, checkId: string): Promise<PlanStep[]> {
  const [check] = await db.select({ plan: checks.plan }).from(checks).where(eq(checks.id, checkId));
  if (!check) throw new Error(`There is no check ${checkId}.`);
  return check.plan.steps;
}

/** Takes every pull of the plan. */
export async function pullAll(ctx: CommandContext, checkId: string): Promise<void> {
  for (const step of await stepsOf(ctx.db, checkId)) {
    await recordPull(ctx, uuidv7(), pullFor(checkId, step));
  }
}
