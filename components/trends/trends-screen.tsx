'use client';

import { parseAsStringLiteral, useQueryState } from 'nuqs';
import { useMemo } from 'react';
import { DIMENSIONS } from '@/analytics/dimensions';
import { useMonthlyTrends } from '@/analytics/monthly-trends/hook';
import { scopeQuery } from '@/analytics/scope-address';
import { ScopeSentence } from '@/components/scope/scope-sentence';
import { useScope } from '@/components/scope/use-scope';
import { Failed } from '@/components/ui/states';
import { TrendsLoading } from './trends-loading';
import { TrendsReport } from './trends-report';

const SPLIT = parseAsStringLiteral(DIMENSIONS).withDefault('refrigerant').withOptions({ history: 'push' });

/** How much was brought in, month by month: the scope, the answer, the chart, the figures. */
export const TrendsScreen = () => {
  const { scope } = useScope();
  const [by, setBy] = useQueryState('by', SPLIT);
  const query = useMemo(() => scopeQuery(scope), [scope]);
  const { data, error, isPlaceholderData, refetch } = useMonthlyTrends(query, by);
  return (
    <>
      <ScopeSentence />
      {data ? null : <h1 className="sr-only">Trends</h1>}
      {data ? (
        <TrendsReport trends={data} scope={scope} by={by} onSplit={setBy} stale={isPlaceholderData} />
      ) : error ? (
        <Failed error={error} onRetry={() => refetch()} />
      ) : (
        <TrendsLoading />
      )}
    </>
  );
};
