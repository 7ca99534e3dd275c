/** '14:51' in the given IANA zone. */
export const timeWords = (instant: Date, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', {
    timeZone,
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).format(instant);

/** '9 Oct 2026' for an instant in the given zone. */
export const dayWords = (instant: Date, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', {
    timeZone,
    day: 'numeric',
    month: 'short',
    year: 'numeric',
  }).format(instant);

/** '14 Mar 2027' for a calendar date (YYYY-MM-DD). */
export const dateWords = (date: string): string => dayWords(new Date(`${date}T12:00:00Z`), 'UTC');
