import type { ReactNode } from 'react';
import type { Measure } from '@/analytics/figures/measures';
import type { Comparison, PeriodFigures, TrendsComparison } from '@/analytics/trends-comparison/contract';
import { formatChange, formatCount, formatMass, formatNumber, formatPercent } from '@/lib/format';
import type { TermId } from '@/lib/glossary/terms';
import type { DisplayUnit } from '@/lib/vocabulary';
import { pointsWords } from './wording';

/** One line of the comparison: the figure of each side, how it changed, and what is said in small. */
export type ComparisonRow = {
  label: ReactNode;
  /** What the label means, in the glossary. */
  term?: TermId;
  /** What a side's figure measures, where it opens. */
  measure?: Measure;
  figure: (side: PeriodFigures) => string;
  /** What the figure is a part of, or what it lacks. */
  small?: (side: PeriodFigures) => string;
  change: string;
  changeSmall?: string;
};

const NOTHING = '—';
const KG_PER_TONNE = 1000;

const ratioChange = (now: number, before: number): string => (before > 0 ? formatChange(now / before - 1) : NOTHING);
const share = (value: number | null, digits = 0): string => (value === null ? NOTHING : formatPercent(value, digits));
const pointsChange = (now: number | null, before: number | null): string =>
  now === null || before === null ? NOTHING : pointsWords(now - before);

/** How the figures are read: the unit, whose GWP, and whether like jobs may be looked into. */
export type ComparisonLook = {
  unit: DisplayUnit;
  gwp: TrendsComparison['gwp'];
  co2eLabel: ReactNode;
  mayLook: boolean;
};

/** Every figure of the two periods, in the order in which they are asked for. */
export const comparisonRows = (
  { now, before, ratio }: Comparison,
  { unit, gwp, co2eLabel, mayLook }: ComparisonLook,
): ComparisonRow[] => [
  {
    label: `Recovered mass, ${unit}`,
    term: 'recovered-mass',
    measure: 'recoveredMass',
    figure: ({ recoveredMass }) => formatMass(recoveredMass, unit, 0),
    change: ratioChange(now.recoveredMass, before.recoveredMass),
    ...(ratio ? { changeSmall: `likely ${formatChange(ratio.low - 1)} to ${formatChange(ratio.high - 1)}` } : {}),
  },
  {
    label: 'Recoveries',
    measure: 'recoveries',
    figure: ({ recoveries }) => formatCount(recoveries),
    change: ratioChange(now.recoveries, before.recoveries),
  },
  {
    label: 'Total yield',
    term: 'total-yield',
    measure: 'totalYield',
    figure: ({ totalYield }) => share(totalYield, 1),
    change: pointsChange(now.totalYield, before.totalYield),
  },
  {
    label: 'Median yield',
    term: 'median-yield',
    measure: 'medianYield',
    figure: ({ medianYield }) => share(medianYield, 1),
    change: pointsChange(now.medianYield, before.medianYield),
  },
  {
    label: 'Held',
    term: 'hold',
    measure: 'heldShare',
    figure: ({ heldShare }) => share(heldShare),
    small: ({ holdStated }) => `of ${formatCount(holdStated)} that state it`,
    change: pointsChange(now.heldShare, before.heldShare),
  },
  {
    label: 'Down to level',
    term: 'down-to-level',
    measure: 'downToLevelShare',
    figure: ({ downToLevelShare }) => share(downToLevelShare),
    small: ({ vacuumStated }) => `of ${formatCount(vacuumStated)} that state a vacuum`,
    change: pointsChange(now.downToLevelShare, before.downToLevelShare),
  },
  {
    label: 'Flagged',
    term: 'flagged',
    ...(mayLook ? { measure: 'flagged' as const } : {}),
    figure: ({ flagged }) => formatCount(flagged),
    small: ({ flaggedShare }) => `${share(flaggedShare, 1)} of the recoveries`,
    change: pointsChange(now.flaggedShare, before.flaggedShare),
  },
  {
    label: co2eLabel,
    measure: gwp === 'ar4' ? 'co2e' : 'co2eAr6',
    figure: ({ co2e }) => formatNumber(co2e / KG_PER_TONNE, co2e < 100 * KG_PER_TONNE ? 1 : 0),
    small: ({ massWithoutGwp }) =>
      massWithoutGwp > 0 ? `without ${formatMass(massWithoutGwp, unit, 0)} ${unit} of no known GWP` : '',
    change: ratioChange(now.co2e, before.co2e),
  },
];
