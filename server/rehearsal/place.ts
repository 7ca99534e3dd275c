import { slugOf } from '@/lib/desk/slug';
import { serviceDay } from '@/lib/time/service-day';

export const POST = { name: 'Hollin Bench', shortName: 'HB' };

const NAME = 'Quillmoor Autumn Meet';
export const MEET_SLUG = slugOf(NAME);
const TIME_ZONE = 'Europe/London';
const MS_A_DAY = 86_400_000;

/**
 * The local hour at which the meet's day begins: one that lies at least three hours back, so that
 * this morning's proofs and checks are of today at whatever hour the rehearsal is started.
 */
export function dayStartHour(now: Date): number {
  const hour = Number(
    new Intl.DateTimeFormat('en-GB', {
      timeZone: TIME_ZONE,
      hour: '2-digit',
      hourCycle: 'h23',
    }).format(now),
  );
  return hour >= 4 && hour < 9 ? 0 : 4;
}

/** The meet as it stands on its first form: today and tomorrow. */
export function meetDetails(now: Date) {
  const startHour = dayStartHour(now);
  return {
    name: NAME,
    place: 'Quillmoor paddock',
    startsOn: serviceDay(now, TIME_ZONE, startHour),
    endsOn: serviceDay(new Date(now.getTime() + MS_A_DAY), TIME_ZONE, startHour),
    timeZone: TIME_ZONE,
  };
}

/** What the first form of a meet does not ask for. */
export const siteDetails = (now: Date) => ({
  latitudeDeg: 54.6,
  heightM: 212,
  dayStartHour: dayStartHour(now),
});
