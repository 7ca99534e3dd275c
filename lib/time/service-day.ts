// Making a formatter takes some 0.2 ms, and a running check asks for its day at every pull.
const formatters = new Map<string, Intl.DateTimeFormat>();

function formatterOf(timeZone: string): Intl.DateTimeFormat {
  const known = formatters.get(timeZone);
  if (known) return known;
  const formatter = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
  });
  formatters.set(timeZone, formatter);
  return formatter;
}

const parts = (instant: Date, timeZone: string): Record<string, string> =>
  Object.fromEntries(
    formatterOf(timeZone)
      .formatToParts(instant)
      .map((part) => [part.type, part.value]),
  );

/**
 * The service day that `instant` belongs to, as YYYY-MM-DD in the meet's own zone. A day starts at
 * `startHour` (0 to 23), so that a late evening still counts to the day it began on.
 * @throws RangeError for an unknown IANA time zone.
 */
export function serviceDay(instant: Date, timeZone: string, startHour: number): string {
  const local = parts(instant, timeZone);
  const day = new Date(Date.UTC(Number(local.year), Number(local.month) - 1, Number(local.day)));
  if (Number(local.hour) < startHour) day.setUTCDate(day.getUTCDate() - 1);
  return day.toISOString().slice(0, 10);
}

/** The calendar year of `instant` in the meet's own zone, as in a record's number. */
export function localYear(instant: Date, timeZone: string): number {
  return Number(parts(instant, timeZone).year);
}
