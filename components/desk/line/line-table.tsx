'use client';

import {
  columnFilteringFeature,
  createColumnHelper,
  createFilteredRowModel,
  createSortedRowModel,
  filterFn_includesString,
  globalFilteringFeature,
  rowSortingFeature,
  sortFn_alphanumeric,
  tableFeatures,
  useTable,
} from '@tanstack/react-table';
import { Cell, DataTable, HeadCell, Row } from '@/components/ui/data-table';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { timeWords } from '@/lib/format/time';
import { stateWords } from '@/lib/line/machine';
import { TAG_STATES } from '@/lib/line/states';
import type { LineRow } from './rows';

const features = tableFeatures({
  columnFilteringFeature,
  globalFilteringFeature,
  filteredRowModel: createFilteredRowModel(),
  filterFns: { includesString: filterFn_includesString },
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric },
});
const helper = createColumnHelper<typeof features, LineRow>();

/** The columns whose text the one search field looks through. */
const SEARCHED = new Set(['code', 'tool', 'visitor', 'where']);

/** Columns of numbers and times: their heads stand to the right, as they do. */
const NUMERIC = new Set(['place', 'held', 'joined']);

const columns = helper.columns([
  helper.accessor((row) => row.place ?? undefined, {
    id: 'place',
    header: 'Place',
    sortUndefined: 'last',
  }),
  helper.accessor((row) => row.tag.code, { id: 'code', header: 'Code' }),
  helper.accessor((row) => `${row.tag.tool} ${row.tag.plate}`, { id: 'tool', header: 'Tool' }),
  helper.accessor((row) => row.tag.visitorName ?? '', { id: 'visitor', header: 'Visitor' }),
  helper.accessor((row) => row.tag.state, {
    id: 'state',
    header: 'State',
    filterFn: (row, _column, value) => row.original.tag.state === value,
  }),
  helper.accessor((row) => row.where, { id: 'where', header: 'Tool is' }),
  helper.accessor((row) => (row.isHeld ? (row.tag.heldUntil ?? '') : ''), {
    id: 'held',
    header: 'Held until',
  }),
  helper.accessor((row) => row.tag.joinedAt, {
    id: 'joined',
    header: 'Joined',
  }),
]);

interface LineTableProps {
  rows: LineRow[];
  timeZone: string;
  selectedId: string | null;
  onSelect: (tagId: string) => void;
}

/** The button in a tag's row, to which the focus goes back when its sheet closes. */
export const rowButtonId = (tagId: string): string => `tag-${tagId}`;

/** Every open tag of the meet, to be filtered, sorted and picked. */
export function LineTable({ rows, timeZone, selectedId, onSelect }: LineTableProps) {
  const table = useTable({
    features,
    columns,
    data: rows,
    getRowId: (row) => row.tag.id,
    globalFilterFn: 'includesString',
    getColumnCanGlobalFilter: (column) => SEARCHED.has(column.id),
  });
  const shown = table.getRowModel().rows;
  const states = TAG_STATES.filter((state) => rows.some((row) => row.tag.state === state));
  return (
    <div className="flex min-w-0 flex-col gap-3">
      <div className="flex flex-wrap items-end gap-x-4 gap-y-2">
        <TextInput
          label="Find"
          placeholder="Code, tool, name or peg"
          fieldClassName="w-72 max-w-full"
          onChange={(event) => table.setGlobalFilter(event.target.value)}
        />
        <Select
          label="State"
          placeholder="All"
          fieldClassName="w-52"
          options={states.map((state) => ({ value: state, label: stateWords(state) }))}
          onChange={(event) =>
            table.getColumn('state')?.setFilterValue(event.target.value || undefined)
          }
        />
        <p role="status" className="text-fore-quiet pb-3">
          {shown.length === rows.length
            ? `${rows.length} tags`
            : `${shown.length} of ${rows.length} tags`}
        </p>
      </div>
      <DataTable caption="Open tags of this meet">
        <thead>
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id}>
              {group.headers.map((header) => {
                const sorted = header.column.getIsSorted();
                return (
                  <HeadCell
                    key={header.id}
                    numeric={NUMERIC.has(header.column.id)}
                    aria-sort={
                      sorted === false ? undefined : sorted === 'asc' ? 'ascending' : 'descending'
                    }
                  >
                    <button
                      type="button"
                      onClick={header.column.getToggleSortingHandler()}
                      className="inline-flex min-h-8 items-center gap-1 font-semibold whitespace-nowrap"
                    >
                      <table.FlexRender header={header} />
                      <span aria-hidden="true">
                        {sorted === false ? '' : sorted === 'asc' ? '↑' : '↓'}
                      </span>
                    </button>
                  </HeadCell>
                );
              })}
            </tr>
          ))}
        </thead>
        <tbody>
          {shown.map(({ original: row }) => (
            <TagRow
              key={row.tag.id}
              row={row}
              timeZone={timeZone}
              isSelected={row.tag.id === selectedId}
              onSelect={onSelect}
            />
          ))}
        </tbody>
      </DataTable>
      {shown.length === 0 && (
        <p className="text-fore-quiet">
          {rows.length === 0 ? 'No open tag at this meet.' : 'No tag fits this filter.'}
        </p>
      )}
    </div>
  );
}

interface TagRowProps {
  row: LineRow;
  timeZone: string;
  isSelected: boolean;
  onSelect: (tagId: string) => void;
}

function TagRow({ row, timeZone, isSelected, onSelect }: TagRowProps) {
  const { tag } = row;
  const time = (at: string) => timeWords(new Date(at), timeZone);
  return (
    <Row current={isSelected}>
      <Cell numeric>{row.place ?? ''}</Cell>
      <Cell>
        <button
          type="button"
          id={rowButtonId(tag.id)}
          aria-expanded={isSelected}
          onClick={() => onSelect(tag.id)}
          className="font-code ground-manila -my-1 min-h-11 rounded-md px-3 text-2xl leading-none font-bold underline decoration-2 underline-offset-4"
        >
          {tag.code}
        </button>
      </Cell>
      <Cell>
        {tag.tool}
        <span className="text-fore-quiet block text-[0.92em]">{tag.plate}</span>
      </Cell>
      <Cell>
        {tag.visitorName ?? <span className="text-fore-quiet whitespace-nowrap">no name</span>}
      </Cell>
      <Cell className="whitespace-nowrap">{row.state}</Cell>
      <Cell className="whitespace-nowrap">{row.where}</Cell>
      <Cell numeric>{row.isHeld && tag.heldUntil !== null ? time(tag.heldUntil) : ''}</Cell>
      <Cell numeric>{time(tag.joinedAt)}</Cell>
    </Row>
  );
}
