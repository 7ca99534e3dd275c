import { v7 as uuidv7 } from 'uuid';
import type { startCheckSchema } from '@/lib/record/check-start';
import type { z } from 'zod';
import type { CommandContext } from '@/server/commands/command';
import { startCheck } from '@/server/commands/check/start';
import { callTag } from '@/server/commands/tag/call';
import { takeOnBench } from '@/server/commands/tag/take-on-bench';

/** A code of a problem, whatever bundle its class is from. */
export const codeOf = async (work: Promise<unknown>): Promise<string> =>
  work.then(
    () => 'done',
    (error: unknown) =>
      error instanceof Error && 'code' in error ? String(error.code) : String(error),
  );

/** The plate of the tool that the factories make: a click wrench, 60–340 N·m in steps of 2, ±4 %. */
export const PLATE = {
  toolClass: 'II-A',
  rangeMin: 60,
  rangeMax: 340,
  unit: 'N.m',
  division: 2,
  claim: { of: 'reading', cwPercent: 4, ccwPercent: null },
} as const;

type Start = z.input<typeof startCheckSchema>;

/** What the operator fills in for that tool. */
export const startInput = (benchId: string, tagId: string, change: Partial<Start> = {}): Start => ({
  benchId,
  tagId,
  tool: PLATE,
  asFound: { testerMode: 'first-peak', temperatureC: 21 },
  scheme: 'standard',
  ownerConfirmed: true,
  cautionsSeen: true,
  testerModeConfirmed: true,
  ...change,
});

/** Calls the tag, lays its tool on the bench and starts a check. */
export async function checkOnBench(
  ctx: CommandContext,
  benchId: string,
  tagId: string,
  change: Partial<Start> = {},
): Promise<string> {
  await callTag(ctx, uuidv7(), { benchId, tagId });
  await takeOnBench(ctx, uuidv7(), { benchId, tagId });
  return (await startCheck(ctx, uuidv7(), startInput(benchId, tagId, change))).checkId;
}
