'use client';

import { useMemo } from 'react';
import type { Dimension } from '@/analytics/dimensions';
import { useMonthlyPattern } from '@/analytics/monthly-pattern/hook';
import { useMonthlyTrends } from '@/analytics/monthly-trends/hook';
import { useNotes } from '@/analytics/notes/hook';
import { type ScopeSelection, scopeQuery } from '@/analytics/scope-address';
import { useTrendsComparison } from '@/analytics/trends-comparison/hook';
import { useComparisonAddress } from './use-comparison-address';

/** Everything the screen shows of a scope, asked for at once. */
export const useTrendsFigures = (scope: ScopeSelection, by: Dimension) => {
  const query = useMemo(() => scopeQuery(scope), [scope]);
  const address = useComparisonAddress();
  const months = useMonthlyTrends(query, by);
  const comparison = useTrendsComparison(query, { by, versus: address.versus, gwp: address.gwp });
  const pattern = useMonthlyPattern(query);
  const { data: notes } = useNotes(scope.from, scope.to);
  return { query, address, months, comparison, pattern, notes: notes?.items };
};
export type TrendsFigures = ReturnType<typeof useTrendsFigures>;
