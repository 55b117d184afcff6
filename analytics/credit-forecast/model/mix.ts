import { type MassHistory, routineTotals } from './history';

/** Months that the mix is learnt from, and after how many a month counts half. */
const WINDOW = 72;
const HALF_LIFE = 24;
/** Usual growth of a share's logarithm a month, before anything is seen: a third either way in a year. */
const USUAL_GROWTH = 0.03;
/** What is left of a share's growth a month later. */
const GROWTH_KEPT = 0.96;
const STEPS = 12;
/** A refrigerant that was not seen lately may come again. */
const LEAST_SHARE = 1e-5;
const MOST_SHARE = 0.95;
const LEAST_PORTION_KG = 1e-3;
/** Information that holds a level where it was: a refrigerant of one or two jobs must not run away. */
const LEVEL_HOLD = 0.05;

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

type Line = { logShare: number; growth: number };

const expectedKg = ({ total, age }: Month, { logShare, growth }: Line): number =>
  total * Math.exp(logShare - growth * age);

/** Variance of a month's mass over its mean about a line: Pearson's dispersion, for a part of a whole. */
const portionAbout = (months: readonly Month[], line: Line, fallback: number): number => {
  let [squares, means] = [0, 0];
  for (const month of months) {
    const expected = expectedKg(month, line);
    const share = Math.min(MOST_SHARE, expected / month.total);
    squares += month.weight * (month.mass - expected) ** 2;
    means += month.weight * expected * (1 - share);
  }
  return means > 0 ? Math.max(squares / means, LEAST_PORTION_KG) : fallback;
};

/** Gradient and information of level and growth; both are held near what they were before, more or less firmly. */
const slopesAt = (months: readonly Month[], line: Line, usual: Line, portionKg: number) => {
  let [level, growth] = [
    LEVEL_HOLD * (usual.logShare - line.logShare),
    (usual.growth - line.growth) / USUAL_GROWTH ** 2,
  ];
  let [levelInformation, shared, growthInformation] = [LEVEL_HOLD, 0, 1 / USUAL_GROWTH ** 2];
  for (const month of months) {
    const { age, weight, mass } = month;
    const expected = expectedKg(month, line);
    const pull = (weight * (mass - expected)) / portionKg;
    const information = (weight * expected) / portionKg;
    level += pull;
    growth -= age * pull;
    levelInformation += information;
    shared -= age * information;
    growthInformation += age * age * information;
  }
  const determinant = levelInformation * growthInformation - shared * shared;
  return {
    levelStep: (growthInformation * level - shared * growth) / determinant,
    growthStep: (levelInformation * growth - shared * level) / determinant,
    levelError: Math.sqrt(growthInformation / determinant),
    growthError: Math.sqrt(levelInformation / determinant),
  };
};

const weightedSum = (months: readonly Month[], of: (month: Month) => number): number =>
  months.reduce((sum, month) => sum + month.weight * of(month), 0);

/**
 * Share and growth by a quasi-Poisson regression of the masses on time with a log link, each month by its weight and its
 * total, the growth held near 0 as far as the months do not speak. Newton's steps, none larger than a change of the share
 * by a factor of e. McCullagh & Nelder (1989), Generalized Linear Models, chapter 9.
 */
const fitShare = (refrigerant: string, months: readonly Month[]): ShareTrend => {
  const all = weightedSum(months, ({ total }) => total);
  const share = all > 0 ? weightedSum(months, ({ mass }) => mass) / all : 0;
  const usual: Line = { logShare: Math.log(Math.max(LEAST_SHARE, share)), growth: 0 };
  const usualKg = months.length > 0 ? all / weightedSum(months, () => 1) : 1;
  let line = usual;
  let portionKg = usualKg;
  let [levelError, growthError] = [1, USUAL_GROWTH];
  for (let step = 0; step < STEPS; step++) {
    portionKg = portionAbout(months, line, usualKg);
    const slopes = slopesAt(months, line, usual, portionKg);
    const brake = Math.min(1, 1 / Math.max(Math.abs(slopes.levelStep), 20 * Math.abs(slopes.growthStep)));
    line = { logShare: line.logShare + brake * slopes.levelStep, growth: line.growth + brake * slopes.growthStep };
    [levelError, growthError] = [slopes.levelError, slopes.growthError];
  }
  return {
    refrigerant,
    ...line,
    logShareError: Math.min(1, levelError),
    growthError: Math.min(USUAL_GROWTH, growthError),
    portionKg,
    emptyShare: months.filter(({ mass }) => mass === 0).length / Math.max(1, months.length),
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
