'use client';

import { useMemo } from 'react';
import { useMonthlyTrends } from '@/analytics/monthly-trends/hook';
import { toStacks } from '@/analytics/monthly-trends/series';
import type { ScopeQuery, ScopeSelection } from '@/analytics/scope-address';
import { FoldedTable } from '@/components/charts/folded-table';
import { shownValue } from '@/components/charts/model';
import { useSeen } from '@/components/charts/use-seen';
import { Sheet } from '@/components/ui/sheet';
import { formatMassWithUnit } from '@/lib/format';
import { BranchPanel } from './branch-panel';
import { layerScope, monthsModel } from './months-model';

type BranchesSheetProps = { query: ScopeQuery; scope: ScopeSelection; className?: string };

/** One small chart a branch, all on one scale; nothing where there is only one branch. Read once it comes into view. */
export const BranchesSheet = ({ query, scope, className }: BranchesSheetProps) => {
  const [seenRef, seen] = useSeen();
  const { data } = useMonthlyTrends(query, 'branch', { enabled: seen });
  const stacks = useMemo(() => (data?.by === 'branch' ? toStacks(data) : null), [data]);
  const model = useMemo(
    () => stacks && { ...monthsModel(stacks, 'branch', scope, {}), title: 'Recovered mass by month and branch' },
    [stacks, scope],
  );
  if (stacks && stacks.layers.length < 2) return null;
  const highest = Math.max(0, ...(model?.series ?? []).flatMap(({ values }) => values.map((value) => value ?? 0)));
  return (
    <div ref={seenRef} {...(className ? { className } : {})}>
      <Sheet
        title="Branch by branch"
        aside={
          model
            ? `bars of one scale, the highest ${formatMassWithUnit(highest, scope.unit, 0)} a month`
            : 'bars of one scale'
        }
      >
        <div className="grid min-h-44 gap-x-8 gap-y-6 pb-4 sm:grid-cols-2 lg:grid-cols-3">
          {model?.series.map((series) => {
            const layer = stacks?.layers.find(({ id }) => id === series.key);
            return stacks && layer ? (
              <BranchPanel
                key={series.key}
                series={series}
                model={model}
                highest={shownValue(highest, 'mass', scope.unit) ?? 0}
                own={layerScope(scope, 'branch', layer, stacks.layers)}
              />
            ) : null;
          })}
        </div>
        {model ? <FoldedTable model={model} /> : null}
      </Sheet>
    </div>
  );
};
