import { Cell, DataTable, HeadCell, Row } from '@/components/ui/data-table';
import { dayWords, timeWords } from '@/lib/format/time';

interface AuditTableProps {
  rows: {
    sequence: number;
    at: string;
    who: string;
    what: string;
    tagCode: string | null;
    detail: string;
  }[];
  timeZone: string;
}

/** Entries of the ledger as they stand. */
export function AuditTable({ rows, timeZone }: AuditTableProps) {
  return (
    <DataTable caption="Ledger">
      <thead>
        <tr>
          <HeadCell numeric>Entry</HeadCell>
          <HeadCell>When</HeadCell>
          <HeadCell>Who</HeadCell>
          <HeadCell>What</HeadCell>
          <HeadCell>Tag</HeadCell>
          <HeadCell>More</HeadCell>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => {
          const at = new Date(row.at);
          return (
            <Row key={row.sequence}>
              <Cell numeric>{row.sequence}</Cell>
              <Cell className="whitespace-nowrap">
                {dayWords(at, timeZone)}, {timeWords(at, timeZone)}
              </Cell>
              <Cell>{row.who}</Cell>
              <Cell>{row.what}</Cell>
              <Cell className="font-code text-xl leading-none font-bold">{row.tagCode ?? ''}</Cell>
              <Cell className="text-fore-quiet">{row.detail}</Cell>
            </Row>
          );
        })}
      </tbody>
    </DataTable>
  );
}
