import { asc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Reader } from '@/db/client';
import { staff } from '@/db/schema';
import type { Role } from '@/lib/line/states';

/** A person of the staff; never with the password's hash. */
export interface StaffMember {
  id: string;
  name: string;
  login: string;
  role: Role;
  active: boolean;
}

const columns = {
  id: staff.id,
  name: staff.name,
  login: staff.login,
  role: staff.role,
  active: staff.active,
};

/** Everybody of the post, by name. */
export const staffList = (reader: Reader): Promise<StaffMember[]> =>
  reader.select(columns).from(staff).orderBy(asc(staff.name));

/** The person of an id from an address, or null. */
export async function staffMember(reader: Reader, staffId: string): Promise<StaffMember | null> {
  if (!z.uuid().safeParse(staffId).success) return null;
  const [person] = await reader.select(columns).from(staff).where(eq(staff.id, staffId));
  return person ?? null;
}
