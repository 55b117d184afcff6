'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import { type ScopeSelection, scopeSearch } from '@/analytics/scope-address';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { columnsFor, SortableTable } from '@/components/ui/sortable-table';
import { formatCount, formatDay, formatMass, formatPercent } from '@/lib/format';

const column = columnsFor<TechnicianRow>();
const rowId = (row: TechnicianRow) => row.technicianId;

const columnsOf = (scope: ScopeSelection) => {
  const records = (technician: string) => `/records${scopeSearch({ ...scope, technician: [technician] })}`;
  return column.columns([
    column.accessor('technician', {
      header: 'Technician',
      sortFn: 'alphanumeric',
      meta: { rowHeader: true },
      cell: ({ row }) => (
        <Link href={records(row.original.technician)} className="link">
          {row.original.technician}
        </Link>
      ),
    }),
    column.accessor('recoveries', {
      header: 'Recoveries',
      meta: { numeric: true },
      cell: ({ row }) => (
        <Link href={records(row.original.technician)} className="figure-link">
          {formatCount(row.original.recoveries)}
        </Link>
      ),
    }),
    column.accessor('recoveredMass', {
      header: `Recovered, ${scope.unit}`,
      meta: { numeric: true },
      cell: ({ getValue }) => formatMass(getValue(), scope.unit),
    }),
    column.accessor('fullCharge', {
      header: `Full charge, ${scope.unit}`,
      meta: { numeric: true },
      cell: ({ getValue }) => formatMass(getValue(), scope.unit),
    }),
    column.accessor('totalYield', {
      header: 'Total yield',
      meta: { numeric: true },
      cell: ({ getValue }) => formatPercent(getValue(), 1),
    }),
    column.accessor('medianYield', {
      header: 'Median yield',
      meta: { numeric: true },
      cell: ({ getValue }) => formatPercent(getValue(), 1),
    }),
    column.accessor('firstRecoveredOn', {
      header: 'First',
      meta: { numeric: true },
      cell: ({ getValue }) => formatDay(getValue()),
    }),
    column.accessor('lastRecoveredOn', {
      header: 'Last',
      meta: { numeric: true },
      cell: ({ getValue }) => formatDay(getValue()),
    }),
  ]);
};

type TechniciansTableProps = { items: readonly TechnicianRow[]; scope: ScopeSelection };

/** The crew by name; its reader may sort it, nobody is ranked. */
export const TechniciansTable = ({ items, scope }: TechniciansTableProps) => {
  const columns = useMemo(() => columnsOf(scope), [scope]);
  return <SortableTable label="Recoveries by technician" columns={columns} data={items} rowId={rowId} />;
};
