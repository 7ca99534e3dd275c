import { and, eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import type { z } from 'zod';
import { checks, meets, tags, tools } from '@/db/schema';
import { startCheckSchema } from '@/lib/record/check-start';
import { buildPlan, type CheckPlan } from '@/lib/torque/plan';
import { isSettingTool } from '@/lib/torque/tool';
import { lockBench } from '@/server/commands/bench/shared';
import { defineCommand } from '@/server/commands/command';
import { lockTag } from '@/server/commands/tag/shared';
import { Problem } from '@/server/problem';
import { loadCheckFile } from '@/server/queries/check/load';
import { testerToday } from '@/server/queries/tester/standing';
import { checkEntry } from './shared';

type Input = z.output<typeof startCheckSchema>;
type Meet = typeof meets.$inferSelect;

/** The plan, or a refusal in the words of the rule that it breaks. */
function planFor(input: Input, meet: Meet, tester: { minNm: number; maxNm: number }): CheckPlan {
  const settings = meet.planSettings;
  try {
    return buildPlan({
      toolClass: input.tool.toolClass,
      range: { min: input.tool.rangeMin, max: input.tool.rangeMax },
      unit: input.tool.unit,
      division: input.tool.division,
      nominal: input.tool.nominal,
      directions: input.tool.measuresCcw ? ['cw', 'ccw'] : ['cw'],
      scheme: input.scheme === 'standard' ? settings.scheme : input.scheme,
      workingPoints: input.workingPoints,
      basis: settings.basis,
      guard: settings.guard,
      testerRange: { minNm: tester.minNm, maxNm: tester.maxNm },
      overrides: settings.overrides,
    });
  } catch (error) {
    if (error instanceof RangeError || error instanceof TypeError)
      throw new Problem('invalid', error.message);
    throw error;
  }
}

/**
 * Starts a check: what the plate says replaces what the visitor said, the plan is fixed, and what
 * the tester rests on today is kept with it.
 */
export const startCheck = defineCommand({
  name: 'check.start',
  input: startCheckSchema,
  run: async ({ tx, now, staffId }, input) => {
    const bench = await lockBench(tx, input.benchId);
    const tag = await lockTag(tx, input.tagId);
    if (tag.state !== 'on_bench' || tag.benchId !== bench.id) {
      throw new Problem('wrong-move', `${tag.code} does not lie on bench ${bench.number}.`);
    }
    const [other] = await tx
      .select({ id: checks.id })
      .from(checks)
      .where(and(eq(checks.benchId, bench.id), eq(checks.state, 'running')));
    if (other)
      throw new Problem('conflict', `A check is running on bench ${bench.number} already.`);
    if (!bench.testerId)
      throw new Problem('wrong-move', `Bench ${bench.number} has no tester. Ask a lead.`);
    if (tag.consent === 'working' && input.scheme !== 'working') {
      throw new Problem('invalid', 'The visitor agreed to working points only.', {
        fields: { scheme: 'The visitor agreed to working points only.' },
      });
    }
    const needed = isSettingTool(input.tool.toolClass) ? 'first-peak' : 'live';
    if (input.asFound.testerMode !== needed) {
      throw new Problem('invalid', 'This kind of tool needs the tester’s other mode.', {
        fields: { 'asFound.testerMode': 'This kind of tool needs the tester’s other mode.' },
      });
    }
    const [meet] = await tx.select().from(meets).where(eq(meets.id, bench.meetId));
    const today = await testerToday(tx, bench.testerId, meet!, now);
    const plan = planFor(input, meet!, today!.tester);

    await tx
      .update(tools)
      .set({ ...input.tool, classUnsure: false })
      .where(eq(tools.id, tag.toolId));
    if (input.workingPoints) {
      await tx.update(tags).set({ workingPoints: input.workingPoints }).where(eq(tags.id, tag.id));
    }
    const checkId = uuidv7();
    await tx.insert(checks).values({
      id: checkId,
      meetId: bench.meetId,
      tagId: tag.id,
      benchId: bench.id,
      testerId: bench.testerId,
      certificateId: today!.certificate?.id ?? null,
      proofId: today!.proof?.id ?? null,
      operatorId: staffId(),
      state: 'running',
      plan,
      planVersion: meet!.planSettings.version,
      asFound: input.asFound,
      startedAt: now,
    });
    const file = await loadCheckFile(tx, { checkId });
    return {
      result: { checkId },
      entry: checkEntry(file!, { bench: bench.number, scheme: plan.scheme, barred: today!.barred }),
      events: [
        { kind: 'check', file: file! },
        { kind: 'bench', benchId: bench.id },
        { kind: 'line', meetId: bench.meetId },
        { kind: 'tag', tagId: tag.id },
      ],
    };
  },
});
