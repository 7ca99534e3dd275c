import { and, asc, eq, gt, lte } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, tags } from '@/db/schema';
import type { LiveEvent } from '@/server/live/events';
import { currentRevision } from '@/server/queries/revision';

/** How often the clock is looked at. A hold is set in minutes. */
const EVERY_MS = 5000;

interface HoldsOptions {
  db: Reader;
  clock: () => Date;
  publish: (events: LiveEvent[], revision: number) => void;
  onError: (error: unknown) => void;
}

/** What changed on screens because holds ran out after `since` and up to `now`. */
export async function endedHolds(db: Reader, since: Date, now: Date): Promise<LiveEvent[]> {
  const ended = await db
    .select({ id: tags.id, meetId: tags.meetId })
    .from(tags)
    .where(and(eq(tags.state, 'waiting'), gt(tags.heldUntil, since), lte(tags.heldUntil, now)));
  const events: LiveEvent[] = ended.map(({ id }) => ({ kind: 'tag', tagId: id }));
  for (const meetId of new Set(ended.map((tag) => tag.meetId))) {
    events.push({ kind: 'line', meetId });
    const at = await db
      .select({ id: benches.id })
      .from(benches)
      .where(eq(benches.meetId, meetId))
      .orderBy(asc(benches.number));
    events.push(...at.map(({ id }) => ({ kind: 'bench' as const, benchId: id })));
  }
  return events;
}

/** Nobody acts when a hold runs out, so the clock does: every screen is told. Writes nothing. */
export function watchHolds({ db, clock, publish, onError }: HoldsOptions): { stop(): void } {
  let since = clock();
  let busy = false;
  const tick = async (): Promise<void> => {
    const now = clock();
    const events = await endedHolds(db, since, now);
    since = now;
    if (events.length > 0) publish(events, await currentRevision(db));
  };
  const timer = setInterval(() => {
    if (busy) return;
    busy = true;
    tick()
      .catch(onError)
      .finally(() => (busy = false));
  }, EVERY_MS);
  timer.unref();
  return { stop: () => clearInterval(timer) };
}
