'use client';

import { useMemo } from 'react';
import type { ScopeSelection } from '@/analytics/scope-address';
import { Term } from '@/components/glossary/term';
import { columnsFor, SortableTable } from '@/components/ui/sortable-table';
import { useMay } from '@/components/viewer-context';
import type { GroupedColumn } from './column';
import { GroupedCell } from './grouped-cell';

type GroupedTableProps<Row> = {
  label: string;
  /** Keep columns, rows and both functions stable: the table works out its rows anew when they change. */
  columns: readonly GroupedColumn<Row>[];
  items: readonly Row[];
  rowId: (row: Row) => string;
  /** The part of a scope that is the group's own. */
  ownScope: (scope: ScopeSelection, row: Row) => ScopeSelection;
  scope: ScopeSelection;
};

/** Groups one under the other, put in order by any column; every figure opens. */
export const GroupedTable = <Row extends object>(props: GroupedTableProps<Row>) => {
  const { label, columns, items, rowId, ownScope, scope } = props;
  const mayLook = useMay('flags:read');
  const drawn = useMemo(() => {
    const helper = columnsFor<Row>();
    return columns
      .filter(({ onlyInFile }) => !onlyInFile)
      .map((column) =>
        helper.accessor((row): unknown => column.value(row), {
          id: column.id,
          header: column.kind === 'mass' ? `${column.label}, ${scope.unit}` : column.label,
          ...(column.kind === 'text' ? { sortFn: 'alphanumeric' as const } : {}),
          meta: {
            numeric: column.kind !== 'text',
            rowHeader: column.heads ?? false,
            ...(column.term ? { aside: <Term id={column.term} /> } : {}),
          },
          cell: ({ row }) => (
            <GroupedCell column={column} row={row.original} own={ownScope(scope, row.original)} mayLook={mayLook} />
          ),
        }),
      );
  }, [columns, ownScope, scope, mayLook]);
  return <SortableTable label={label} columns={drawn} data={items} rowId={rowId} />;
};
