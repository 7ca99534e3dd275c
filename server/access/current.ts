import { cookies } from 'next/headers';
import { getIronSession } from 'iron-session';
import { eq } from 'drizzle-orm';
import { staff } from '@/db/schema';
import type { Role } from '@/lib/line/states';
import { Problem } from '@/server/problem';
import { getRuntime } from '@/server/runtime';
import type { Actor } from './actor';
import { allows, type Permission } from './policy';
import { sessionOptions, type SessionData } from './session';

/** The cookie session of this request. Only for Next's routes, pages and actions. */
export async function staffSession() {
  // Asked first: it tells the build that this page is made for each request.
  const jar = await cookies();
  const { secret, origin } = getRuntime();
  return getIronSession<SessionData>(jar, sessionOptions(secret, origin));
}

/** The actor that the cookie speaks for: staff, or the public. Commands check what it may do. */
export async function currentActor(): Promise<Actor> {
  const session = await staffSession();
  return session.staffId
    ? { kind: 'staff', staffId: session.staffId, sessionVersion: session.sessionVersion ?? 0 }
    : { kind: 'public' };
}

export interface StaffPerson {
  id: string;
  name: string;
  login: string;
  role: Role;
}

/** The signed-in person as the database has them now, or null. */
export async function currentStaff(): Promise<StaffPerson | null> {
  const actor = await currentActor();
  if (actor.kind !== 'staff') return null;
  const [person] = await getRuntime()
    .store.db.select()
    .from(staff)
    .where(eq(staff.id, actor.staffId));
  if (!person?.active || person.sessionVersion !== actor.sessionVersion) return null;
  return { id: person.id, name: person.name, login: person.login, role: person.role };
}

/**
 * The signed-in person, when they may do this.
 * @throws Problem `sign-in` or `forbidden`.
 */
export async function requireStaff(permission: Permission): Promise<StaffPerson> {
  const person = await currentStaff();
  if (!person) throw new Problem('sign-in', 'Sign in to see this.');
  if (!allows(permission, person.role)) {
    throw new Problem('forbidden', 'Your role cannot see this. Ask a lead.');
  }
  return person;
}
