import { z } from 'zod';
import { line } from './fields';
import { firstMeetSchema } from './meet';
import { loginSchema, passwordHashSchema, passwordSchema } from './staff';

export const postSchema = z.object({
  name: line('The post’s name', 80),
  shortName: z
    .string({ error: 'The short name is missing.' })
    .trim()
    .toUpperCase()
    .regex(/^[A-Z]{2,6}$/, 'The short name has two to six letters, such as QP.'),
});

const owner = z.object({ name: line('Your name', 80), login: loginSchema });

/** What the command takes: the password is a hash by then, the set-up code has been checked. */
export const setUpSchema = z.object({
  post: postSchema,
  owner: owner.extend({ passwordHash: passwordHashSchema }),
  meet: firstMeetSchema,
});

/** What the form asks for. */
export const setUpFormSchema = z.object({
  setupCode: line('The set-up code', 40),
  post: postSchema,
  owner: owner.extend({ password: passwordSchema }),
  meet: firstMeetSchema,
});
export type SetUpForm = z.output<typeof setUpFormSchema>;

/** A code as it is compared: without hyphens, blanks and case. */
export const plainCode = (code: string): string => code.replace(/[\s-]/g, '').toUpperCase();
