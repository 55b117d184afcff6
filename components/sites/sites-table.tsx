'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import type { Measure } from '@/analytics/figures/measures';
import { type ScopeSelection, scopeSearch } from '@/analytics/scope-address';
import type { SiteRow } from '@/analytics/sites/contract';
import { FigureLink } from '@/components/figures/figure-link';
import { columnsFor, SortableTable } from '@/components/ui/sortable-table';
import { formatCount, formatDay, formatMass, formatPercent } from '@/lib/format';

const column = columnsFor<SiteRow>();
const rowId = (row: SiteRow) => row.siteId;

const columnsOf = (scope: ScopeSelection) => {
  const opens = (row: SiteRow, measure: Measure, figure: string) => (
    <FigureLink measure={measure} scope={{ ...scope, site: [row.site] }}>
      {figure}
    </FigureLink>
  );
  /** A day opens what was recovered on it. */
  const opensDay = (row: SiteRow, day: string) => (
    <FigureLink measure="recoveries" scope={{ ...scope, from: day, to: day, site: [row.site] }}>
      {formatDay(day)}
    </FigureLink>
  );
  return column.columns([
    column.accessor('site', {
      header: 'Site',
      sortFn: 'alphanumeric',
      meta: { rowHeader: true },
      cell: ({ row }) => (
        <Link href={`/records${scopeSearch({ ...scope, site: [row.original.site] })}`} className="link">
          {row.original.site}
        </Link>
      ),
    }),
    column.accessor('recoveries', {
      header: 'Recoveries',
      meta: { numeric: true },
      cell: ({ row, getValue }) => opens(row.original, 'recoveries', formatCount(getValue())),
    }),
    column.accessor('appliances', {
      header: 'Appliances',
      meta: { numeric: true },
      cell: ({ row, getValue }) => opens(row.original, 'appliances', formatCount(getValue())),
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
    column.accessor('lastRecoveredOn', {
      header: 'Last',
      meta: { numeric: true },
      cell: ({ row, getValue }) => opensDay(row.original, getValue()),
    }),
  ]);
};

type SitesTableProps = { items: readonly SiteRow[]; scope: ScopeSelection };

/** The sites by name; sorting by mass tells where most came from. */
export const SitesTable = ({ items, scope }: SitesTableProps) => {
  const columns = useMemo(() => columnsOf(scope), [scope]);
  return <SortableTable label="Recoveries by site" columns={columns} data={items} rowId={rowId} />;
};
