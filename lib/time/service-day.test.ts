import { describe, expect, it } from 'vitest';
import { localYear, serviceDay } from './service-day';

// Time zone rules come from the IANA database in the runtime (ICU), not from us.
describe('serviceDay', () => {
  it('counts an hour after midnight to the day before, until the day starts', () => {
    expect(serviceDay(new Date('2026-07-05T01:30:00Z'), 'Europe/London', 4)).toBe('2026-07-04');
    expect(serviceDay(new Date('2026-07-05T03:00:00Z'), 'Europe/London', 4)).toBe('2026-07-05');
  });

  it('is the day of the meet, not of the server', () => {
    const instant = new Date('2026-07-04T23:30:00Z');
    expect(serviceDay(instant, 'Pacific/Auckland', 4)).toBe('2026-07-05');
    expect(serviceDay(instant, 'America/Los_Angeles', 4)).toBe('2026-07-04');
  });

  it('crosses the end of a year', () => {
    const instant = new Date('2027-01-01T02:00:00Z');
    expect(serviceDay(instant, 'UTC', 4)).toBe('2026-12-31');
    expect(localYear(instant, 'UTC')).toBe(2027);
    expect(localYear(instant, 'America/New_York')).toBe(2026);
  });

  it('refuses a zone that does not exist', () => {
    expect(() => serviceDay(new Date(0), 'Mars/Olympus', 4)).toThrow(RangeError);
  });
});
