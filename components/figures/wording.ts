import { SCOPE_PARTS } from '@/analytics/dimensions';
import type { FigureScope } from '@/analytics/figures/figure';
import type { Measure } from '@/analytics/figures/measures';
import { partPhrase, periodPhrase } from '@/components/scope/wording';
import { formatCount, formatMassWithUnit, formatNumber, formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

/** What each measure is called at the head of its panel. */
export const MEASURE_NAMES: Record<Measure, string> = {
  recoveredMass: 'Recovered mass',
  recoveries: 'Recoveries',
  fullCharge: 'Full charge',
  totalYield: 'Total yield',
  medianYield: 'Median yield',
  co2e: 'CO₂-equivalent kept from the air',
  co2eAr6: 'CO₂-equivalent kept from the air, by AR6',
  appliances: 'Appliances',
  flagged: 'Flagged',
  farBelow: 'Far below like jobs',
  routineMass: 'Recovered mass of routine jobs',
  heldShare: 'Held',
  downToLevelShare: 'Down to level',
};

const KG_PER_TONNE = 1000;

/** CO2-equivalent is spoken of in tonnes, whatever masses are read in. */
export const formatCo2e = (kg: number): string =>
  `${formatNumber(kg / KG_PER_TONNE, kg < 100 * KG_PER_TONNE ? 1 : 0)}\u00a0t`;

/** The value of a measure with its unit; a dash where there is none. */
export const formatMeasure = (measure: Measure, value: number | null, unit: DisplayUnit): string => {
  if (value === null) return '—';
  switch (measure) {
    case 'recoveredMass':
    case 'fullCharge':
    case 'routineMass':
      return formatMassWithUnit(value, unit);
    case 'co2e':
    case 'co2eAr6':
      return formatCo2e(value);
    case 'totalYield':
    case 'medianYield':
    case 'heldShare':
    case 'downToLevelShare':
      return formatPercent(value, 1);
    default:
      return formatCount(value);
  }
};

/** The scope of a figure in words, parts that narrow nothing left out: `November 2026, R‑22, East`. */
export const figureScopePhrase = (scope: FigureScope): string =>
  [periodPhrase(scope), ...SCOPE_PARTS.flatMap((part) => (scope[part].length ? [partPhrase(scope, part)] : []))].join(
    ', ',
  );
