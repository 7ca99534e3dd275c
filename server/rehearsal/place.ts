import type { meets } from '@/db/schema';
import { slugOf } from '@/lib/desk/slug';
import { serviceDay } from '@/lib/time/service-day';
import { DEFAULT_PLAN_SETTINGS } from '@/lib/torque/settings';
import { MEET_ID, POST_ID } from './ids';

export const POST = { name: 'Hollin Bench', shortName: 'HB' };

const NAME = 'Quillmoor Autumn Meet';
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

/** The first and last day of a meet that is on now: today and tomorrow. */
export function daysOf(now: Date, startHour = dayStartHour(now)) {
  return {
    startsOn: serviceDay(now, TIME_ZONE, startHour),
    endsOn: serviceDay(new Date(now.getTime() + MS_A_DAY), TIME_ZONE, startHour),
  };
}

export const meetRow = (now: Date, createdAt: Date): typeof meets.$inferInsert => ({
  id: MEET_ID,
  postId: POST_ID,
  slug: slugOf(NAME),
  name: NAME,
  place: 'Quillmoor paddock',
  ...daysOf(now),
  timeZone: TIME_ZONE,
  dayStartHour: dayStartHour(now),
  latitudeDeg: 54.6,
  heightM: 212,
  planSettings: DEFAULT_PLAN_SETTINGS,
  createdAt,
});
