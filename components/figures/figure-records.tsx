'use client';

import { clsx } from 'clsx';
import { useState } from 'react';
import { type Figure, figureRecords } from '@/analytics/figures/figure';
import { DEFAULT_SORT, PAGE_SIZES, type PageSize, type Sort } from '@/analytics/records/constants';
import { exportHref, useRecords } from '@/analytics/records/hook';
import { ColumnChooser } from '@/components/records/column-chooser';
import { type ColumnId, USUAL_COLUMNS } from '@/components/records/column-list';
import { ListAddress } from '@/components/records/list-address';
import { Pager } from '@/components/records/pager';
import { RecordsCards } from '@/components/records/records-cards';
import { RecordsTable } from '@/components/records/records-table';
import { useNarrow } from '@/components/scope/use-narrow';
import { LinkButton } from '@/components/ui/button';
import { Failed, Loading } from '@/components/ui/states';
import { useMay } from '@/components/viewer-context';
import { searchString } from '@/lib/api/client';
import { formatCount } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

/** The records that make a figure: sorted, paged and with the columns of the reader's choice, none of it in the address. */
export const FigureRecords = ({ figure, unit }: { figure: Figure; unit: DisplayUnit }) => {
  const narrow = useNarrow();
  const mayExport = useMay('records:export');
  const [sort, setSort] = useState<Sort>(DEFAULT_SORT);
  const [limit, setLimit] = useState<PageSize>(PAGE_SIZES[0]);
  const [cursor, setCursor] = useState<string | null>(null);
  const [columns, setColumns] = useState<readonly ColumnId[]>(USUAL_COLUMNS);
  const records = figureRecords(figure);
  const { data, error, isPlaceholderData, refetch } = useRecords({ ...records, sort }, { limit, cursor });
  const [total, setTotal] = useState<number>();
  if (data?.total !== undefined && data.total !== total) setTotal(data.total);
  const list = searchString({ ...records, unit });
  if (error) return <Failed error={error} title="Its records could not be read." onRetry={() => refetch()} />;
  if (!data) return <Loading minHeight={420} />;
  return (
    <section aria-label="Records of this figure" aria-busy={isPlaceholderData} className="mt-5">
      <div className="mb-3 flex flex-wrap items-center justify-between gap-3 print:hidden">
        <div className="flex flex-wrap gap-3">
          <LinkButton href={`/records${list}`} prefetch={false}>
            Show as a list
          </LinkButton>
          {mayExport ? (
            // A download, not a page of the application.
            <a
              className="inline-flex min-h-11 items-center border border-edge bg-sheet px-4 py-1.5 font-medium text-ink no-underline hover:border-ink hover:bg-sheet-2 pointer-fine:min-h-10"
              href={exportHref({ ...records, sort })}
              download
            >
              Export {total === undefined ? '' : `${formatCount(total)} `}as CSV
            </a>
          ) : null}
        </div>
        {narrow ? null : (
          <ColumnChooser
            columns={columns}
            onChange={(next) => setColumns(next ? ['recordRef', ...next] : USUAL_COLUMNS)}
          />
        )}
      </div>
      <ListAddress value={list}>
        <div className={clsx(isPlaceholderData && 'opacity-60')}>
          {narrow ? (
            <RecordsCards rows={data.items} unit={unit} />
          ) : (
            <RecordsTable
              rows={data.items}
              unit={unit}
              sort={sort}
              onSort={(next) => {
                setSort(next);
                setCursor(null);
              }}
              columns={columns}
            />
          )}
        </div>
      </ListAddress>
      {data.nextCursor || data.previousCursor || limit !== PAGE_SIZES[0] ? (
        <div className="mt-4">
          <Pager
            list={data}
            limit={limit}
            onPage={setCursor}
            onLimit={(next) => {
              setLimit(next);
              setCursor(null);
            }}
          />
        </div>
      ) : null}
    </section>
  );
};
