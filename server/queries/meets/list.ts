import { count, desc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, meets } from '@/db/schema';
import { dateWords } from '@/lib/format/time';
import { serviceDay } from '@/lib/time/service-day';

/** A meet as the desk lists it. */
export interface MeetSummary {
  id: string;
  slug: string;
  name: string;
  place: string;
  startsOn: string;
  /** '12 Jun 2026 to 14 Jun 2026' */
  days: string;
  isOn: boolean;
  joinOpen: boolean;
  benches: number;
  tagsIssued: number;
}

type MeetDays = Pick<
  typeof meets.$inferSelect,
  'startsOn' | 'endsOn' | 'timeZone' | 'dayStartHour'
>;

const isOn = (meet: MeetDays, now: Date): boolean => {
  const today = serviceDay(now, meet.timeZone, meet.dayStartHour);
  return meet.startsOn <= today && today <= meet.endsOn;
};

/** Every meet of the post: those that are on, then the newest first. */
export async function meetList(reader: Reader, now: Date): Promise<MeetSummary[]> {
  const rows = await reader
    .select()
    .from(meets)
    .orderBy(desc(meets.startsOn), desc(meets.createdAt));
  const counts = await reader
    .select({ meetId: benches.meetId, benches: count() })
    .from(benches)
    .groupBy(benches.meetId);
  const benchCount = new Map(counts.map((row) => [row.meetId, row.benches]));
  return rows
    .map((meet) => ({
      id: meet.id,
      slug: meet.slug,
      name: meet.name,
      place: meet.place,
      startsOn: meet.startsOn,
      days:
        meet.startsOn === meet.endsOn
          ? dateWords(meet.startsOn)
          : `${dateWords(meet.startsOn)} to ${dateWords(meet.endsOn)}`,
      isOn: isOn(meet, now),
      joinOpen: meet.joinOpen,
      benches: benchCount.get(meet.id) ?? 0,
      tagsIssued: meet.tagsIssued,
    }))
    .sort((one, other) => Number(other.isOn) - Number(one.isOn));
}

/** The meet that is meant when none is named: the one that is on, else the newest; null without any. */
export async function currentMeet(
  reader: Reader,
  now: Date,
): Promise<typeof meets.$inferSelect | null> {
  const [first] = await meetList(reader, now);
  return first ? meetById(reader, first.id) : null;
}

export async function meetById(
  reader: Reader,
  meetId: string,
): Promise<typeof meets.$inferSelect | null> {
  const [meet] = await reader.select().from(meets).where(eq(meets.id, meetId));
  return meet ?? null;
}
