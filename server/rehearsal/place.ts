import { benches, meets, posts } from '@/db/schema';
import type { Database } from '@/db/client';
import { serviceDay } from '@/lib/time/service-day';
import { DEFAULT_PLAN_SETTINGS } from '@/lib/torque/settings';
import { BENCH_IDS, MEET_ID, POST_ID, TESTER_IDS } from './ids';

export const MEET_SLUG = 'quillmoor';
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

export async function addPost(db: Database, createdAt: Date): Promise<void> {
  await db
    .insert(posts)
    .values({ id: POST_ID, name: 'Hollin Bench', shortName: 'HB', createdAt })
    .onConflictDoNothing();
}

/** A meet of today and tomorrow with two benches, a tester on each. */
export async function addMeet(db: Database, now: Date, createdAt: Date): Promise<void> {
  const startHour = dayStartHour(now);
  await db
    .insert(meets)
    .values({
      id: MEET_ID,
      postId: POST_ID,
      slug: MEET_SLUG,
      name: 'Quillmoor Autumn Meet',
      place: 'Quillmoor paddock',
      startsOn: serviceDay(now, TIME_ZONE, startHour),
      endsOn: serviceDay(new Date(now.getTime() + MS_A_DAY), TIME_ZONE, startHour),
      timeZone: TIME_ZONE,
      dayStartHour: startHour,
      latitudeDeg: 54.6,
      heightM: 212,
      planSettings: DEFAULT_PLAN_SETTINGS,
      createdAt,
    })
    .onConflictDoNothing();
  for (const [index, id] of BENCH_IDS.entries()) {
    await db
      .insert(benches)
      .values({ id, meetId: MEET_ID, number: index + 1, testerId: TESTER_IDS[index] })
      .onConflictDoNothing();
  }
}
