import type { GappySeries } from '@/analytics/statistics/trend/kendall-score';

const MONTHS = 12;
/** Full months before which no season can be told from chance. */
export const SEASON_NEEDS = 24;
/** Waves of a year, a half and a third: what twelve noisy months can tell. */
const WAVES = 3;
const LEAST_FACTOR = 0.1;

/** Mean over the year about a month, its two ends counting half; lost months are left out. */
const yearAbout = (values: GappySeries, at: number): number | null => {
  let [sum, weight] = [0, 0];
  for (let step = -MONTHS / 2; step <= MONTHS / 2; step++) {
    const value = values[at + step];
    if (value === undefined) return null;
    const share = Math.abs(step) === MONTHS / 2 ? 0.5 : 1;
    if (value === null) continue;
    sum += share * value;
    weight += share;
  }
  return weight > 0 ? sum / weight : null;
};

/** What each month was of the year about it, by month of the year. */
const ratiosByMonth = (values: GappySeries, firstMonthOfYear: number): number[][] => {
  const ratios = Array.from({ length: MONTHS }, (): number[] => []);
  values.forEach((value, at) => {
    const level = yearAbout(values, at);
    if (value !== null && level !== null && level > 0) ratios[(firstMonthOfYear + at) % MONTHS]?.push(value / level);
  });
  return ratios;
};

const meanOf = (values: readonly number[]): number =>
  values.length === 0 ? 1 : values.reduce((sum, value) => sum + value, 0) / values.length;

const toMeanOne = (factors: readonly number[]): number[] => {
  const level = meanOf(factors);
  return factors.map((factor) => factor / level);
};

/**
 * Twelve factors that average 1, January first: the ratios to the year about each month, smoothed by up to `waves`
 * waves (a year, a half, a third), each kept as far as it stands out from chance (positive-part James-Stein: Efron & Morris (1973),
 * Journal of the American Statistical Association 68, 117-130). All 1 before there are two years.
 */
export const seasonFactors = (values: GappySeries, firstMonthOfYear: number, waves = WAVES): number[] => {
  const flat = Array.from({ length: MONTHS }, () => 1);
  if (values.filter((value) => value !== null).length < SEASON_NEEDS) return flat;
  const ratios = ratiosByMonth(values, firstMonthOfYear);
  const means = ratios.map(meanOf);
  const count = ratios.reduce((sum, own) => sum + own.length, 0);
  const squares = ratios.reduce(
    (sum, own, month) => sum + own.reduce((inner, ratio) => inner + (ratio - (means[month] ?? 1)) ** 2, 0),
    0,
  );
  // Variance of a month's mean ratio, and of an amplitude fitted to twelve of them.
  const noise = squares / Math.max(1, count - MONTHS) / Math.max(1, count / MONTHS);
  const amplitudeNoise = (2 * noise) / MONTHS;

  const factors = flat.map(() => 1);
  for (let wave = 1; wave <= waves; wave++) {
    const turn = (month: number) => (2 * Math.PI * wave * month) / MONTHS;
    const cosine = means.reduce((sum, mean, month) => sum + ((mean - 1) * Math.cos(turn(month)) * 2) / MONTHS, 0);
    const sine = means.reduce((sum, mean, month) => sum + ((mean - 1) * Math.sin(turn(month)) * 2) / MONTHS, 0);
    const power = cosine ** 2 + sine ** 2;
    const kept = power > 0 ? Math.max(0, 1 - (2 * amplitudeNoise) / power) : 0;
    factors.forEach((factor, month) => {
      factors[month] = factor + kept * (cosine * Math.cos(turn(month)) + sine * Math.sin(turn(month)));
    });
  }
  return toMeanOne(factors.map((factor) => Math.max(LEAST_FACTOR, factor)));
};

/** How much of the routine season large jobs are taken to have before they show one themselves: chillers run in summer, racks do not. */
const BORROWED = 0.75;

/**
 * The season of something rare: that of routine jobs in part, and a yearly wave of its own about it where its counts show
 * one. A dozen jobs a year would otherwise make a season out of chance.
 */
export const borrowedSeason = (
  counts: GappySeries,
  routineSeason: readonly number[],
  firstMonthOfYear: number,
): number[] => {
  const borrowed = routineSeason.map((factor) => 1 + BORROWED * (factor - 1));
  const bare = counts.map((count, at) =>
    count === null ? null : count / (borrowed[(firstMonthOfYear + at) % MONTHS] ?? 1),
  );
  const own = seasonFactors(bare, firstMonthOfYear, 1);
  return toMeanOne(borrowed.map((factor, month) => factor * (own[month] ?? 1)));
};
