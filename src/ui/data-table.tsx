'use client';

import {
  createColumnHelper,
  createPaginatedRowModel,
  createSortedRowModel,
  rowPaginationFeature,
  rowSortingFeature,
  type SortingState,
  sortFns,
  tableFeatures,
  useTable,
} from '@tanstack/react-table';
import { type ReactNode, useMemo, useState } from 'react';
import { compareValues, rowMatches, type SortValue } from './data-table-values';
import { EmptyState } from './notices';
import { Pager } from './pager';
import { NOTHING, RowHead, type Sorted, Table, TBody, Td, THead, Th, Tr } from './table';
import { TextInput } from './text-inputs';
import { TABLE_WORDS } from './words/tables';

const features = tableFeatures({
  rowSortingFeature,
  rowPaginationFeature,
  sortedRowModel: createSortedRowModel(),
  paginatedRowModel: createPaginatedRowModel(),
  sortFns,
});

export interface DataColumn<Row> {
  id: string;
  header: string;
  /** What the column sorts by, and what its text filter reads. */
  value: (row: Row) => SortValue;
  /** What is shown; the value itself when left out. */
  cell?: (row: Row) => ReactNode;
  /** Read by the text filter. Default true for text. */
  filterable?: boolean;
  /** Default true. */
  sortable?: boolean;
  align?: 'left' | 'right';
}

export interface DataTableProps<Row> {
  caption: string;
  captionHidden?: boolean;
  rows: Row[];
  /** The first names its row. Keep it outside the component or in a memo. */
  columns: readonly DataColumn<Row>[];
  rowId: (row: Row) => string;
  /** Label of the text filter; left out: no filter. */
  filterLabel?: string;
  pageSize?: number;
  initialSort?: { id: string; desc?: boolean };
  /** Shown when there are no rows at all. */
  empty?: ReactNode;
}

/** A table that sorts, filters by text and pages in the browser. */
export function DataTable<Row extends object>(props: DataTableProps<Row>) {
  const { caption, captionHidden, rows, columns, rowId, filterLabel, pageSize = 25, initialSort, empty } = props;
  const [query, setQuery] = useState('');

  const found = useMemo(() => rows.filter((row) => rowMatches(row, columns, query)), [rows, columns, query]);
  const definitions = useMemo(() => {
    const helper = createColumnHelper<typeof features, Row>();
    return helper.columns(
      columns.map((column) =>
        helper.accessor((row: Row) => column.value(row), {
          id: column.id,
          header: column.header,
          enableSorting: column.sortable ?? true,
          sortFn: (a, b) => compareValues(column.value(a.original), column.value(b.original)),
          sortUndefined: 'last',
        }),
      ),
    );
  }, [columns]);

  const startSort: SortingState = initialSort ? [{ id: initialSort.id, desc: initialSort.desc ?? false }] : [];
  const table = useTable({
    features,
    columns: definitions,
    data: found,
    getRowId: rowId,
    initialState: { sorting: startSort, pagination: { pageIndex: 0, pageSize } },
  });

  if (rows.length === 0 && empty) return empty;
  const { pageIndex } = table.state.pagination;
  const pages = Math.max(1, Math.ceil(found.length / pageSize));
  const page = Math.min(pageIndex, pages - 1);
  const shown = table.getRowModel().rows;
  return (
    <div className="flex flex-col gap-3">
      {filterLabel && (
        <TextInput
          label={filterLabel}
          type="search"
          value={query}
          onChange={(event) => {
            setQuery(event.target.value);
            table.setPageIndex(0);
          }}
          fieldClassName="max-w-sm"
        />
      )}
      <p role="status" className="sr-only">
        {TABLE_WORDS.shown(found.length, rows.length)}
      </p>
      {found.length === 0 ? (
        <EmptyState title={TABLE_WORDS.nothingTitle}>{TABLE_WORDS.nothing(rows.length)}</EmptyState>
      ) : (
        <Table caption={caption} captionHidden={captionHidden}>
          <THead>
            {table.getHeaderGroups()[0]?.headers.map((header) => {
              const column = columns.find((one) => one.id === header.column.id);
              return (
                <Th
                  key={header.id}
                  align={column?.align}
                  sorted={header.column.getCanSort() ? sortedWord(header.column.getIsSorted()) : undefined}
                  onSort={() => header.column.toggleSorting(header.column.getIsSorted() === 'asc')}
                >
                  {column?.header}
                </Th>
              );
            })}
          </THead>
          <TBody>
            {shown.map((row) => (
              <Tr key={row.id}>
                {columns.map((column, index) => {
                  const shownCell = column.cell ? column.cell(row.original) : column.value(row.original);
                  if (index === 0) return <RowHead key={column.id}>{shownCell}</RowHead>;
                  return (
                    <Td key={column.id} label={column.header} align={column.align}>
                      {shownCell ?? NOTHING}
                    </Td>
                  );
                })}
              </Tr>
            ))}
          </TBody>
        </Table>
      )}
      {pages > 1 && (
        <Pager
          page={page + 1}
          pages={pages}
          onPage={(next) => table.setPageIndex(next - 1)}
          summary={TABLE_WORDS.span(page * pageSize + 1, Math.min(found.length, (page + 1) * pageSize), found.length)}
        />
      )}
    </div>
  );
}

function sortedWord(sorted: false | 'asc' | 'desc'): Sorted {
  if (!sorted) return 'none';
  return sorted === 'asc' ? 'ascending' : 'descending';
}
