'use client';

import Link from 'next/link';
import type { Role } from '@/lib/line/states';
import { roleWords } from './role-words';
import { SortedTable, type DeskColumn } from './sorted-table';

export interface StaffLine {
  id: string;
  name: string;
  login: string;
  role: Role;
  active: boolean;
}

const columns: DeskColumn<StaffLine>[] = [
  {
    id: 'name',
    accessorFn: ({ name }) => name,
    header: 'Name',
    sortFn: 'alphanumeric',
    cell: ({ row: { original: person } }) => (
      <Link
        href={`/desk/staff/${person.id}`}
        className="font-semibold underline underline-offset-4"
      >
        {person.name}
      </Link>
    ),
  },
  { id: 'login', accessorFn: ({ login }) => login, header: 'Signs in as', sortFn: 'alphanumeric' },
  { id: 'role', accessorFn: ({ role }) => roleWords(role), header: 'Role', sortFn: 'alphanumeric' },
  {
    id: 'active',
    accessorFn: ({ active }) => (active ? 'may sign in' : 'switched off'),
    header: 'Account',
    sortFn: 'alphanumeric',
  },
];

/** Everybody who can sign in, or could once. */
export function StaffTable({ people }: { people: StaffLine[] }) {
  return <SortedTable caption="Staff" columns={columns} items={people} />;
}
