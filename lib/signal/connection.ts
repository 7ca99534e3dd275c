import { z } from 'zod';
import { TORQUE_UNITS } from '@/lib/torque/units';
import { DEFAULT_LINE_PATTERN, linePatternFault } from './pattern';

/** How readings come from a tester: typed, played, or over a serial line. */
export const CONNECTION_KINDS = ['keyed', 'simulated', 'serial'] as const;
export type ConnectionKind = (typeof CONNECTION_KINDS)[number];

/** Bits a second that serial testers use. */
export const BAUD_RATES = [
  300, 600, 1200, 2400, 4800, 9600, 14400, 19200, 38400, 57600, 115200, 230400, 460800, 921600,
] as const;

const baudRates: readonly number[] = BAUD_RATES;

export const keyedConnectionSchema = z.object({ kind: z.literal('keyed') });

/** The simulated tester plays pulls of a tool with this bias and scatter (per cent). */
export const simulatedConnectionSchema = z.object({
  kind: z.literal('simulated'),
  biasPercent: z.number().min(-50).max(50),
  scatterPercent: z.number().min(0).max(5),
  seed: z.int().min(0).max(0xffff_ffff),
  secondsPerPull: z.number().min(0).max(60),
});

/** A serial tester that sends one line a pull. `unit` is for lines that name none. */
export const serialConnectionSchema = z.object({
  kind: z.literal('serial'),
  path: z
    .string()
    .trim()
    .min(1, 'Give the port, such as /dev/ttyUSB0.')
    .max(200, 'A port has at most 200 characters.')
    .refine((path) => !/\p{Cc}/u.test(path), 'A port has no control characters.'),
  baudRate: z.number().refine((rate) => baudRates.includes(rate), {
    error: `Choose one of ${BAUD_RATES.join(', ')}.`,
  }),
  linePattern: z
    .string()
    .default(DEFAULT_LINE_PATTERN)
    .superRefine((source, context) => {
      const fault = linePatternFault(source);
      if (fault) context.addIssue({ code: 'custom', message: fault });
    }),
  unit: z.enum(TORQUE_UNITS),
});

export const testerConnectionSchema = z.discriminatedUnion('kind', [
  keyedConnectionSchema,
  simulatedConnectionSchema,
  serialConnectionSchema,
]);

export type TesterConnection = z.infer<typeof testerConnectionSchema>;
export type SimulatedConnection = z.infer<typeof simulatedConnectionSchema>;
export type SerialConnection = z.infer<typeof serialConnectionSchema>;
