'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import { type ScopeSelection, scopeSearch } from '@/analytics/scope-address';
import type { SiteRow } from '@/analytics/sites/contract';
import { columnsFor, SortableTable } from '@/components/ui/sortable-table';
import { formatCount, formatDay, formatMass, formatPercent } from '@/lib/format';

const column = columnsFor<SiteRow>();
const rowId = (row: SiteRow) => row.siteId;

const columnsOf = (scope: ScopeSelection) => {
  const records = (site: string) => `/records${scopeSearch({ ...scope, site: [site] })}`;
  return column.columns([
    column.accessor('site', {
      header: 'Site',
      sortFn: 'alphanumeric',
      meta: { rowHeader: true },
      cell: ({ row }) => (
        <Link href={records(row.original.site)} className="link">
          {row.original.site}
        </Link>
      ),
    }),
    column.accessor('recoveries', {
      header: 'Recoveries',
      meta: { numeric: true },
      cell: ({ row }) => (
        <Link href={records(row.original.site)} className="figure-link">
          {formatCount(row.original.recoveries)}
        </Link>
      ),
    }),
    column.accessor('appliances', {
      header: 'Appliances',
      meta: { numeric: true },
      cell: ({ getValue }) => formatCount(getValue()),
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
    column.accessor('lastRecoveredOn', {
      header: 'Last',
      meta: { numeric: true },
      cell: ({ getValue }) => formatDay(getValue()),
    }),
  ]);
};

type SitesTableProps = { items: readonly SiteRow[]; scope: ScopeSelection };

/** The sites by name; sorting by mass tells where most came from. */
export const SitesTable = ({ items, scope }: SitesTableProps) => {
  const columns = useMemo(() => columnsOf(scope), [scope]);
  return <SortableTable label="Recoveries by site" columns={columns} data={items} rowId={rowId} />;
};
