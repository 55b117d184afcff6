'use client';

import dynamic from 'next/dynamic';
import { useMemo } from 'react';
import { useMonthlyTrends } from '@/analytics/monthly-trends/hook';
import { lastWholeMonth, type StackedMonth, type StackLayer, toStacks } from '@/analytics/monthly-trends/series';
import type { ScopeQuery, ScopeSelection } from '@/analytics/scope-address';
import { useSeen } from '@/components/charts/use-seen';
import { useWidth } from '@/components/charts/use-width';
import { FigureLink } from '@/components/figures/figure-link';
import { Sheet } from '@/components/ui/sheet';
import { formatMassWithUnit, formatMonth } from '@/lib/format';
import { layerScope } from './months-model';
import { layerName } from './wording';

const HEIGHT = 128;

const BarPanel = dynamic(() => import('@/components/charts/bar-panel').then((module) => module.BarPanel), {
  ssr: false,
  loading: () => <div style={{ height: HEIGHT }} />,
});

type PanelProps = {
  layer: StackLayer;
  layers: readonly StackLayer[];
  months: readonly StackedMonth[];
  highest: number;
  scope: ScopeSelection;
};

const Panel = ({ layer, layers, months, highest, scope }: PanelProps) => {
  const [measured, width] = useWidth();
  const total = months.reduce((sum, month) => sum + (month.layers[layer.id] ?? 0), 0);
  const latest = lastWholeMonth(months);
  const name = layerName('branch', layer);
  const inLatest = latest
    ? `, ${formatMassWithUnit(latest.layers[layer.id] ?? 0, scope.unit, 0)} of it in ${formatMonth(latest.month)}`
    : '';
  return (
    <figure className="m-0 min-w-0">
      <figcaption className="mb-1">
        <span className="block truncate font-semibold">{name}</span>
        <span className="block text-sm text-ink-2">
          <FigureLink measure="recoveredMass" scope={layerScope(scope, 'branch', layer, layers)}>
            {formatMassWithUnit(total, scope.unit, 0)}
          </FigureLink>
          {inLatest}
        </span>
      </figcaption>
      <div ref={measured} style={{ height: HEIGHT }}>
        {width > 0 ? (
          <BarPanel
            width={width}
            height={HEIGHT}
            highest={highest}
            colour="var(--ink-2)"
            months={months.map((month) => ({
              month: month.month,
              value: month.layers[layer.id] ?? 0,
              unfinished: month.state !== 'whole',
            }))}
          />
        ) : null}
      </div>
    </figure>
  );
};

type BranchesSheetProps = { query: ScopeQuery; scope: ScopeSelection; className?: string };

/** One small chart a branch, all on one scale; nothing where there is only one branch. Read once it comes into view. */
export const BranchesSheet = ({ query, scope, className }: BranchesSheetProps) => {
  const [seenRef, seen] = useSeen();
  const { data } = useMonthlyTrends(query, 'branch', { enabled: seen });
  const stacks = useMemo(() => (data?.by === 'branch' ? toStacks(data) : null), [data]);
  const highest = Math.max(0, ...(stacks?.months ?? []).flatMap(({ layers }) => Object.values(layers)));
  if (stacks && stacks.layers.length < 2) return null;
  return (
    <div ref={seenRef} {...(className ? { className } : {})}>
      <Sheet
        title="Branch by branch"
        aside={
          stacks
            ? `bars of one scale, the highest ${formatMassWithUnit(highest, scope.unit, 0)} a month`
            : 'bars of one scale'
        }
      >
        <div className="grid min-h-44 gap-x-8 gap-y-6 pb-2 sm:grid-cols-2 lg:grid-cols-3">
          {stacks?.layers.map((layer) => (
            <Panel
              key={layer.id}
              layer={layer}
              layers={stacks.layers}
              months={stacks.months}
              highest={highest}
              scope={scope}
            />
          ))}
        </div>
      </Sheet>
    </div>
  );
};
