import { z } from 'zod';
import { toolSchema } from '@/lib/line/join';

const words = (what: string, max: number) =>
  z.string().trim().max(max, `${what} can have at most ${max} characters.`);

const confirmed = (message: string) => z.literal(true, { error: message });

export const asFoundSchema = z.object({
  settingFound: z
    .number({ error: 'The setting found must be a number.' })
    .min(0, 'A setting is not below zero.')
    .nullable()
    .default(null),
  damage: words('The damage', 500).default(''),
  battery: z
    .enum(['good', 'low', 'none', 'not-fitted'], { error: 'Look at the battery.' })
    .default('not-fitted'),
  zeroShown: z.boolean({ error: 'Does it show zero without load?' }).nullable().default(null),
  scale: words('The scale', 60).default(''),
  head: words('The head', 60).default(''),
  testerMode: z.enum(['first-peak', 'live'], { error: 'Confirm the tester’s own mode.' }),
  temperatureC: z
    .number({ error: 'The temperature must be a number.' })
    .min(-40, 'Is it really that cold?')
    .max(60, 'Is it really that hot?')
    .nullable()
    .default(null),
});

export const CHECK_SCHEMES = ['standard', 'working', 'short'] as const;

/** What the operator settles with the visitor and the plate before the first pull. */
export const startCheckSchema = z.object({
  benchId: z.uuid(),
  tagId: z.uuid(),
  tool: toolSchema,
  asFound: asFoundSchema,
  /** `standard` is the sequence that the lead has set for the meet. */
  scheme: z.enum(CHECK_SCHEMES),
  workingPoints: z
    .array(z.number().positive('A working torque must be above zero.'))
    .max(6)
    .nullable()
    .default(null),
  ownerConfirmed: confirmed('Confirm with the visitor whose tool it is.'),
  cautionsSeen: confirmed('Read the cautions first.'),
  testerModeConfirmed: confirmed('Look at the tester: is it in the mode that this tool needs?'),
});
export type StartCheckInput = z.input<typeof startCheckSchema>;
