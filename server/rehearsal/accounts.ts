import { randomBytes } from 'node:crypto';
import { hash } from '@node-rs/argon2';
import { staff } from '@/db/schema';
import type { Role } from '@/lib/line/states';
import { POST_ID, STAFF_IDS } from './ids';

export interface Account {
  id: string;
  name: string;
  login: string;
  role: Role;
}

/** Whom a person may sign in as. Their passwords are printed at every start, so they guard nothing. */
export const ACCOUNTS: readonly (Account & { password: string })[] = [
  {
    id: STAFF_IDS.operator,
    name: 'Perrin Oakes',
    login: 'operator',
    password: 'paddock-operator',
    role: 'operator',
  },
  {
    id: STAFF_IDS.lead,
    name: 'Ilse Marrow',
    login: 'lead',
    password: 'paddock-lead',
    role: 'lead',
  },
  {
    id: STAFF_IDS.owner,
    name: 'Corin Vale',
    login: 'owner',
    password: 'paddock-owner',
    role: 'owner',
  },
];

/** The simulated operators, one for each bench. Nobody can sign in as one of them. */
export const CREW: readonly Account[] = [
  { id: STAFF_IDS.crew[0], name: 'Wren Tallis', login: 'crew-1', role: 'operator' },
  { id: STAFF_IDS.crew[1], name: 'Joss Arkle', login: 'crew-2', role: 'operator' },
];

/** The rows of everybody; argon2id is the package's default. */
export async function accountRows(createdAt: Date): Promise<(typeof staff.$inferInsert)[]> {
  const crew = CREW.map((member) => ({ ...member, password: randomBytes(32).toString('hex') }));
  return Promise.all(
    [...ACCOUNTS, ...crew].map(async ({ password, ...person }) => ({
      ...person,
      postId: POST_ID,
      passwordHash: await hash(password),
      createdAt,
    })),
  );
}
