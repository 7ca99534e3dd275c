import { z } from 'zod';
import { VOID_FAULTS } from '@/lib/torque/faults';
import { DIRECTIONS } from '@/lib/torque/terms';
import { TORQUE_UNITS } from '@/lib/torque/units';

const torque = z
  .number({ error: 'The torque must be a number.' })
  .min(0, 'A torque is not negative.')
  .max(1_000_000, 'No tool and no tester shows such a torque.');

/** One pull as it comes in: typed, or from the tester. */
export const recordPullSchema = z.object({
  checkId: z.uuid(),
  /** What the tester shows, in `unit`; null for an exercise pull that nobody read. */
  value: torque.nullable(),
  unit: z.enum(TORQUE_UNITS),
  /** The tester's own word on the direction; null when it says nothing. */
  direction: z.enum(DIRECTIONS).nullable().default(null),
  /** What the tool's display showed, in the plan's unit; null for setting tools. */
  toolValue: torque.nullable().default(null),
  outcome: z.enum(['reading', 'no-release']).default('reading'),
  /** The step that the value was typed for; null to take it for the step that is due. */
  stepIndex: z.number().int().min(0).nullable().default(null),
  /** Yes to the question about a value that looks mistyped. */
  confirmed: z.boolean().default(false),
});
export type RecordPullInput = z.input<typeof recordPullSchema>;

export const acceptPullSchema = z.object({
  pullId: z.uuid(),
  /** `no-release`: the value is how far a setting tool was pulled without letting go. */
  outcome: z.enum(['reading', 'no-release']).default('reading'),
  toolValue: torque.nullable().default(null),
  confirmed: z.boolean().default(false),
});

export type AcceptPullInput = z.input<typeof acceptPullSchema>;

export const voidPullSchema = z.object({
  pullId: z.uuid(),
  fault: z.enum(VOID_FAULTS, { error: 'Choose what went wrong with the pull.' }),
  note: z.string().trim().max(300, 'Keep the note under 300 characters.').default(''),
});
