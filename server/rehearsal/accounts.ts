import { createHmac } from 'node:crypto';
import { hash } from '@node-rs/argon2';
import type { Role } from '@/lib/line/states';

export interface Account {
  name: string;
  login: string;
  role: Role;
}

/** Whom a person may sign in as. Their passwords are printed at every start, so they guard nothing. */
export const ACCOUNTS = {
  operator: {
    name: 'Perrin Oakes',
    login: 'operator',
    password: 'paddock-operator',
    role: 'operator',
  },
  lead: { name: 'Ilse Marrow', login: 'lead', password: 'paddock-lead', role: 'lead' },
  owner: { name: 'Corin Vale', login: 'owner', password: 'paddock-owner', role: 'owner' },
} as const satisfies Record<string, Account & { password: string }>;

/** The simulated operators, one for each bench. Nobody can sign in as one of them. */
export const CREW = [
  { name: 'Wren Tallis', login: 'crew-1', role: 'operator' },
  { name: 'Joss Arkle', login: 'crew-2', role: 'operator' },
] as const satisfies readonly Account[];

/**
 * The argon2id hash of a password, with a salt that follows from the post's secret: the same each
 * time, so that a story that was cut short can be told again.
 */
export function hashFor(secret: string, login: string, password: string): Promise<string> {
  const salt = createHmac('sha256', secret).update(`rehearsal salt\n${login}`).digest();
  return hash(password, { salt: salt.subarray(0, 16) });
}

/** A password that nobody knows. */
export const unknownPassword = (secret: string, login: string): string =>
  createHmac('sha256', secret).update(`rehearsal password\n${login}`).digest('base64url');
