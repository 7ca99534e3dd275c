'use client';

import Link from 'next/link';
import { SortedTable, type DeskColumn } from './sorted-table';

interface MeetLine {
  id: string;
  slug: string;
  name: string;
  place: string;
  startsOn: string;
  days: string;
  isOn: boolean;
  joinOpen: boolean;
  benches: number;
  tagsIssued: number;
}

const columns: DeskColumn<MeetLine>[] = [
  {
    id: 'name',
    accessorFn: ({ name }) => name,
    header: 'Meet',
    sortFn: 'alphanumeric',
    cell: ({ row: { original: meet } }) => (
      <>
        <Link
          href={`/desk/meets/${meet.id}`}
          className="font-semibold underline underline-offset-4"
        >
          {meet.name}
        </Link>
        <span className="text-fore-quiet block">{meet.place}</span>
      </>
    ),
  },
  {
    id: 'days',
    accessorFn: ({ startsOn }) => startsOn,
    header: 'Days',
    sortFn: 'alphanumeric',
    cell: ({ row: { original: meet } }) => (
      <>
        {meet.days}
        {meet.isOn && <strong className="block">On now</strong>}
      </>
    ),
  },
  {
    id: 'line',
    accessorFn: ({ joinOpen }) => (joinOpen ? 'open' : 'closed'),
    header: 'Line',
    enableSorting: false,
  },
  {
    id: 'benches',
    accessorFn: ({ benches }) => benches,
    header: 'Benches',
    enableSorting: false,
    cell: ({ row: { original: meet } }) => (
      <Link href={`/desk/benches?meet=${meet.slug}`} className="underline underline-offset-4">
        {meet.benches === 1 ? '1 bench' : `${meet.benches} benches`}
      </Link>
    ),
  },
  {
    id: 'tags',
    accessorFn: ({ tagsIssued }) => tagsIssued,
    header: 'Tags given out',
    sortFn: 'alphanumeric',
  },
];

/** The meets of the post. */
export function MeetsTable({ meets }: { meets: MeetLine[] }) {
  return <SortedTable caption="Meets" columns={columns} items={meets} />;
}
