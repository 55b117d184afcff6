'use client';

import dynamic from 'next/dynamic';
import { type ReactNode, useMemo } from 'react';
import { Loading } from '@/components/ui/states';
import { formatDesignation } from '@/lib/format';
import type { ChartModel } from './model';
import { modelPicture } from './model-picture';
import { MonthsFigure } from './months-figure';

const HEIGHT = { wide: 400, narrow: 320 } as const;
const NARROW_MONTHS = 12;

// The chart library stays out of the first load, and draws nothing on the server anyway.
const StackedMonths = dynamic(() => import('./stacked-months').then((module) => module.StackedMonths), {
  ssr: false,
  loading: () => <Loading label="Drawing the chart" minHeight={HEIGHT.narrow} />,
});

type StackedMonthsFigureProps = {
  model: ChartModel;
  verbsOf?: (month: string) => ReactNode;
};

/** Bars stacked by month, read by pointer and by keyboard. */
export const StackedMonthsFigure = ({ model, ...figure }: StackedMonthsFigureProps) => {
  const { layers, months } = useMemo(() => modelPicture(model), [model]);
  const names = useMemo(() => months.map(({ month }) => month), [months]);
  // A phone's part of the months must be the same list as long as the months are: the series register themselves anew.
  const last = useMemo(() => months.slice(-NARROW_MONTHS), [months]);
  return (
    <MonthsFigure
      {...figure}
      label={model.title}
      wordsOf={(month) => model.months.find((other) => other.month === month)?.words ?? ''}
      figureOf={(month) => model.open(month, model.total.key)}
      months={names}
      narrowMonths={NARROW_MONTHS}
      height={HEIGHT}
      legend={
        <ul className="mt-2 flex flex-wrap gap-x-4 gap-y-0.5 text-sm" aria-label="Colours">
          {layers.map(({ id, name, colour }) => (
            <li key={id} className="flex items-center gap-1.5">
              <span className="size-2.5 shrink-0" style={{ background: colour }} />
              {formatDesignation(name)}
            </li>
          ))}
        </ul>
      }
      draw={({ months: _, ...canvas }) => (
        <StackedMonths {...canvas} layers={layers} months={canvas.narrow ? last : months} notes={model.marks} />
      )}
    />
  );
};
