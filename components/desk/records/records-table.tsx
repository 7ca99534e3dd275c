'use client';

import { useMemo } from 'react';
import { createColumnHelper, tableFeatures, useTable } from '@tanstack/react-table';
import { Cell, DataTable, HeadCell, Row } from '@/components/ui/data-table';
import { VerdictMark } from '@/components/verdict/verdict-mark';
import { dayWords, timeWords } from '@/lib/format/time';
import type { Verdict } from '@/lib/torque/verdict';

export interface RecordLine {
  id: string;
  number: string;
  tagCode: string;
  tool: string;
  verdict: Verdict;
  /** ISO 8601 in UTC. */
  signedAt: string;
  path: string;
}

const features = tableFeatures({});
const helper = createColumnHelper<typeof features, RecordLine>();

const columnsFor = (timeZone: string) =>
  helper.columns([
    helper.accessor('number', {
      header: 'Number',
      cell: ({ getValue }) => (
        <span className="font-reading whitespace-nowrap">{getValue<string>()}</span>
      ),
    }),
    helper.accessor('tagCode', {
      header: 'Tag',
      cell: ({ getValue }) => (
        <span className="font-code text-2xl leading-none font-bold">{getValue<string>()}</span>
      ),
    }),
    helper.accessor('tool', { header: 'Tool' }),
    helper.accessor('verdict', {
      header: 'Verdict',
      cell: ({ getValue }) => <VerdictMark verdict={getValue<Verdict>()} size="small" />,
    }),
    helper.accessor('signedAt', {
      header: 'Signed',
      cell: ({ getValue }) => {
        const at = new Date(getValue<string>());
        return `${dayWords(at, timeZone)}, ${timeWords(at, timeZone)}`;
      },
    }),
    helper.display({
      id: 'link',
      header: 'Result',
      cell: ({ row }) => (
        <a href={row.original.path} className="font-semibold underline underline-offset-4">
          Open<span className="sr-only"> the result of {row.original.number}</span>
        </a>
      ),
    }),
  ]);

/** The signed records of a meet, the newest first. */
export function RecordsTable({ rows, timeZone }: { rows: RecordLine[]; timeZone: string }) {
  const columns = useMemo(() => columnsFor(timeZone), [timeZone]);
  const table = useTable({
    features,
    columns,
    data: rows,
    getRowId: (row) => row.id,
  });
  return (
    <DataTable caption="Records">
      <thead>
        {table.getHeaderGroups().map((group) => (
          <tr key={group.id}>
            {group.headers.map((header) => (
              <HeadCell key={header.id}>
                <table.FlexRender header={header} />
              </HeadCell>
            ))}
          </tr>
        ))}
      </thead>
      <tbody>
        {table.getRowModel().rows.map((row) => (
          <Row key={row.id}>
            {row.getAllCells().map((cell) => (
              <Cell key={cell.id}>
                <table.FlexRender cell={cell} />
              </Cell>
            ))}
          </Row>
        ))}
      </tbody>
    </DataTable>
  );
}
