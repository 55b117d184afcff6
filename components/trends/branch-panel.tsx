'use client';

import dynamic from 'next/dynamic';
import type { FigureScope } from '@/analytics/figures/figure';
import { type ChartModel, shownValue } from '@/components/charts/model';
import { useWidth } from '@/components/charts/use-width';
import { FigureLink } from '@/components/figures/figure-link';
import { formatMassWithUnit, formatMonth } from '@/lib/format';

const HEIGHT = 128;

const BarPanel = dynamic(() => import('@/components/charts/bar-panel').then((module) => module.BarPanel), {
  ssr: false,
  loading: () => <div style={{ height: HEIGHT }} />,
});

type BranchPanelProps = {
  model: ChartModel;
  series: ChartModel['series'][number];
  /** The highest value of all panels, in the chart's unit. */
  highest: number;
  /** The records of the branch. */
  own: FigureScope;
};

/** One branch: its sum, its latest whole month, and its bars. */
export const BranchPanel = ({
  model: { months, unit },
  series: { label, values, kind },
  highest,
  own,
}: BranchPanelProps) => {
  const [measured, width] = useWidth();
  const total = values.reduce<number>((sum, value) => sum + (value ?? 0), 0);
  const at = months.findLastIndex(({ state }) => state === 'whole');
  const latest = months[at];
  return (
    <figure className="m-0 min-w-0">
      <figcaption className="mb-1">
        <span className="block truncate font-semibold">{label}</span>
        <span className="block text-sm text-ink-2">
          <FigureLink measure="recoveredMass" scope={own}>
            {formatMassWithUnit(total, unit, 0)}
          </FigureLink>
          {latest ? (
            <>
              ,{' '}
              <FigureLink measure="recoveredMass" scope={{ ...own, from: latest.month, to: latest.month }}>
                {formatMassWithUnit(values[at] ?? 0, unit, 0)}
              </FigureLink>{' '}
              of it in {formatMonth(latest.month)}
            </>
          ) : null}
        </span>
      </figcaption>
      <div ref={measured} style={{ height: HEIGHT }}>
        {width > 0 ? (
          <BarPanel
            width={width}
            height={HEIGHT}
            highest={highest}
            colour="var(--ink-2)"
            months={months.map(({ month, state }, index) => ({
              month,
              value: shownValue(values[index] ?? 0, kind, unit) ?? 0,
              unfinished: state !== 'whole',
            }))}
          />
        ) : null}
      </div>
    </figure>
  );
};
