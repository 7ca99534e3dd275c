import { forbidden, redirect } from 'next/navigation';
import { currentStaff, type StaffPerson } from '@/server/access/current';
import { allows, type Permission } from '@/server/access/policy';
import { meetList, type MeetSummary } from '@/server/queries/meets/list';
import { getRuntime } from '@/server/runtime';

/** The signed-in person, who may see the page at `path`; others are sent away. */
export async function enterDesk(
  path: string,
  permission: Permission = 'read.desk',
): Promise<StaffPerson> {
  const person = await currentStaff();
  if (!person) redirect(`/sign-in?next=${encodeURIComponent(path)}`);
  if (!allows(permission, person.role)) forbidden();
  return person;
}

/** Every meet, and the one that a desk page is about: the asked one, else the current one. */
export async function chooseMeet(
  asked: string | string[] | undefined,
): Promise<{ meets: MeetSummary[]; meet: MeetSummary | null }> {
  const { store, clock } = getRuntime();
  const meets = await meetList(store.db, clock());
  const meet = meets.find((one) => one.slug === asked) ?? meets[0] ?? null;
  return { meets, meet };
}
