import { requireFinite } from '../checked';

/** A value a step (a month), null where there is none. */
export type GappySeries = readonly (number | null)[];

/** Rises less falls over all pairs of values, and the variance that this has if there is no trend. */
export type KendallScore = { score: number; variance: number };

const present = (series: GappySeries): number[] => {
  const values = series.filter((value) => value !== null);
  requireFinite(values, 'The values of the series');
  return values;
};

/** Sizes of the groups of equal values. */
const tieSizes = (values: readonly number[]): number[] => {
  const sizes = new Map<number, number>();
  for (const value of values) sizes.set(value, (sizes.get(value) ?? 0) + 1);
  return [...sizes.values()];
};

const spread = (size: number): number => size * (size - 1) * (2 * size + 5);

/** How many values are there. */
export const countOf = (series: GappySeries): number => present(series).length;

/** Kendall's S with its variance corrected for ties. Kendall, Rank Correlation Methods, 4th ed. (1975), chapter 4. */
export const kendallScore = (series: GappySeries): KendallScore => {
  const values = present(series);
  let score = 0;
  values.forEach((later, index) => {
    for (const earlier of values.slice(0, index)) score += Math.sign(later - earlier);
  });
  const tied = tieSizes(values).reduce((sum, size) => sum + spread(size), 0);
  return { score, variance: (spread(values.length) - tied) / 18 };
};

/** Standard score with the correction for a score that moves in steps; 0 where nothing can be told. */
export const standardised = ({ score, variance }: KendallScore): number =>
  variance > 0 ? (score - Math.sign(score)) / Math.sqrt(variance) : 0;
