import { mean } from 'simple-statistics';
import { type EtsFit, fitEts } from '@/analytics/statistics/forecast/ets/fit';
import { continueEts } from '@/analytics/statistics/forecast/ets/smooth';
import { simpleSmoothing } from '@/analytics/statistics/forecast/exponential-smoothing';
import { theta } from '@/analytics/statistics/forecast/theta';

const YEAR = 12;
/** Months from which on a trend is tried. */
const TREND_NEEDS = 48;
const THETA_NEEDS = 36;
const SMOOTHING_NEEDS = 12;

/** Points ahead from routine masses without season, or null where there are too few. */
type LevelMethod = (masses: readonly number[], horizon: number) => number[] | null;

const level = (value: number, horizon: number): number[] => Array.from({ length: horizon }, () => Math.max(0, value));

const recentMean =
  (months: number): LevelMethod =>
  (masses, horizon) =>
    masses.length === 0 ? null : level(mean(masses.slice(-months)), horizon);

const smoothed: LevelMethod = (masses, horizon) => {
  if (masses.length < SMOOTHING_NEEDS) return null;
  const fit = simpleSmoothing(masses);
  return fit.enough ? level(fit.value.run.end.level, horizon) : null;
};

const DAMPED = { error: 'A', trend: 'A', damped: true, season: 'N', period: 1 } as const;

/**
 * A damped trend of log(mass + c). Its exponential would be a median and sum to too little, so it is brought to the mean
 * by what masses were of their fitted medians: the smearing estimate of Duan (1983), Journal of the American Statistical
 * Association 78, 605-610.
 */
const dampedTrend: LevelMethod = (masses, horizon) => {
  const average = masses.length === 0 ? 0 : mean([...masses]);
  if (masses.length < TREND_NEEDS || average === 0) return null;
  const offset = average / 20;
  const logs = masses.map((mass) => Math.log(mass + offset));
  const fit = fitEts(logs, DAMPED, { restarts: 1, tolerance: 1e-6 });
  if (!fit.enough) return null;
  const { model, weights, run }: EtsFit = fit.value;
  const smearing = mean(logs.map((log, at) => Math.exp(log - (run.fitted[at] ?? log))));
  return continueEts(model, weights, run.end, horizon).map((log) => Math.max(0, smearing * Math.exp(log) - offset));
};

const thetaLevel: LevelMethod = (masses, horizon) => {
  if (masses.length < THETA_NEEDS) return null;
  const ahead = theta(masses, 1, horizon);
  return ahead.enough ? ahead.value.mean.map((point) => Math.max(0, point)) : null;
};

export const LEVEL_METHODS = {
  'last twelve months': recentMean(YEAR),
  'smoothed level': smoothed,
  'damped trend': dampedTrend,
  theta: thetaLevel,
} as const satisfies Record<string, LevelMethod>;
export type LevelMethodName = keyof typeof LEVEL_METHODS;
export type ChosenMethod = LevelMethodName | 'combination';

/** What each method says; those with too few months are left out. */
export const levelForecasts = (masses: readonly number[], horizon: number): Map<LevelMethodName, number[]> => {
  const all = new Map<LevelMethodName, number[]>();
  for (const [name, method] of Object.entries(LEVEL_METHODS)) {
    const points = method(masses, horizon);
    // The keys of the constant above are exactly the names.
    if (points) all.set(name as LevelMethodName, points);
  }
  return all;
};

/** The mean of all methods, month by month: hard to beat. Makridakis, Spiliotis & Assimakopoulos (2020), IJF 36. */
export const combined = (forecasts: ReadonlyMap<LevelMethodName, readonly number[]>, horizon: number): number[] =>
  Array.from({ length: horizon }, (_, step) => {
    const points = [...forecasts.values()].map((points) => points[step] ?? 0);
    return points.length === 0 ? 0 : mean(points);
  });
