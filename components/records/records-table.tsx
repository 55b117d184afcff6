'use client';

import { FlexRender, useTable } from '@tanstack/react-table';
import { useMemo } from 'react';
import { readSort, type Sort } from '@/analytics/records/constants';
import type { RecordRow } from '@/analytics/records/contract';
import { Table, Td } from '@/components/ui/table';
import type { DisplayUnit } from '@/lib/vocabulary';
import { COLUMN_IDS, COLUMN_NAMES, type ColumnId } from './column-list';
import { NUMERIC_COLUMNS, RECORD_TABLE_FEATURES, recordColumns } from './columns';
import { SortHeader } from './sort-header';

type RecordsTableProps = {
  rows: RecordRow[];
  unit: DisplayUnit;
  sort: Sort;
  onSort: (sort: Sort) => void;
  columns: readonly ColumnId[];
};

/** One page of records as a table; the ref leads to the record, each head sorts. */
export const RecordsTable = ({ rows, unit, sort, onSort, columns }: RecordsTableProps) => {
  const definitions = useMemo(() => recordColumns(unit), [unit]);
  const { key, descending } = readSort(sort);
  const table = useTable({
    features: RECORD_TABLE_FEATURES,
    columns: definitions,
    data: rows,
    getRowId: (row) => row.id,
    manualSorting: true,
    state: {
      sorting: [{ id: key, desc: descending }],
      columnVisibility: Object.fromEntries(COLUMN_IDS.map((id) => [id, columns.includes(id)])),
    },
  });
  return (
    <Table label="Records">
      <thead>
        {table.getHeaderGroups().map((group) => (
          <tr key={group.id}>
            {group.headers.map((header) => {
              const id = COLUMN_IDS.find((one) => one === header.column.id);
              return id ? (
                <SortHeader key={header.id} id={id} sort={sort} onSort={onSort}>
                  {String(header.column.columnDef.header ?? COLUMN_NAMES[id])}
                </SortHeader>
              ) : null;
            })}
          </tr>
        ))}
      </thead>
      <tbody>
        {table.getRowModel().rows.map((row) => (
          <tr key={row.id} className="hover:bg-sheet-2">
            {row.getVisibleCells().map((cell) => (
              <Td key={cell.id} numeric={NUMERIC_COLUMNS.has(cell.column.id)}>
                <FlexRender cell={cell} />
              </Td>
            ))}
          </tr>
        ))}
      </tbody>
    </Table>
  );
};
