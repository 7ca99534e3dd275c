import { z } from 'zod';
import { DIRECTIONS } from '@/lib/torque/terms';
import { TORQUE_UNITS } from '@/lib/torque/units';
import { parsePoints, pointsFault, type PrintedPoint } from './certificate-points';
import { calendarDate, line, optionalDecimal } from './fields';

const printedPoint = z.object({
  direction: z.enum(DIRECTIONS),
  torque: z.number(),
  errorPercent: z.number(),
  expandedPercent: z.number(),
  k: z.number(),
});

/** Rows, or the text that they are pasted as. */
const points = z
  .union([z.string().max(10_000, 'This is too long.'), z.array(printedPoint).max(60)], {
    error: 'Give the certificate’s points.',
  })
  .transform((value, context): PrintedPoint[] => {
    const parsed =
      typeof value === 'string' ? parsePoints(value) : { points: value, rows: undefined };
    const fault = 'fault' in parsed ? parsed.fault : pointsFault(parsed.points, parsed.rows);
    if (fault === null && 'points' in parsed) return parsed.points;
    context.addIssue({ code: 'custom', message: fault ?? 'Give the certificate’s points.' });
    return z.NEVER;
  });

/** A tester's certificate as a lead enters it from paper. */
export const certificateSchema = z
  .object({
    testerId: z.uuid(),
    number: line('The number', 60),
    laboratory: line('The laboratory', 120),
    accreditation: line('The accreditation', 60),
    issuedOn: calendarDate('The date of issue'),
    dueOn: calendarDate('The due date'),
    traceability: line('The traceability', 300),
    temperatureC: optionalDecimal('The temperature', { min: -10, max: 50 }),
    /** Of the points' torques. */
    unit: z.enum(TORQUE_UNITS, { error: 'Choose the unit.' }),
    points,
  })
  .superRefine(({ issuedOn, dueOn }, context) => {
    if (dueOn > issuedOn) return;
    const message = 'The due date must be after the date of issue.';
    context.addIssue({ code: 'custom', path: ['dueOn'], message });
  });
export type CertificateInput = z.input<typeof certificateSchema>;
