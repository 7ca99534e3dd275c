import type { BenchSnapshot } from '@/lib/live/contract';
import type { startCheckSchema } from '@/lib/record/check-start';
import { buildPlan, type CheckPlan } from '@/lib/torque/plan';
import type { PlanSettings } from '@/lib/torque/settings';
import { formatNumber, unitText } from '@/lib/torque/units';
import { directionWords, listWords } from '@/lib/torque/words';
import type { z } from 'zod';

type Planned = Pick<z.output<typeof startCheckSchema>, 'tool' | 'scheme' | 'workingPoints'>;

export type PlanPreview = { ok: true; plan: CheckPlan } | { ok: false; words: string };

/** The plan that the post will fix at the start, or why it will refuse. */
export function previewPlan(
  { tool, scheme, workingPoints }: Planned,
  settings: PlanSettings,
  tester: Pick<NonNullable<BenchSnapshot['tester']>, 'minNm' | 'maxNm'> | null,
): PlanPreview {
  try {
    const plan = buildPlan({
      toolClass: tool.toolClass,
      range: { min: tool.rangeMin, max: tool.rangeMax },
      unit: tool.unit,
      division: tool.division,
      nominal: tool.nominal,
      directions: tool.measuresCcw ? ['cw', 'ccw'] : ['cw'],
      scheme: scheme === 'standard' ? settings.scheme : scheme,
      workingPoints,
      basis: settings.basis,
      guard: settings.guard,
      testerRange: tester && { minNm: tester.minNm, maxNm: tester.maxNm },
      overrides: settings.overrides,
    });
    return { ok: true, plan };
  } catch (error) {
    if (error instanceof RangeError || error instanceof TypeError) {
      return { ok: false, words: error.message };
    }
    throw error;
  }
}

/** 'Clockwise: 5 exercise pulls at 340, then 5 readings each at 68, 204 and 340 N·m.' */
export function planWords(plan: CheckPlan, division: number | null): string[] {
  const directions = [...new Set(plan.points.map(({ direction }) => direction))];
  return directions.map((direction) => {
    const number = (value: number) => formatNumber(value, { division });
    const targets = plan.points
      .filter((point) => point.direction === direction)
      .map(({ target }) => number(target));
    const first = plan.steps.find(
      (step) => step.kind === 'exercise' && step.direction === direction,
    );
    const exercise = first
      ? `${plan.exercisePulls} exercise ${plan.exercisePulls === 1 ? 'pull' : 'pulls'} at ${number(first.target)}, then `
      : '';
    const words = directionWords(direction);
    const each = targets.length === 1 ? '' : ' each';
    return `${words.charAt(0).toUpperCase()}${words.slice(1)}: ${exercise}${plan.readingsPerPoint} readings${each} at ${listWords(targets)} ${unitText(plan.unit)}.`;
  });
}
