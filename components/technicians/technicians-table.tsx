'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import type { Measure } from '@/analytics/figures/measures';
import { type ScopeSelection, scopeSearch } from '@/analytics/scope-address';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { FigureLink } from '@/components/figures/figure-link';
import { columnsFor, SortableTable } from '@/components/ui/sortable-table';
import { formatCount, formatDay, formatMass, formatPercent } from '@/lib/format';

const column = columnsFor<TechnicianRow>();
const rowId = (row: TechnicianRow) => row.technicianId;

const columnsOf = (scope: ScopeSelection) => {
  const opens = (row: TechnicianRow, measure: Measure, figure: string) => (
    <FigureLink measure={measure} scope={{ ...scope, technician: [row.technician] }}>
      {figure}
    </FigureLink>
  );
  /** A day opens what was recovered on it. */
  const opensDay = (row: TechnicianRow, day: string) => (
    <FigureLink measure="recoveries" scope={{ ...scope, from: day, to: day, technician: [row.technician] }}>
      {formatDay(day)}
    </FigureLink>
  );
  return column.columns([
    column.accessor('technician', {
      header: 'Technician',
      sortFn: 'alphanumeric',
      meta: { rowHeader: true },
      cell: ({ row }) => (
        <Link href={`/records${scopeSearch({ ...scope, technician: [row.original.technician] })}`} className="link">
          {row.original.technician}
        </Link>
      ),
    }),
    column.accessor('recoveries', {
      header: 'Recoveries',
      meta: { numeric: true },
      cell: ({ row, getValue }) => opens(row.original, 'recoveries', formatCount(getValue())),
    }),
    column.accessor('recoveredMass', {
      header: `Recovered, ${scope.unit}`,
      meta: { numeric: true },
      cell: ({ row, getValue }) => opens(row.original, 'recoveredMass', formatMass(getValue(), scope.unit)),
    }),
    column.accessor('fullCharge', {
      header: `Full charge, ${scope.unit}`,
      meta: { numeric: true },
      cell: ({ row, getValue }) => opens(row.original, 'fullCharge', formatMass(getValue(), scope.unit)),
    }),
    column.accessor('totalYield', {
      header: 'Total yield',
      meta: { numeric: true },
      cell: ({ row, getValue }) => opens(row.original, 'totalYield', formatPercent(getValue(), 1)),
    }),
    column.accessor('medianYield', {
      header: 'Median yield',
      meta: { numeric: true },
      cell: ({ row, getValue }) => opens(row.original, 'medianYield', formatPercent(getValue(), 1)),
    }),
    column.accessor('firstRecoveredOn', {
      header: 'First',
      meta: { numeric: true },
      cell: ({ row, getValue }) => opensDay(row.original, getValue()),
    }),
    column.accessor('lastRecoveredOn', {
      header: 'Last',
      meta: { numeric: true },
      cell: ({ row, getValue }) => opensDay(row.original, getValue()),
    }),
  ]);
};

type TechniciansTableProps = { items: readonly TechnicianRow[]; scope: ScopeSelection };

/** The crew by name; its reader may sort it, nobody is ranked. */
export const TechniciansTable = ({ items, scope }: TechniciansTableProps) => {
  const columns = useMemo(() => columnsOf(scope), [scope]);
  return <SortableTable label="Recoveries by technician" columns={columns} data={items} rowId={rowId} />;
};
