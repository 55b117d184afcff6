'use client';

import { parseAsStringLiteral, useQueryState } from 'nuqs';
import { useMemo } from 'react';
import { fetchAllLow } from '@/analytics/low-recoveries/all-pages';
import { useLowRecoveries } from '@/analytics/low-recoveries/hook';
import { LOW_ORDERS } from '@/analytics/low-recoveries/orders';
import { lowAnswer, unjudgedNote } from '@/analytics/low-recoveries/sentence';
import { scopeQuery } from '@/analytics/scope-address';
import { FigureSentence } from '@/components/figures/figure-sentence';
import { FileButtons } from '@/components/files/file-buttons';
import { ScopedReport } from '@/components/scope/scoped-report';
import { useScope } from '@/components/scope/use-scope';
import { Button } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { lowFile } from './low-file';
import { LowList } from './low-list';
import { LowRule } from './low-rule';
import { OrderChoice } from './order-choice';

const ORDER = parseAsStringLiteral(LOW_ORDERS).withDefault('extreme').withOptions({ history: 'push' });

/** Recoveries far below like jobs: how many, which, by what rule. */
export const LowRecoveriesScreen = () => {
  const { scope } = useScope();
  const [order, setOrder] = useQueryState('order', ORDER);
  const query = useMemo(() => scopeQuery(scope), [scope]);
  const low = useLowRecoveries(query, order);
  return (
    <ScopedReport
      screen="Low recoveries"
      data={low.data}
      error={low.error}
      stale={low.isPlaceholderData}
      retry={() => low.refetch()}
      isEmpty={({ pages }) => !pages[0] || pages[0].judged.records + pages[0].judged.tooFewLikeJobs === 0}
    >
      {({ pages }) => {
        const judged = pages[0]?.judged ?? { records: 0, groups: 0, tooFewLikeJobs: 0, low: 0 };
        const items = pages.flatMap((page) => page.items);
        return (
          <>
            <PageHead
              title={<FigureSentence pieces={lowAnswer(judged)} scope={scope} />}
              sub={
                <>
                  A reason to look, not a finding. <FigureSentence pieces={unjudgedNote(judged)} scope={scope} />
                </>
              }
            />
            {items.length ? (
              <Sheet
                title="To look at"
                aside={<OrderChoice order={order} onChange={setOrder} />}
                tools={<FileButtons makeTable={async () => lowFile(await fetchAllLow(query, order), scope)} />}
              >
                <LowList items={items} unit={scope.unit} />
                {low.hasNextPage ? (
                  <Button className="mt-4 mb-2" disabled={low.isFetchingNextPage} onClick={() => low.fetchNextPage()}>
                    {low.isFetchingNextPage ? 'Reading more' : 'Show more'}
                  </Button>
                ) : null}
              </Sheet>
            ) : null}
            <LowRule />
          </>
        );
      }}
    </ScopedReport>
  );
};
