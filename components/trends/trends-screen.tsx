'use client';

import { parseAsStringLiteral, useQueryState } from 'nuqs';
import { DIMENSIONS } from '@/analytics/dimensions';
import { FigurePage } from '@/components/figures/figure-page';
import { ScopeSentence } from '@/components/scope/scope-sentence';
import { useScope } from '@/components/scope/use-scope';
import { Failed } from '@/components/ui/states';
import { TrendsLoading } from './trends-loading';
import { TrendsReport } from './trends-report';
import { useTrendsFigures } from './use-trends-figures';

const SPLIT = parseAsStringLiteral(DIMENSIONS).withDefault('refrigerant').withOptions({ history: 'push' });

/** How much was brought in, month by month, and what changed: the scope, the answer, the figures, the charts. */
export const TrendsScreen = () => {
  const { scope } = useScope();
  const [by, setBy] = useQueryState('by', SPLIT);
  const figures = useTrendsFigures(scope, by);
  const { data, error, refetch } = figures.months;
  // The answer is said once and whole: it does not grow while it is being read.
  const settled = !figures.comparison.isPending && !figures.pattern.isPending;
  return (
    <FigurePage>
      <ScopeSentence />
      {data && settled ? null : <h1 className="sr-only">Trends</h1>}
      {data && settled ? (
        <TrendsReport trends={data} figures={figures} scope={scope} by={by} onSplit={setBy} />
      ) : error ? (
        <Failed error={error} onRetry={() => refetch()} />
      ) : (
        <TrendsLoading />
      )}
    </FigurePage>
  );
};
