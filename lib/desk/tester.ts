import { z } from 'zod';
import {
  keyedConnectionSchema,
  serialConnectionSchema,
  simulatedConnectionSchema,
} from '@/lib/signal/connection';
import { TORQUE_UNITS } from '@/lib/torque/units';
import { decimal, line, optionalDecimal } from './fields';

const torque = (what: string) => decimal(what, { above: 0, max: 1_000_000 });

/** The connection as a form holds it: numbers may still be text. */
export const typedConnectionSchema = z.discriminatedUnion('kind', [
  keyedConnectionSchema,
  simulatedConnectionSchema.extend({
    biasPercent: decimal('The bias', { min: -50, max: 50 }),
    scatterPercent: decimal('The scatter', { min: 0, max: 5 }),
    seed: decimal('The seed', { min: 0, max: 0xffff_ffff, whole: true }),
    secondsPerPull: decimal('The time a pull takes', { min: 0, max: 60 }),
  }),
  serialConnectionSchema.extend({
    baudRate: decimal('The baud rate').pipe(serialConnectionSchema.shape.baudRate),
  }),
]);

const fields = z.object({
  name: line('The tester’s name', 20),
  maker: line('The maker', 60),
  model: line('The model', 60),
  serial: line('The serial number', 60),
  /** Range and resolution are in this unit. */
  unit: z.enum(TORQUE_UNITS, { error: 'Choose the unit.' }),
  min: torque('The lowest torque'),
  max: torque('The highest torque'),
  resolution: torque('The resolution'),
  yearlyDriftPercent: decimal('The drift limit', { min: 0, max: 5 }),
  temperatureCoefficientPercentPerK: optionalDecimal('The temperature coefficient', {
    min: 0,
    max: 1,
  }),
  correctionApplied: z.boolean(),
  connection: typedConnectionSchema,
});

const rangeInOrder = (
  tester: { min: number; max: number; resolution: number },
  context: { addIssue(issue: { code: 'custom'; path: string[]; message: string }): void },
) => {
  if (tester.min >= tester.max) {
    const message = 'The highest torque must be above the lowest. Are they swapped?';
    context.addIssue({ code: 'custom', path: ['max'], message });
  }
  if (tester.resolution > tester.max / 50) {
    const message = 'A resolution this coarse cannot judge a tool. Is it in the right unit?';
    context.addIssue({ code: 'custom', path: ['resolution'], message });
  }
};

export const testerSchema = fields.superRefine(rangeInOrder);
export type TesterInput = z.input<typeof testerSchema>;
export type TesterDescription = z.output<typeof testerSchema>;

export const changeTesterSchema = z.object({ testerId: z.uuid(), tester: testerSchema });

export const lockTesterSchema = z.object({
  testerId: z.uuid(),
  reason: line('The reason', 300),
});
