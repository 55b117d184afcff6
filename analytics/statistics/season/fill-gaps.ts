import { mean } from 'simple-statistics';
import { requireFinite, requireWhole } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';
import type { GappySeries } from '../trend/kendall-score';

export type FilledSeries = { values: number[]; filled: boolean[] };

/** Straight lines across what is missing; beyond the first and last value, level with them. */
const bridge = (series: GappySeries): number[] => {
  const known = series.flatMap((value, at) => (value === null ? [] : [{ at, value }]));
  return series.map((value, at) => {
    if (value !== null) return value;
    const before = known.findLast((point) => point.at < at);
    const after = known.find((point) => point.at > at);
    if (!before || !after) return (before ?? after)?.value ?? 0;
    return before.value + ((after.value - before.value) * (at - before.at)) / (after.at - before.at);
  });
};

/**
 * Missing values put in for a fit only, to be drawn hollow: a straight line between their neighbours after the season is
 * taken out, and the season put back. Needs two values for every position of the period.
 */
export const fillGaps = (series: GappySeries, period: number): Estimate<FilledSeries> => {
  requireWhole(period, 'The period', 2);
  const known = series.filter((value) => value !== null);
  requireFinite(known, 'The values of the series');
  const phases = Array.from({ length: period }, (_, phase) =>
    series.flatMap((value, at) => (at % period === phase && value !== null ? [value] : [])),
  );
  const fewest = Math.min(...phases.map((phase) => phase.length));
  if (fewest < 2) return tooFew(2, fewest, 'values for every month of the year');

  // A trend would tilt plain means of the months, so they are taken about a first line through the gaps.
  const level = bridge(series);
  const around = level.map((_, at) => mean(level.slice(Math.max(0, at - period + 1), at + period)));
  const season = phases.map((_, phase) =>
    mean(series.flatMap((value, at) => (at % period === phase && value !== null ? [value - (around[at] ?? 0)] : []))),
  );
  const bare = bridge(series.map((value, at) => (value === null ? null : value - (season[at % period] ?? 0))));
  return enough({
    values: bare.map((value, at) => series[at] ?? value + (season[at % period] ?? 0)),
    filled: series.map((value) => value === null),
  });
};
