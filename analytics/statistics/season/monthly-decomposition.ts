import { mean } from 'simple-statistics';
import { type Estimate, enough, tooFew } from '../estimate';
import { countOf, type GappySeries } from '../trend/kendall-score';
import { fillGaps } from './fill-gaps';
import { stl } from './stl';
import { seasonWindowFor } from './stl-options';
import { STEADY_SEASON, strengths } from './strength';

const MONTHS = 12;
/** Full months before which only a comparison with the year before is shown. */
export const DECOMPOSITION_NEEDS = 24;

export type MonthlyDecomposition = {
  /** Mass a month without season and chance, in the unit of the masses. */
  trend: number[];
  /** Times the trend: 1.2 is a fifth above it. */
  seasonFactor: number[];
  /** What neither explains, as a factor of trend and season. */
  remainderFactor: number[];
  /** Months that were missing and were filled for the fit only. */
  filled: boolean[];
  /** What was added to each mass before its logarithm, in the unit of the masses; factors are of mass + offset. */
  offset: number;
  /** How much of what moves is season, 0 to 1, and whether that is enough to speak of one. */
  seasonStrength: number;
  steady: boolean;
};

/**
 * Season and trend of monthly masses: robust STL of log(mass + c), c a twentieth of the mean so that a month of nothing
 * has a logarithm; null is a month known to be lost. Factors are of mass + c. One season for all years until there are
 * five, then one that may change. Pass full months only. Cleveland et al. (1990).
 */
export const decomposeMonths = (masses: GappySeries): Estimate<MonthlyDecomposition> => {
  const known = masses.filter((mass) => mass !== null);
  const count = countOf(masses);
  if (known.some((mass) => mass < 0)) throw new RangeError('Masses must be at least 0');
  if (count < DECOMPOSITION_NEEDS) return tooFew(DECOMPOSITION_NEEDS, count, 'full months');
  const offset = mean(known) / 20;
  if (offset === 0) return tooFew(1, 0, 'months with mass');

  const logs = fillGaps(
    masses.map((mass) => (mass === null ? null : Math.log(mass + offset))),
    MONTHS,
  );
  if (!logs.enough) return logs;
  const { values, filled } = logs.value;
  const seasonWindow = seasonWindowFor(values.length, MONTHS);
  const parts = stl(values, { period: MONTHS, seasonWindow, robust: true });
  if (!parts.enough) return parts;
  const seasonStrength = strengths(parts.value).season;
  return enough({
    trend: parts.value.trend.map((level) => Math.max(0, Math.exp(level) - offset)),
    seasonFactor: parts.value.season.map(Math.exp),
    remainderFactor: parts.value.remainder.map(Math.exp),
    filled,
    offset,
    seasonStrength,
    steady: seasonStrength >= STEADY_SEASON,
  });
};
