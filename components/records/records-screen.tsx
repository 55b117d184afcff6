'use client';

import { readSort } from '@/analytics/records/constants';
import { exportHref, useRecords, useRecordTotal } from '@/analytics/records/hook';
import { ScopeSentence } from '@/components/scope/scope-sentence';
import { LinkButton } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';
import { Failed, Loading } from '@/components/ui/states';
import { useMay } from '@/components/viewer-context';
import { formatCount, plural } from '@/lib/format';
import { RecordsSheet } from './records-sheet';
import { useRecordList } from './use-record-list';
import { ORDER_WORDS } from './wording';

/** All recoveries in scope: how many, in which order, and the rows. */
export const RecordsScreen = () => {
  const list = useRecordList();
  const { filters, page } = list;
  const { data, error, isPlaceholderData, refetch } = useRecords(filters, page);
  const total = useRecordTotal(filters, data?.total);
  const mayWrite = useMay('records:write');
  const mayExport = useMay('records:export');
  const { key, descending } = readSort(filters.sort);
  const order = ORDER_WORDS[key][descending ? 1 : 0];
  const found = filters.q ? ` with “${filters.q}”` : '';
  const title =
    total === undefined
      ? 'Records'
      : total === 0
        ? `No records${found}`
        : `${plural(total, 'record', 'records')}${found}, ${order}.`;
  return (
    <>
      <ScopeSentence />
      <PageHead
        className="mb-5"
        title={title}
        actions={
          <>
            {mayExport && total ? (
              // A download, not a page of the application.
              <a
                className="inline-flex min-h-11 items-center border border-edge bg-sheet px-4 py-1.5 font-medium text-ink no-underline hover:border-ink hover:bg-sheet-2 pointer-fine:min-h-10"
                href={exportHref(filters)}
                download
              >
                Export {formatCount(total)} as CSV
              </a>
            ) : null}
            {mayWrite ? (
              <LinkButton tone="primary" href="/records/new">
                New record
              </LinkButton>
            ) : null}
          </>
        }
      />
      {data ? (
        <RecordsSheet list={list} data={data} stale={isPlaceholderData} />
      ) : error ? (
        <Failed error={error} onRetry={() => refetch()} />
      ) : (
        <div className="min-h-dvh bg-sheet">
          <Loading minHeight={480} />
        </div>
      )}
    </>
  );
};
