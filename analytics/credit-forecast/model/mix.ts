import { type MassHistory, routineTotals } from './history';

/** Months that the mix is learnt from, and after how many a month counts half. */
const WINDOW = 72;
const HALF_LIFE = 24;
/** Usual growth of a share's logarithm a month, before anything is seen: a third either way in a year. */
const USUAL_GROWTH = 0.03;
/** What is left of a share's growth a month later. */
const GROWTH_KEPT = 0.96;
const STEPS = 12;
/** A refrigerant that was not seen lately may come again: this part of a month a year. */
const LEAST_SHARE = 1e-5;

export type ShareTrend = {
  refrigerant: string;
  /** Logarithm of the share now and its growth a month; the shares of all are brought to 1 together. */
  logShare: number;
  growth: number;
  /** Standard errors of both. */
  logShareError: number;
  growthError: number;
  /** Variance of a month's mass over its mean, kg: the size of the portions that it comes in. */
  portionKg: number;
  /** Share of the months of the window without any. */
  emptyShare: number;
};

type Month = { age: number; weight: number; mass: number; total: number };

const monthsOf = (masses: readonly number[], totals: readonly (number | null)[]): Month[] =>
  masses.flatMap((mass, at) => {
    const total = totals[at];
    const age = masses.length - 1 - at;
    if (age >= WINDOW || total === null || total === undefined || total <= 0) return [];
    return [{ age, weight: 0.5 ** (age / HALF_LIFE), mass, total }];
  });

/**
 * Share and growth by a quasi-Poisson regression of the masses on time with a log link, each month by its weight and its
 * total, the growth held near 0 as far as the months do not speak. Newton's steps. McCullagh & Nelder (1989), Generalized
 * Linear Models, chapter 9.
 */
const fitShare = (refrigerant: string, months: readonly Month[]): ShareTrend => {
  const totalMass = months.reduce((sum, { weight, mass }) => sum + weight * mass, 0);
  const totalAll = months.reduce((sum, { weight, total }) => sum + weight * total, 0);
  const empty = months.filter(({ mass }) => mass === 0).length / Math.max(1, months.length);
  const plain = Math.max(LEAST_SHARE, totalAll > 0 ? totalMass / totalAll : 0);
  let [logShare, growth] = [Math.log(plain), 0];
  const meanTotal =
    totalAll /
    Math.max(
      1e-9,
      months.reduce((sum, { weight }) => sum + weight, 0),
    );
  let portionKg = meanTotal;
  let [levelError, growthError] = [1, USUAL_GROWTH];
  for (let step = 0; step < STEPS; step++) {
    let [squares, means] = [0, 0];
    for (const { age, weight, mass, total } of months) {
      const expected = total * Math.exp(logShare - growth * age);
      const share = Math.min(0.95, expected / total);
      squares += weight * (mass - expected) ** 2;
      means += weight * expected * (1 - share);
    }
    portionKg = means > 0 ? Math.max(squares / means, 1e-3) : meanTotal;
    // Score and information of (logShare, growth), in units of the portions.
    let [s0, s1, i00, i01, i11] = [0, -growth / USUAL_GROWTH ** 2, 0, 0, 1 / USUAL_GROWTH ** 2];
    for (const { age, weight, mass, total } of months) {
      const expected = total * Math.exp(logShare - growth * age);
      const pull = (weight * (mass - expected)) / portionKg;
      const information = (weight * expected) / portionKg;
      s0 += pull;
      s1 += -age * pull;
      i00 += information;
      i01 += -age * information;
      i11 += age * age * information;
    }
    // A bound on the level keeps a refrigerant of one or two jobs from running away.
    i00 += 0.05;
    s0 += -0.05 * (logShare - Math.log(plain));
    const determinant = i00 * i11 - i01 * i01;
    const [moveLevel, moveGrowth] = [(i11 * s0 - i01 * s1) / determinant, (i00 * s1 - i01 * s0) / determinant];
    const brake = Math.min(1, 1 / Math.max(Math.abs(moveLevel), 20 * Math.abs(moveGrowth)));
    logShare += brake * moveLevel;
    growth += brake * moveGrowth;
    levelError = Math.sqrt(i11 / determinant);
    growthError = Math.sqrt(i00 / determinant);
  }
  return {
    refrigerant,
    logShare,
    growth,
    logShareError: Math.min(1, levelError),
    growthError: Math.min(USUAL_GROWTH, growthError),
    portionKg,
    emptyShare: empty,
  };
};

/** How the routine mass divides among refrigerants and where that moves. */
export const shareTrends = (history: MassHistory): ShareTrend[] => {
  const totals = routineTotals(history);
  return [...history.routineKg].map(([refrigerant, masses]) => fitShare(refrigerant, monthsOf(masses, totals)));
};

/** Months of growth that still count `step` months ahead: it wears off. */
export const growthMonths = (step: number): number => (GROWTH_KEPT * (1 - GROWTH_KEPT ** step)) / (1 - GROWTH_KEPT);

/** Shares of all refrigerants `step` months ahead; they add up to 1. */
export const sharesAhead = (trends: readonly ShareTrend[], step: number): number[] => {
  const raw = trends.map(({ logShare, growth }) => Math.exp(logShare + growth * growthMonths(step)));
  const all = raw.reduce((sum, share) => sum + share, 0);
  return raw.map((share) => (all > 0 ? share / all : 1 / raw.length));
};
