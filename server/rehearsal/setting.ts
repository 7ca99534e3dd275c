import { asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, meets, staff } from '@/db/schema';
import type { Actor } from '@/server/access/actor';
import { MEET_ID, STAFF_IDS } from './ids';

/** Where the rehearsal plays, and who is on the staff of it. */
export interface Setting {
  meet: typeof meets.$inferSelect;
  benches: { id: string; number: number; testerId: string | null }[];
  lead: Actor;
  /** One for each bench, in order. */
  crew: Actor[];
}

/** @throws Error when the made-up meet is not there, or not whole. */
export async function settingOf(db: Reader): Promise<Setting> {
  const [meet] = await db.select().from(meets).where(eq(meets.id, MEET_ID));
  if (!meet) throw new Error('The made-up meet of the rehearsal is not there.');
  const people = await db
    .select({ id: staff.id, sessionVersion: staff.sessionVersion })
    .from(staff);
  const actor = (staffId: string): Actor => {
    const person = people.find(({ id }) => id === staffId);
    if (!person) throw new Error('The rehearsal has lost one of its accounts.');
    return { kind: 'staff', staffId, sessionVersion: person.sessionVersion };
  };
  return {
    meet,
    benches: await db
      .select({ id: benches.id, number: benches.number, testerId: benches.testerId })
      .from(benches)
      .where(eq(benches.meetId, meet.id))
      .orderBy(asc(benches.number)),
    lead: actor(STAFF_IDS.lead),
    crew: STAFF_IDS.crew.map(actor),
  };
}
