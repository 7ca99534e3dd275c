import { and, asc, eq, ne, or } from 'drizzle-orm';
import { benches, tags } from '@/db/schema';
import type { RandomSource } from '@/lib/signal/random';
import type { Setting } from './setting';
import type { Run, Stage } from './stage';
import type { Timing } from './timing';

/** What the simulated visitors and operators share. */
export interface Backstage {
  stage: Stage;
  run: Run;
  setting: Setting;
  random: RandomSource;
  timing: Timing;
  /** Tags of simulated visitors. A real person's tag never stays away and never withdraws. */
  own: Set<string>;
  /** Tags that have stayed away once; they come at the next call. */
  stayedAway: Set<string>;
}

export type OpenTag = typeof tags.$inferSelect;
export type Bench = typeof benches.$inferSelect;

/** One look at the meet: its open tags in line order, and its benches. */
export async function look({ stage: { db }, setting }: Backstage) {
  const meetId = setting.meet.id;
  const open: OpenTag[] = await db
    .select()
    .from(tags)
    .where(and(eq(tags.meetId, meetId), or(ne(tags.place, 'returned'), eq(tags.state, 'away'))))
    .orderBy(asc(tags.position));
  const all: Bench[] = await db
    .select()
    .from(benches)
    .where(eq(benches.meetId, meetId))
    .orderBy(asc(benches.number));
  return { open, benches: all };
}
