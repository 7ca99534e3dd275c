import type { Reader } from '@/db/client';
import { meetList, type MeetSummary } from './list';

/** Every meet, and the one that a page is about: the one asked for, else the one that is on. */
export async function chosenMeet(
  reader: Reader,
  now: Date,
  asked: string | string[] | undefined,
): Promise<{ meets: MeetSummary[]; chosen: MeetSummary | null }> {
  const meets = await meetList(reader, now);
  return { meets, chosen: meets.find(({ id }) => id === asked) ?? meets[0] ?? null };
}
