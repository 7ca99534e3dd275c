import { z } from 'zod';
import { CLAIM_KINDS } from '@/lib/torque/claim';
import { isFixedTool, TOOL_CLASSES } from '@/lib/torque/tool';
import { TORQUE_UNITS } from '@/lib/torque/units';
import { CONSENTS } from './states';

const positive = (what: string) =>
  z
    .number({ error: `${what} must be a number.` })
    .positive(`${what} must be above zero.`)
    .max(100_000, `${what} is too large.`);

const line = (what: string, max: number) =>
  z
    .string()
    .trim()
    .max(max, `${what} can have at most ${max} characters.`)
    .transform((text) => (text === '' ? null : text))
    .nullable()
    .default(null);

export const claimSchema = z.object({
  of: z.enum(CLAIM_KINDS),
  cwPercent: positive('The claimed per cent').max(50, 'A claim above 50 % is no claim.'),
  ccwPercent: positive('The claimed per cent')
    .max(50, 'A claim above 50 % is no claim.')
    .nullable(),
  fromPercent: z.number().min(0).max(100).optional(),
  plusNm: z.number().min(0).optional(),
});

/** What is known of a tool: at joining from its owner, at the bench from its plate. */
export const toolSchema = z
  .object({
    toolClass: z.enum(TOOL_CLASSES, { error: 'Choose the kind of tool.' }),
    classUnsure: z.boolean().default(false),
    rangeMin: positive('The lowest value'),
    rangeMax: positive('The highest value'),
    unit: z.enum(TORQUE_UNITS, { error: 'Choose the unit.' }),
    division: positive('The division').nullable().default(null),
    nominal: positive('The preset value').nullable().default(null),
    claim: claimSchema.nullable().default(null),
    measuresCcw: z.boolean().default(false),
    drive: line('The drive size', 20),
    maker: line('The maker', 60),
    serial: line('The serial number', 60),
  })
  .superRefine((tool, context) => {
    const complain = (path: string, message: string) =>
      context.addIssue({ code: 'custom', path: [path], message });
    if (tool.rangeMin > tool.rangeMax) {
      complain('rangeMax', 'The highest value is below the lowest. Are they swapped?');
    }
    if (isFixedTool(tool.toolClass) && tool.nominal === null) {
      complain('nominal', 'A preset wrench has one value: give it.');
    }
    if (tool.nominal !== null && (tool.nominal < tool.rangeMin || tool.nominal > tool.rangeMax)) {
      complain('nominal', 'The preset value lies outside the range.');
    }
  });
export type ToolDescription = z.output<typeof toolSchema>;

export const visitorSchema = z.object({
  name: line('The name', 80),
  email: z
    .union([z.literal(''), z.email('This does not look like a mail address.').max(200)])
    .transform((text) => (text === '' ? null : text))
    .nullable()
    .default(null),
  mobile: z
    .union([
      z.literal(''),
      z
        .string()
        .trim()
        .regex(/^\+?[0-9 ()/-]{6,24}$/, 'Digits only, with the country code if you can: +44 …'),
    ])
    .transform((text) => (text === '' ? null : text))
    .nullable()
    .default(null),
});

export const MAX_WORKING_POINTS = 6;

/** Joining the line with one tool. Shared by the form, the intake and the command. */
export const joinSchema = z
  .object({
    meetId: z.uuid(),
    tool: toolSchema,
    consent: z.enum(CONSENTS, { error: 'Choose how the tool may be pulled.' }),
    workingPoints: z
      .array(positive('A working torque'))
      .max(MAX_WORKING_POINTS, `At most ${MAX_WORKING_POINTS} working torques.`)
      .nullable()
      .default(null),
    visitor: visitorSchema,
    /** The ticket of the same visitor's other tool: the new tag belongs to the same person. */
    otherTicket: z.string().max(100).nullable().default(null),
  })
  .superRefine((input, context) => {
    const complain = (message: string) =>
      context.addIssue({ code: 'custom', path: ['workingPoints'], message });
    const points = input.workingPoints ?? [];
    if (input.consent === 'working' && points.length === 0) {
      complain('Give at least one working torque, or let the tool be pulled to its maximum.');
    }
    const outside = points.find(
      (point) => point < input.tool.rangeMin || point > input.tool.rangeMax,
    );
    if (outside !== undefined) complain(`${outside} lies outside the tool’s range.`);
  });
export type JoinInput = z.input<typeof joinSchema>;

/**
 * Numbers typed in one field, such as '45, 110' or '45 110'. A comma with a space after it, a
 * semicolon or a space parts two numbers; a comma or a point inside one is its decimal mark.
 * Null when the text holds anything else, and for '45,110', which may be one number or two.
 */
export function parseNumbers(text: string): number[] | null {
  const words = text.split(/(?:,\s+|;|\s)+/).filter((word) => word !== '');
  if (words.some((word) => /^\d+,\d{3}$/.test(word))) return null;
  const numbers = words.map((word) => Number(word.replace(',', '.').replace(/[,;]$/, '')));
  return numbers.every((number) => Number.isFinite(number)) ? numbers : null;
}

/** One typed number with a point or a comma; null when the field is empty, NaN when it is no number. */
export function parseDecimal(text: string): number | null {
  const trimmed = text.trim().replace(',', '.');
  return trimmed === '' ? null : /^[+-]?\d+(\.\d+)?$/.test(trimmed) ? Number(trimmed) : Number.NaN;
}
