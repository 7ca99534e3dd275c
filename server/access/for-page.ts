import { forbidden, redirect } from 'next/navigation';
import { currentStaff, type StaffPerson } from './current';
import { allows, type Permission } from './policy';

/**
 * The signed-in person, when they may see this page. Somebody else goes to the sign-in, which comes
 * back to `path`; a role that may not sees the 403 page.
 */
export async function staffForPage(permission: Permission, path: string): Promise<StaffPerson> {
  const person = await currentStaff();
  if (!person) redirect(`/sign-in?next=${encodeURIComponent(path)}`);
  if (!allows(permission, person.role)) forbidden();
  return person;
}

/** Where a role works: operators at a bench, the others at the desk. */
export const homeOf = (role: StaffPerson['role']): string =>
  role === 'operator' ? '/bench' : '/desk';
