import { requireProbability } from '../checked';

/** Probabilities from the least to the most, with the places they came from. */
const ranked = (ps: readonly number[]) => {
  for (const p of ps) requireProbability(p, 'A probability');
  return ps.map((p, place) => ({ p, place })).sort((a, b) => a.p - b.p);
};

const inPlace = (adjusted: { p: number; place: number }[]): number[] => {
  const out = new Array<number>(adjusted.length).fill(1);
  for (const { p, place } of adjusted) out[place] = Math.min(1, p);
  return out;
};

/** Running least from the most down: a p may not be adjusted above a larger one. */
const stepUp = (ps: readonly number[], factor: (rank: number) => number): number[] => {
  let least = 1;
  const adjusted = ranked(ps).map(({ p, place }, index) => ({ p: p * factor(index + 1), place }));
  return inPlace(
    adjusted.reverse().map(({ p, place }) => {
      least = Math.min(least, p);
      return { p: least, place };
    }),
  );
};

/**
 * Adjusted p-values that hold the share of false ones among those picked, in their order: at most q chosen means a false
 * discovery rate of at most q. Benjamini & Hochberg (1995), JRSS B 57, 289-300.
 */
export const benjaminiHochberg = (ps: readonly number[]): number[] => stepUp(ps, (rank) => ps.length / rank);

/** The same under any dependence between the tests. Benjamini & Yekutieli (2001), Annals of Statistics 29, 1165-1188. */
export const benjaminiYekutieli = (ps: readonly number[]): number[] => {
  const harmonic = ps.reduce((sum, _, index) => sum + 1 / (index + 1), 0);
  return stepUp(ps, (rank) => (harmonic * ps.length) / rank);
};

/** Adjusted p-values that hold the chance of a single false one. Hochberg (1988), Biometrika 75, 800-802. */
export const hochberg = (ps: readonly number[]): number[] => stepUp(ps, (rank) => ps.length - rank + 1);

/** The same under any dependence. Holm (1979), Scandinavian Journal of Statistics 6, 65-70. */
export const holm = (ps: readonly number[]): number[] => {
  let most = 0;
  return inPlace(
    ranked(ps).map(({ p, place }, index) => {
      most = Math.max(most, p * (ps.length - index));
      return { p: most, place };
    }),
  );
};

/** The plainest of them: every p times how many there are. */
export const bonferroni = (ps: readonly number[]): number[] =>
  inPlace(ranked(ps).map(({ p, place }) => ({ p: p * ps.length, place })));
