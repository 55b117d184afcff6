import type { GappySeries } from '@/analytics/statistics/trend/kendall-score';
import { type MassHistory, monthOfYear, routineTotals } from './history';
import { type ChosenMethod, combined, levelForecasts } from './level-methods';
import { seasonFactors } from './season';

/** Routine masses without season, gaps bridged for the fit only. */
export type Deseasonalised = { season: number[]; masses: number[]; gaps: number };

const bridged = (values: GappySeries): number[] => {
  const known = values.flatMap((value, at) => (value === null ? [] : [{ at, value }]));
  return values.map((value, at) => {
    if (value !== null) return value;
    const before = known.findLast((point) => point.at < at);
    const after = known.find((point) => point.at > at);
    return ((before ?? after)?.value ?? 0) / 2 + ((after ?? before)?.value ?? 0) / 2;
  });
};

/** Takes the season out of a company's routine masses. */
export const deseasonalise = (history: MassHistory): Deseasonalised => {
  const totals = routineTotals(history);
  const season = seasonFactors(totals, history.firstMonthOfYear);
  const bare = totals.map((mass, at) => (mass === null ? null : mass / (season[monthOfYear(history, at)] ?? 1)));
  return { season, masses: bridged(bare), gaps: totals.filter((mass) => mass === null).length };
};

/** Kg ahead by each method and by their combination, season put back. */
export const routineForecasts = (
  history: MassHistory,
  { season, masses }: Deseasonalised,
  horizon: number,
): Map<ChosenMethod, number[]> => {
  const withSeason = (points: readonly number[]) =>
    points.map((point, step) => point * (season[monthOfYear(history, history.months + step)] ?? 1));
  const levels = levelForecasts(masses, horizon);
  const all = new Map<ChosenMethod, number[]>();
  for (const [name, points] of levels) all.set(name, withSeason(points));
  all.set('combination', withSeason(combined(levels, horizon)));
  return all;
};
