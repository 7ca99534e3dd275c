'use client';

import Link from 'next/link';
import { SortedTable, type DeskColumn } from './sorted-table';

interface TesterLine {
  id: string;
  name: string;
  model: string;
  serial: string;
  range: string;
  maxNm: number;
  bench: string | null;
  certificate: string;
  proof: string;
  barred: string[];
}

const columns: DeskColumn<TesterLine>[] = [
  {
    id: 'name',
    accessorFn: ({ name }) => name,
    header: 'Tester',
    sortFn: 'alphanumeric',
    cell: ({ row: { original: tester } }) => (
      <>
        <Link
          href={`/desk/testers/${tester.id}`}
          className="font-semibold underline underline-offset-4"
        >
          {tester.name}
        </Link>
        <span className="text-fore-quiet block">
          {tester.model}, {tester.serial}
        </span>
      </>
    ),
  },
  {
    id: 'range',
    accessorFn: ({ maxNm }) => maxNm,
    header: 'Range',
    sortFn: 'alphanumeric',
    cell: ({ row: { original: tester } }) => (
      <span className="whitespace-nowrap">{tester.range}</span>
    ),
  },
  {
    id: 'bench',
    accessorFn: ({ bench }) => bench ?? 'on no bench',
    header: 'Stands on',
    sortFn: 'alphanumeric',
  },
  {
    id: 'rests',
    accessorFn: ({ certificate }) => certificate,
    header: 'Rests on',
    enableSorting: false,
    cell: ({ row: { original: tester } }) => (
      <>
        <span className="block">{tester.certificate}</span>
        <span className="block">{tester.proof}</span>
      </>
    ),
  },
  {
    id: 'today',
    accessorFn: ({ barred }) => barred.length,
    header: 'Today',
    sortFn: 'alphanumeric',
    cell: ({ row: { original: tester } }) =>
      tester.barred.length === 0 ? (
        'may judge'
      ) : (
        <>
          <strong className="block">judges nothing:</strong>
          {tester.barred.join('; ')}
        </>
      ),
  },
];

/** The testers of the post, and what each rests on today. */
export function TestersTable({ testers }: { testers: TesterLine[] }) {
  return <SortedTable caption="Testers" columns={columns} items={testers} />;
}
