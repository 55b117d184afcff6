'use client';

import { clsx } from 'clsx';
import { PAGE_SIZES } from '@/analytics/records/constants';
import type { RecordList } from '@/analytics/records/contract';
import { NothingInScope } from '@/components/scope/nothing-in-scope';
import { useNarrow } from '@/components/scope/use-narrow';
import { Button, TextButton } from '@/components/ui/button';
import { Empty } from '@/components/ui/states';
import { ColumnChooser } from './column-chooser';
import { USUAL_COLUMNS } from './column-list';
import { Pager } from './pager';
import { RecordsCards } from './records-cards';
import { RecordsTable } from './records-table';
import { SearchBox } from './search-box';
import type { RecordListState } from './use-record-list';
import { onlyPhrase } from './wording';

const NothingFound = ({ list }: { list: RecordListState }) => {
  const { q } = list.filters;
  const only = onlyPhrase(list.filters);
  if (!q && !only) return <NothingInScope />;
  return (
    <Empty
      title="No record fits"
      action={<Button onClick={() => (q ? list.setSearch('') : list.showAll())}>Show all in this scope</Button>}
    >
      {q
        ? `“${q}” stands in no ref, technician, site or appliance of this scope.`
        : `In this scope there are no records ${only}.`}
    </Empty>
  );
};

type RecordsSheetProps = { list: RecordListState; data: RecordList; stale: boolean };

/** The rows with what finds, sorts and pages them. */
export const RecordsSheet = ({ list, data, stale }: RecordsSheetProps) => {
  const narrow = useNarrow();
  const only = onlyPhrase(list.filters);
  const columns = list.columns ? (['recordRef', ...list.columns] as const) : USUAL_COLUMNS;
  const limit = PAGE_SIZES.find((size) => size === list.page.limit) ?? PAGE_SIZES[0];
  return (
    <section aria-label="Records" aria-busy={stale} className="bg-sheet px-4 pt-4 pb-4 sm:px-6">
      <div className="mb-3 flex flex-wrap items-center justify-between gap-3 print:hidden">
        <SearchBox value={list.filters.q ?? ''} onSearch={list.setSearch} />
        {only ? (
          <p className="text-sm text-ink-2">
            Only records {only}. <TextButton onClick={list.showAll}>Show all</TextButton>
          </p>
        ) : null}
        {narrow ? null : <ColumnChooser columns={columns} onChange={list.setColumns} />}
      </div>
      <div className={clsx(stale && 'opacity-60')}>
        {data.items.length === 0 ? (
          <NothingFound list={list} />
        ) : narrow ? (
          <RecordsCards rows={data.items} unit={list.scope.unit} />
        ) : (
          <RecordsTable
            rows={data.items}
            unit={list.scope.unit}
            sort={list.filters.sort}
            onSort={list.setSort}
            columns={columns}
          />
        )}
      </div>
      {data.items.length ? (
        <div className="mt-4">
          <Pager list={data} limit={limit} onPage={list.setCursor} onLimit={list.setLimit} />
        </div>
      ) : null}
    </section>
  );
};
