import { z } from 'zod';
import { ROLES, type Role } from '@/lib/line/states';
import { line } from './fields';

/** What a person signs in with: lower case, so that a phone's capital does not matter. */
export const loginSchema = z
  .string({ error: 'The sign-in name is missing.' })
  .trim()
  .toLowerCase()
  .min(2, 'A sign-in name needs at least 2 characters.')
  .max(40, 'A sign-in name can have at most 40 characters.')
  .regex(/^[a-z0-9][a-z0-9._-]*$/, 'A sign-in name has letters a to z, digits, dots and hyphens.');

export const MIN_PASSWORD = 10;

/** A new password. Length is what counts; no rules about signs and digits. */
export const passwordSchema = z
  .string({ error: 'The password is missing.' })
  .min(MIN_PASSWORD, `A password needs at least ${MIN_PASSWORD} characters.`)
  .max(200, 'A password can have at most 200 characters.');

/** A password that is hashed already. The edge hashes: a command never sees the words. */
export const passwordHashSchema = z
  .string()
  .max(300)
  .regex(
    /^\$argon2id\$v=\d+\$[a-z0-9=,]+\$[A-Za-z0-9+/]+\$[A-Za-z0-9+/]+$/,
    'This is no argon2id hash.',
  );

const name = line('The name', 80);
const role = z.enum(ROLES, { error: 'Choose a role.' });

export const personSchema = z.object({ name, login: loginSchema, role });

/** The form of a new person. */
export const newPersonSchema = personSchema.extend({ password: passwordSchema });
export type NewPersonInput = z.input<typeof newPersonSchema>;

/** A change of a person; what is left out stays. */
export const changeStaffSchema = z.object({
  staffId: z.uuid(),
  name: name.optional(),
  role: role.optional(),
  active: z.boolean().optional(),
});

export const newPasswordSchema = z.object({ staffId: z.uuid(), password: passwordSchema });

interface Person {
  id: string;
  role: Role;
  active: boolean;
}

/** Does somebody remain who can manage the staff, once this person has changed? */
export function leavesAnOwner(people: readonly Person[], changed: Person): boolean {
  return people.some((person) => {
    const { role: roleThen, active } = person.id === changed.id ? changed : person;
    return roleThen === 'owner' && active;
  });
}
