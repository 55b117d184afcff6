'use client';

import {
  type ColumnDef,
  createColumnHelper,
  createSortedRowModel,
  metaHelper,
  type RowData,
  rowSortingFeature,
  sortFn_alphanumeric,
  tableFeatures,
  useTable,
} from '@tanstack/react-table';
import { type ReactNode, useState } from 'react';
import { formatCount } from '@/lib/format';
import { TextButton } from './button';
import { Table, Td, Th } from './table';

type ColumnLook = {
  numeric?: boolean;
  /** Names the row for who cannot see the table; one column of a table has it. */
  rowHeader?: boolean;
  /** Stands beside the heading: what its word means. */
  aside?: ReactNode;
};

const features = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric },
  columnMeta: metaHelper<ColumnLook>(),
});
type Features = typeof features;

/** Makes the columns of a sortable table; names sort as people read them with `sortFn: 'alphanumeric'`. */
export const columnsFor = <Row extends RowData>() => createColumnHelper<Features, Row>();

/** Columns of any values: the array a helper's `columns` gives. */
export type SortableColumns<Row extends RowData> = ReadonlyArray<ColumnDef<Features, Row>>;

const ARROWS = { asc: '↑', desc: '↓' } as const;
const ARIA = { asc: 'ascending', desc: 'descending' } as const;

type SortableTableProps<Row extends RowData> = {
  label: string;
  /** Keep both references stable: the table works out its rows anew when they change. */
  columns: SortableColumns<Row>;
  data: readonly Row[];
  rowId: (row: Row) => string;
};

/** More rows than this, the first in the chosen order, make a page endless; who wants all of them asks. */
const FIRST_ROWS = 50;

/** A table that its reader puts in order by any column; the order it comes in is the first. */
export const SortableTable = <Row extends RowData>({ label, columns, data, rowId }: SortableTableProps<Row>) => {
  const [all, setAll] = useState(false);
  const table = useTable({ features, columns: [...columns], data: data as Row[], getRowId: rowId });
  const { rows } = table.getRowModel();
  return (
    <>
      <Table label={label}>
        <thead>
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id}>
              {group.headers.map((header) => {
                const sorted = header.column.getIsSorted();
                return (
                  <Th
                    key={header.id}
                    numeric={header.column.columnDef.meta?.numeric ?? false}
                    data-numeric={header.column.columnDef.meta?.numeric || undefined}
                    aria-sort={sorted ? ARIA[sorted] : 'none'}
                  >
                    {/* In a column of figures the mark goes first: the heading ends where the figures do. */}
                    {header.column.columnDef.meta?.numeric ? header.column.columnDef.meta.aside : null}
                    <button
                      type="button"
                      onClick={header.column.getToggleSortingHandler()}
                      className="inline-flex min-h-8 items-end align-bottom gap-1 font-medium hover:text-act pointer-coarse:min-h-11"
                    >
                      {/* The arrow stands where it does not push the heading away from its figures. */}
                      <span aria-hidden="true" className="order-last w-3 text-ink in-data-numeric:order-first">
                        {sorted ? ARROWS[sorted] : ''}
                      </span>
                      <table.FlexRender header={header} />
                    </button>
                    {header.column.columnDef.meta?.numeric ? null : header.column.columnDef.meta?.aside}
                  </Th>
                );
              })}
            </tr>
          ))}
        </thead>
        <tbody>
          {(all ? rows : rows.slice(0, FIRST_ROWS)).map((row) => (
            <tr key={row.id}>
              {row.getAllCells().map((cell) => {
                const { numeric = false, rowHeader = false } = cell.column.columnDef.meta ?? {};
                return rowHeader ? (
                  <Th key={cell.id} scope="row">
                    <table.FlexRender cell={cell} />
                  </Th>
                ) : (
                  <Td key={cell.id} numeric={numeric}>
                    <table.FlexRender cell={cell} />
                  </Td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </Table>
      {rows.length > FIRST_ROWS && !all ? (
        <p className="mt-3 flex flex-wrap items-baseline gap-x-4 text-sm text-ink-2">
          The first {formatCount(FIRST_ROWS)} of {formatCount(rows.length)}; the files have them all.
          <TextButton className="print:hidden" onClick={() => setAll(true)}>
            Show all {formatCount(rows.length)}
          </TextButton>
        </p>
      ) : null}
    </>
  );
};
