'use client';

import {
  createSortedRowModel,
  rowSortingFeature,
  sortFn_alphanumeric,
  tableFeatures,
  useTable,
  type ColumnDef,
  type RowData,
} from '@tanstack/react-table';
import { Cell, DataTable, HeadCell, Row } from '@/components/ui/data-table';

export const tableFeaturesOfDesk = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric },
});

export type DeskColumn<Item extends RowData> = ColumnDef<typeof tableFeaturesOfDesk, Item>;

interface SortedTableProps<Item extends RowData> {
  caption: string;
  /** Kept outside the component, so that the table is not built anew at each render. */
  columns: DeskColumn<Item>[];
  items: Item[];
}

const SORT_WORDS = { asc: 'ascending', desc: 'descending' } as const;

/** A list of the desk; a heading that can be pressed sorts by its column. */
export function SortedTable<Item extends RowData>({
  caption,
  columns,
  items,
}: SortedTableProps<Item>) {
  const table = useTable({ features: tableFeaturesOfDesk, columns, data: items });
  return (
    <DataTable caption={caption}>
      <thead>
        {table.getHeaderGroups().map((group) => (
          <tr key={group.id}>
            {group.headers.map((header) => {
              const sorted = header.column.getIsSorted();
              return (
                <HeadCell key={header.id} aria-sort={sorted ? SORT_WORDS[sorted] : undefined}>
                  {header.column.getCanSort() ? (
                    <button
                      type="button"
                      onClick={header.column.getToggleSortingHandler()}
                      className="min-h-10 text-left font-semibold underline decoration-dotted underline-offset-4"
                    >
                      <table.FlexRender header={header} />
                      <span aria-hidden="true">
                        {sorted ? (sorted === 'asc' ? ' ↑' : ' ↓') : ''}
                      </span>
                    </button>
                  ) : (
                    <span className="flex min-h-10 items-center">
                      <table.FlexRender header={header} />
                    </span>
                  )}
                </HeadCell>
              );
            })}
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
