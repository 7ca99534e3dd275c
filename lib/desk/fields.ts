import { z } from 'zod';
import { parseDecimal } from '@/lib/line/join';

/** A line of text that must be there. `What` begins the sentence: 'The name'. */
export const line = (what: string, max: number) =>
  z
    .string({ error: `${what} is missing.` })
    .trim()
    .min(1, `${what} is missing.`)
    .max(max, `${what} can have at most ${max} characters.`)
    .refine((text) => !/\p{Cc}/u.test(text), `${what} has characters that cannot be printed.`);

/** A text that may be left out; blank counts as left out. Line breaks are kept. */
export const optionalText = (what: string, max: number) =>
  z
    .string()
    .trim()
    .max(max, `${what} can have at most ${max} characters.`)
    .transform((text) => (text === '' ? null : text))
    .nullable()
    .default(null);

interface Bounds {
  /** Smallest value allowed. */
  min?: number;
  max?: number;
  /** Only values greater than this one. */
  above?: number;
  whole?: boolean;
}

function boundsFault(
  value: number,
  what: string,
  { min, max, above, whole }: Bounds,
): string | null {
  if (!Number.isFinite(value)) return `${what} must be a number.`;
  if (whole && !Number.isInteger(value)) return `${what} must be a whole number.`;
  if (above !== undefined && value <= above) {
    return `${what} must be above ${above === 0 ? 'zero' : above}.`;
  }
  if (min !== undefined && value < min) {
    return `${what} must not be below ${min === 0 ? 'zero' : min}.`;
  }
  if (max !== undefined && value > max) return `${what} must not be above ${max}.`;
  return null;
}

const typed = z.union([z.string(), z.number()]);
const numberOf = (value: string | number): number | null =>
  typeof value === 'number' ? value : parseDecimal(value);

/** A number, as a number or as somebody types it ('12,5'). */
export const decimal = (what: string, bounds: Bounds = {}) =>
  z
    .union([z.string(), z.number()], { error: `${what} is missing.` })
    .transform((value, context) => {
      const number = numberOf(value);
      const fault = number === null ? `${what} is missing.` : boundsFault(number, what, bounds);
      if (number !== null && fault === null) return number;
      context.addIssue({ code: 'custom', message: fault ?? `${what} is missing.` });
      return z.NEVER;
    });

/** The same, for a field that may stay empty: null then. */
export const optionalDecimal = (what: string, bounds: Bounds = {}) =>
  typed
    .nullable()
    .default(null)
    .transform((value, context) => {
      const number = value === null ? null : numberOf(value);
      const fault = number === null ? null : boundsFault(number, what, bounds);
      if (fault === null) return number;
      context.addIssue({ code: 'custom', message: fault });
      return z.NEVER;
    });

/** A calendar date, YYYY-MM-DD, between 2000 and 2100. */
export const calendarDate = (what: string) =>
  z.iso
    .date({ error: `${what} is missing or is no date.` })
    .refine((date) => date >= '2000-01-01' && date <= '2100-12-31', `${what} lies too far away.`);
