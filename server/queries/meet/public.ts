import { asc, eq, gte } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { meets } from '@/db/schema';
import { dateWords } from '@/lib/format/time';
import { serviceDay } from '@/lib/time/service-day';

/** A meet as everybody may see it. */
export interface PublicMeet {
  id: string;
  slug: string;
  name: string;
  place: string;
  timeZone: string;
  joinOpen: boolean;
  /** '9 Oct 2026', or '9 Oct 2026 to 11 Oct 2026'. */
  days: string;
}

const COLUMNS = {
  id: meets.id,
  slug: meets.slug,
  name: meets.name,
  place: meets.place,
  timeZone: meets.timeZone,
  joinOpen: meets.joinOpen,
  startsOn: meets.startsOn,
  endsOn: meets.endsOn,
  dayStartHour: meets.dayStartHour,
};

interface MeetRow extends Omit<PublicMeet, 'days'> {
  startsOn: string;
  endsOn: string;
  dayStartHour: number;
}

function publicMeet({ startsOn, endsOn, dayStartHour: _, ...meet }: MeetRow): PublicMeet {
  const days =
    startsOn === endsOn ? dateWords(startsOn) : `${dateWords(startsOn)} to ${dateWords(endsOn)}`;
  return { ...meet, days };
}

/** The meet of a public address, or null. */
export async function meetBySlug(reader: Reader, slug: string): Promise<PublicMeet | null> {
  const [row] = await reader.select(COLUMNS).from(meets).where(eq(meets.slug, slug));
  return row ? publicMeet(row) : null;
}

const DAY_MS = 24 * 3_600_000;
const COMING_SHOWN = 3;

/**
 * The meets whose service day it is now, each in its own zone, and the next ones to come. First by
 * first day, then by name.
 */
export async function meetsOnNow(
  reader: Reader,
  now: Date,
): Promise<{ now: PublicMeet[]; coming: PublicMeet[] }> {
  // Today is another date in each meet's zone: the store leaves a margin, the rest is decided here.
  const notBefore = new Date(now.getTime() - 2 * DAY_MS).toISOString().slice(0, 10);
  const rows = await reader
    .select(COLUMNS)
    .from(meets)
    .where(gte(meets.endsOn, notBefore))
    .orderBy(asc(meets.startsOn), asc(meets.name));
  const today = (meet: MeetRow) => serviceDay(now, meet.timeZone, meet.dayStartHour);
  return {
    now: rows
      .filter((meet) => meet.startsOn <= today(meet) && today(meet) <= meet.endsOn)
      .map(publicMeet),
    coming: rows
      .filter((meet) => today(meet) < meet.startsOn)
      .slice(0, COMING_SHOWN)
      .map(publicMeet),
  };
}
