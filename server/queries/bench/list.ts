import { and, asc, eq, gte, inArray, lte } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, meets, staff, tags, testers } from '@/db/schema';
import type { BenchState } from '@/lib/line/states';
import { serviceDay } from '@/lib/time/service-day';

export interface BenchChoice {
  id: string;
  number: number;
  state: BenchState;
  operator: { id: string; name: string } | null;
  /** 'T-01', or null when no tester stands on it. */
  tester: string | null;
  /** The tag called to it, or whose tool lies on it. */
  tagCode: string | null;
}

export interface MeetBenches {
  id: string;
  name: string;
  place: string;
  benches: BenchChoice[];
}

const DAY_MS = 86_400_000;
const day = (instant: number): string => new Date(instant).toISOString().slice(0, 10);

/** The benches of every meet that is on now, by its own service day. */
export async function benchChoices(reader: Reader, now: Date): Promise<MeetBenches[]> {
  // Zones differ from UTC by less than a day: the exact day is settled below, zone by zone.
  const near = await reader
    .select()
    .from(meets)
    .where(
      and(
        lte(meets.startsOn, day(now.getTime() + DAY_MS)),
        gte(meets.endsOn, day(now.getTime() - 2 * DAY_MS)),
      ),
    )
    .orderBy(asc(meets.startsOn), asc(meets.name));
  const on = near.filter((meet) => {
    const today = serviceDay(now, meet.timeZone, meet.dayStartHour);
    return meet.startsOn <= today && today <= meet.endsOn;
  });
  if (on.length === 0) return [];
  const rows = await reader
    .select({
      bench: benches,
      operator: { id: staff.id, name: staff.name },
      tester: testers.name,
      tagCode: tags.code,
    })
    .from(benches)
    .leftJoin(staff, eq(staff.id, benches.operatorId))
    .leftJoin(testers, eq(testers.id, benches.testerId))
    .leftJoin(tags, and(eq(tags.benchId, benches.id), inArray(tags.place, ['visitor', 'bench'])))
    .where(
      inArray(
        benches.meetId,
        on.map(({ id }) => id),
      ),
    )
    .orderBy(asc(benches.number));
  return on.map((meet) => ({
    id: meet.id,
    name: meet.name,
    place: meet.place,
    benches: rows
      .filter(({ bench }) => bench.meetId === meet.id)
      .map(({ bench, operator, tester, tagCode }) => ({
        id: bench.id,
        number: bench.number,
        state: bench.state,
        operator,
        tester,
        tagCode,
      })),
  }));
}
