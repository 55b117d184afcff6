'use client';

import { useMemo } from 'react';
import type { Coaching } from '@/analytics/coaching/contract';
import { everyMonth } from '@/analytics/monthly-trends/series';
import type { ScopeSelection } from '@/analytics/scope-address';
import type { TechnicianPerson } from '@/analytics/technician-person/contract';
import { MonthsFigure } from '@/components/charts/months-figure';
import { RunMonths } from '@/components/charts/run-months';
import { Sheet } from '@/components/ui/sheet';
import { formatMonth, formatPoints, plural } from '@/lib/format';
import { effectOf } from '../wording';

const HEIGHT = { wide: 320, narrow: 280 } as const;
const NARROW_MONTHS = 14;

type Judgement = NonNullable<TechnicianPerson['judgement']>;
type Course = NonNullable<TechnicianPerson['course']>;

type RunSheetProps = {
  judgement: Judgement;
  course: Course;
  coachings: readonly Coaching[];
  /** The technician's own part of a scope, for the records behind a month. */
  own: ScopeSelection;
};

const asPoints = (share: number): number => 100 * share;

/** Month after month against like jobs, with what was agreed and found marked on its day. */
export const RunSheet = ({ judgement, course, coachings, own }: RunSheetProps) => {
  const months = useMemo(() => everyMonth(course.months[0]?.month ?? '', course.months.at(-1)?.month ?? ''), [course]);
  const values = useMemo(
    () =>
      course.months.map(({ month, effect, low, high, counts }) => ({
        month,
        value: asPoints(effect),
        low: asPoints(low),
        high: asPoints(high),
        counts,
      })),
    [course],
  );
  const marks = [
    ...coachings.map(({ startedOn }) => ({ day: startedOn, label: 'Coaching' })),
    ...(judgement.scale ? [{ day: judgement.scale.from, label: 'Scale in doubt' }] : []),
    ...(judgement.workChange ? [{ day: judgement.workChange.from, label: 'Work changed' }] : []),
  ];
  const wordsOf = (name: string): string => {
    const month = course.months.find((one) => one.month === name);
    if (!month) return `${formatMonth(name)}: no job.`;
    const range = `likely range ${formatPoints(asPoints(month.low))} to ${formatPoints(asPoints(month.high))}`;
    const thin = month.counts ? '' : '; too few jobs to say anything';
    return `${formatMonth(name)}: ${formatPoints(asPoints(month.effect))} points against like jobs, ${range}, ${plural(month.jobs, 'job', 'jobs')}${thin}.`;
  };
  return (
    <Sheet title="Month by month" aside="points of nameplate against like jobs; the band is the whole with its range">
      <MonthsFigure
        label="Month by month against like jobs"
        months={months}
        narrowMonths={NARROW_MONTHS}
        height={HEIGHT}
        wordsOf={wordsOf}
        figureOf={(month) => ({ measure: 'recoveries', scope: { ...own, from: month, to: month } })}
        draw={({ months: shown, ...canvas }) => (
          <RunMonths
            {...canvas}
            months={shown}
            values={values.filter(({ month }) => shown.includes(month))}
            marks={marks}
            overall={effectOf(judgement)}
            formatValue={(value) => formatPoints(value, 0)}
          />
        )}
      />
    </Sheet>
  );
};
