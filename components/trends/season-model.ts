import type { ShownPattern, ShownPatternMonth } from '@/analytics/monthly-pattern/contract';
import { isUnusual, unusualWord } from '@/analytics/monthly-pattern/sentence';
import type { ScopeSelection } from '@/analytics/scope-address';
import { type ChartColumn, type ChartModel, shownValue } from '@/components/charts/model';
import type { SeasonMonth } from '@/components/charts/season-months';
import { figureScopePhrase } from '@/components/figures/wording';
import { formatMass, formatMassWithUnit, formatMonth, formatNumber } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

/** A season shows itself over three years, whatever part of them the scope asks for. */
const LEAST_SHOWN = 36;

/** The months to be shown: those of the scope, and at least the last three years of the fit. */
const shownMonths = ({ months }: ShownPattern, from: string | null): ShownPatternMonth[] => {
  const asked = from ? months.findIndex(({ month }) => month >= from.slice(0, 7)) : 0;
  const least = Math.max(0, months.length - LEAST_SHOWN);
  return months.slice(asked < 0 ? least : Math.min(asked, least));
};

const verdict = (month: ShownPatternMonth): string => {
  if (!month.counts) return 'too few to judge';
  return isUnusual(month) ? unusualWord(month) : '';
};

const inWords = (month: ShownPatternMonth, unit: DisplayUnit): string => {
  const usual = `usual is ${formatMass(month.low, unit, 0)} to ${formatMassWithUnit(month.high, unit, 0)}`;
  const said = verdict(month);
  return `${formatMonth(month.month)}: ${formatMassWithUnit(month.recoveredMass, unit, 0)}, ${usual}; trend ${formatMassWithUnit(month.trend, unit, 0)}, season × ${formatNumber(month.seasonFactor, 2)}${said ? `; ${said}` : ''}.`;
};

/** Season and trend as one model: what picture, table, reading and files show. */
export const seasonModel = (pattern: ShownPattern, scope: ScopeSelection): ChartModel => {
  const months = shownMonths(pattern, scope.from);
  const column = (
    key: keyof ShownPatternMonth,
    label: string,
    kind: ChartColumn['kind'],
    of: (month: ShownPatternMonth) => number,
  ): ChartColumn => ({ key, label, kind, values: months.map(of) });
  return {
    title: 'Season and trend by month',
    scopeWords: `${figureScopePhrase(scope)}; routine jobs`,
    unit: scope.unit,
    plainState: 'usual',
    months: months.map((month) => ({
      month: month.month,
      // Whole months only: the running one and a cut one are left out of the fit.
      state: month.counts ? 'whole' : 'cut',
      stateWord: verdict(month),
      words: inWords(month, scope.unit),
      notes: [],
    })),
    series: [],
    total: column('recoveredMass', 'Recovered', 'mass', ({ recoveredMass }) => recoveredMass),
    overlays: [],
    beside: [
      column('trend', 'Trend', 'mass', ({ trend }) => trend),
      column('seasonFactor', 'Season, times', 'factor', ({ seasonFactor }) => seasonFactor),
      column('low', 'Usual from', 'mass', ({ low }) => low),
      column('high', 'Usual to', 'mass', ({ high }) => high),
    ],
    marks: [],
    open: (month, key) =>
      key === 'recoveredMass' ? { measure: 'routineMass', scope: { ...scope, from: month, to: month } } : null,
  };
};

/** What the picture of a season's model draws, in the viewer's unit. */
export const seasonPicture = ({ months, total, beside, unit, plainState }: ChartModel): SeasonMonth[] =>
  months.map(({ month, state, stateWord }, index) => {
    const of = (key: keyof ShownPatternMonth) => {
      const column = [total, ...beside].find((other) => other.key === key);
      return shownValue(column?.values[index] ?? null, 'mass', unit) ?? 0;
    };
    return {
      month,
      observed: of('recoveredMass'),
      trend: of('trend'),
      low: of('low'),
      high: of('high'),
      counts: state === 'whole',
      unusual: state === 'whole' && stateWord !== '' && stateWord !== plainState,
    };
  });
