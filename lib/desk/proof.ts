import { z } from 'zod';
import { PROOF_METHODS, type ProofMethod } from '@/lib/line/states';
import { TORQUE_UNITS } from '@/lib/torque/units';
import { decimal, optionalText } from './fields';

export const PROOF_METHOD_WORDS: Record<ProofMethod, string> = {
  'dead-weight': 'Dead weight on an arm',
  comparison: 'Comparison with another reference',
};

/** What was put on a tester, and what it showed. Whether it passed is worked out, not chosen. */
export const proofSchema = z.object({
  testerId: z.uuid(),
  method: z.enum(PROOF_METHODS, { error: 'Choose how the tester was proved.' }),
  load: decimal('The load', { above: 0, max: 1_000_000 }),
  reading: decimal('What the tester showed', { min: 0, max: 1_000_000 }),
  /** Of load and reading. */
  unit: z.enum(TORQUE_UNITS, { error: 'Choose the unit.' }),
  limitPercent: decimal('The limit', { above: 0, max: 5 }),
  note: optionalText('The note', 500),
  /** The lead has looked again at a reading far from its load. */
  sure: z.boolean().default(false),
});
export type ProofInput = z.input<typeof proofSchema>;

/** Further off than this, a typing error is likelier than a bad tester, per cent. */
const FAR_OFF_PERCENT = 20;

export interface ProofOutcome {
  /** 100·(shown − load)/load. */
  errorPercent: number;
  result: 'passed' | 'failed';
  /** So far off that the numbers themselves are in doubt. */
  farOff: boolean;
}

/** Whether a tester passed: its error at the load against the limit, the limit itself included. */
export function proofOutcome({
  load,
  reading,
  limitPercent,
}: {
  load: number;
  reading: number;
  limitPercent: number;
}): ProofOutcome {
  if (!(load > 0)) throw new RangeError('A load must be above zero.');
  if (!(reading >= 0)) throw new RangeError('A reading must not be below zero.');
  if (!(limitPercent > 0)) throw new RangeError('A limit must be above zero.');
  const errorPercent = (100 * (reading - load)) / load;
  const size = Math.abs(errorPercent);
  return {
    errorPercent,
    // A reading on the limit itself must not fail by the last digit of a division.
    result: size <= limitPercent * (1 + 1e-9) ? 'passed' : 'failed',
    farOff: size > FAR_OFF_PERCENT,
  };
}

/** '+0.30 %', with the sign in front and a true minus. */
export const errorWords = (errorPercent: number): string =>
  `${errorPercent < 0 ? '−' : '+'}${Math.abs(errorPercent).toFixed(2)} %`;

/** The words that a failed proof locks its tester with. */
export const failedProofWords = (outcome: ProofOutcome, limitPercent: number): string =>
  `Proof failed: ${errorWords(outcome.errorPercent)} at its load, the limit is ±${limitPercent} %.`;
