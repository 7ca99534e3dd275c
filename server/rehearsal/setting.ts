import { asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { benches, meets, staff } from '@/db/schema';
import type { Actor } from '@/server/access/actor';
import { ACCOUNTS, CREW } from './accounts';
import { MEET_SLUG } from './place';

/** Where the rehearsal plays, and who is on the staff of it. */
export interface Setting {
  meet: typeof meets.$inferSelect;
  benches: { id: string; number: number; testerId: string | null }[];
  lead: Actor;
  owner: Actor;
  /** One for each bench, in order. */
  crew: Actor[];
}

/** @throws Error when the made-up meet is not there, or not whole. */
export async function settingOf(db: Reader): Promise<Setting> {
  const [meet] = await db.select().from(meets).where(eq(meets.slug, MEET_SLUG));
  if (!meet) throw new Error(`There is no meet '${MEET_SLUG}' to rehearse.`);
  const people = await db
    .select({ id: staff.id, login: staff.login, sessionVersion: staff.sessionVersion })
    .from(staff);
  const actor = (login: string): Actor => {
    const person = people.find((one) => one.login === login);
    if (!person) throw new Error(`The rehearsal has lost its account '${login}'.`);
    return { kind: 'staff', staffId: person.id, sessionVersion: person.sessionVersion };
  };
  return {
    meet,
    benches: await db
      .select({ id: benches.id, number: benches.number, testerId: benches.testerId })
      .from(benches)
      .where(eq(benches.meetId, meet.id))
      .orderBy(asc(benches.number)),
    lead: actor(ACCOUNTS.lead.login),
    owner: actor(ACCOUNTS.owner.login),
    crew: CREW.map(({ login }) => actor(login)),
  };
}
