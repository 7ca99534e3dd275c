import { z } from 'zod';
import { calendarDate, decimal, line, optionalDecimal } from './fields';

/** At most so many benches at one meet. */
export const MAX_BENCHES = 8;

/** Whether this is the name of a time zone of the IANA database, such as Europe/London. */
export function isTimeZone(name: string): boolean {
  // Offsets such as +01:00 are taken by some engines; they know nothing of summer time.
  if (!/^[A-Za-z_]+(\/[A-Za-z0-9_+-]+)*$/.test(name)) return false;
  try {
    new Intl.DateTimeFormat('en-GB', { timeZone: name });
    return true;
  } catch {
    return false;
  }
}

const timeZone = line('The time zone', 60).refine(
  isTimeZone,
  'This time zone is not known. Take a name such as Europe/London.',
);

const fields = {
  name: line('The meet’s name', 80),
  place: line('The place', 120),
  startsOn: calendarDate('The first day'),
  endsOn: calendarDate('The last day'),
  timeZone,
};

const siteFields = {
  latitudeDeg: optionalDecimal('The latitude', { min: -90, max: 90 }),
  heightM: optionalDecimal('The height', { min: -450, max: 9000 }),
  dayStartHour: decimal('The hour at which a day starts', { min: 0, max: 23, whole: true }).default(
    4,
  ),
};

const benches = decimal('The number of benches', { min: 1, max: MAX_BENCHES, whole: true });

interface Days {
  startsOn: string;
  endsOn: string;
}

/** Longer than any meet: a wrong year is caught. */
const MAX_DAYS = 60;

/** What is wrong with the days of a meet, in words; null when nothing is. */
export function daysFault({ startsOn, endsOn }: Days): string | null {
  if (endsOn < startsOn) return 'The last day is before the first.';
  const days = (Date.parse(endsOn) - Date.parse(startsOn)) / 86_400_000 + 1;
  return days > MAX_DAYS ? `A meet has at most ${MAX_DAYS} days. Is the year right?` : null;
}

const daysSchema = z.object({ startsOn: fields.startsOn, endsOn: fields.endsOn });

/** Said together with what is wrong elsewhere, as soon as both days are dates. */
const daysInOrder = {
  path: ['endsOn'],
  error: ({ input }: { input?: unknown }) => daysFault(input as Days) ?? undefined,
  when: ({ value }: { value: unknown }) => daysSchema.safeParse(value).success,
};
const inOrder = (days: Days): boolean => daysFault(days) === null;

/** The first meet, as the set-up asks for it. */
export const firstMeetSchema = z.object({ ...fields, benches }).refine(inOrder, daysInOrder);

export const newMeetSchema = z
  .object({ ...fields, ...siteFields, benches })
  .refine(inOrder, daysInOrder);

/** All that the form of a meet changes at once. */
export const meetDetailsSchema = z
  .object({ ...fields, ...siteFields })
  .refine(inOrder, daysInOrder);

/** A change of a meet: its details, or whether visitors may join, or both. */
export const changeMeetSchema = z.object({
  meetId: z.uuid(),
  details: meetDetailsSchema.optional(),
  joinOpen: z.boolean().optional(),
});

export type NewMeetInput = z.input<typeof newMeetSchema>;
export type MeetDetailsInput = z.input<typeof meetDetailsSchema>;
