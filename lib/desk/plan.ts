import { z } from 'zod';
import type { PlanSettings } from '@/lib/torque/settings';
import { relativeDeviation } from '@/lib/torque/deviation';
import { BASES, type Basis } from '@/lib/torque/terms';
import { decimal, optionalDecimal } from './fields';

export const MEET_SCHEMES = ['iso-2003', 'iso-2017', 'short'] as const;

/** The guard bands on offer, and where each comes from. */
export const GUARDS = [
  {
    value: 1,
    label: 'Whole uncertainty',
    source:
      'ILAC-G8:09/2019 with w = U: a tool passed as within has at most a 2.5 % chance of being outside.',
  },
  {
    value: 0.83,
    label: '0.83 of the uncertainty',
    source: 'ISO 14253-1: a tool passed as within has at most a 5 % chance of being outside.',
  },
  {
    value: 0,
    label: 'None',
    source: 'Simple acceptance: the reading alone decides. Right at the limit it is even chances.',
  },
] as const;

const guardValues: readonly number[] = GUARDS.map(({ value }) => value);

/** How the tools of a meet are checked from now on. Checks that have begun keep their plan. */
export const planSchema = z.object({
  meetId: z.uuid(),
  scheme: z.enum(MEET_SCHEMES, { error: 'Choose the sequence.' }),
  basis: z.enum(BASES, { error: 'Choose the basis.' }),
  guard: decimal('The guard band').refine(
    (guard) => guardValues.includes(guard),
    'Choose the guard band.',
  ),
  /** Null keeps the sequence's own number. */
  exercisePulls: optionalDecimal('Exercise pulls', { min: 0, max: 10, whole: true }),
  readingsPerPoint: optionalDecimal('Readings a point', { min: 1, max: 20, whole: true }),
});
export type PlanInput = z.input<typeof planSchema>;
export type PlanChoice = Omit<z.output<typeof planSchema>, 'meetId'>;

/** The next version of a meet's settings; the same one when nothing is different. */
export function nextSettings(before: PlanSettings, choice: PlanChoice): PlanSettings {
  const { exercisePulls, readingsPerPoint, scheme, basis, guard } = choice;
  const same =
    before.scheme === scheme &&
    before.basis === basis &&
    before.guard === guard &&
    before.overrides.exercisePulls === exercisePulls &&
    before.overrides.readingsPerPoint === readingsPerPoint;
  if (same) return before;
  return {
    version: before.version + 1,
    scheme,
    basis,
    guard,
    overrides: { exercisePulls, readingsPerPoint },
  };
}

/** A tool near its limit, seen on both bases: for the lead who chooses one. */
export function basisExample(tolerancePercent = 4): {
  setTo: number;
  delivers: number;
  deviations: Record<Basis, number>;
  inside: Record<Basis, boolean>;
} {
  const setTo = 100;
  const delivers = 104.1;
  const deviations = {
    reference: relativeDeviation(setTo, delivers, 'reference'),
    set: relativeDeviation(setTo, delivers, 'set'),
  };
  return {
    setTo,
    delivers,
    deviations,
    inside: {
      reference: Math.abs(deviations.reference) <= tolerancePercent,
      set: Math.abs(deviations.set) <= tolerancePercent,
    },
  };
}
