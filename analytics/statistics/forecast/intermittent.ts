import { mean, sampleVariance, sum } from 'simple-statistics';
import { requireFinite, requireProbability, requireWhole } from '../checked';
import { type Estimate, enough, tooFew } from '../estimate';

/** Limits of Syntetos, Boylan & Croston (2005), Journal of the Operational Research Society 56, 495-503. */
const MOST_REGULAR = { interval: 1.32, variation: 0.49 } as const;

export type DemandClass = 'smooth' | 'erratic' | 'intermittent' | 'lumpy';
export type DemandPattern = {
  /** Steps a demand: average demand interval, ADI. */
  interval: number;
  /** Squared coefficient of variation of the demands, CV²; null for a single one. */
  squaredVariation: number | null;
  /** Null where two demands are not there to tell. */
  kind: DemandClass | null;
};

/** Throws a RangeError on a demand below 0; gives the positions (from 0) and sizes of those above. */
const demandsOf = (values: readonly number[]): { at: number; size: number }[] => {
  requireFinite(values, 'Demands');
  if (values.some((value) => value < 0)) throw new RangeError('Demands must be at least 0');
  return values.flatMap((size, at) => (size > 0 ? [{ at, size }] : []));
};

/** How often something is asked for and how even the amounts are. Needs one demand. */
export const demandPattern = (values: readonly number[]): Estimate<DemandPattern> => {
  const sizes = demandsOf(values).map(({ size }) => size);
  if (sizes.length === 0) return tooFew(1, 0, 'demands');
  const interval = values.length / sizes.length;
  if (sizes.length < 2) return enough({ interval, squaredVariation: null, kind: null });
  const squaredVariation = sampleVariance(sizes) / mean(sizes) ** 2;
  const frequent = interval < MOST_REGULAR.interval;
  const even = squaredVariation < MOST_REGULAR.variation;
  const kind = frequent ? (even ? 'smooth' : 'erratic') : even ? 'intermittent' : 'lumpy';
  return enough({ interval, squaredVariation, kind });
};

export type CrostonForecast = { size: number; interval: number; perStep: number; unbiasedPerStep: number };

/**
 * Size of a demand over the steps between two, both smoothed at demands: Croston (1972), Operational Research Quarterly
 * 23, 289-303; times 1 − α/2 against its bias: Syntetos & Boylan (2005), International Journal of Forecasting 21,
 * 303-314. It never falls when demand ends. Needs one demand.
 */
export const croston = (values: readonly number[], alpha: number): Estimate<CrostonForecast> => {
  requireProbability(alpha, 'The weight');
  const demands = demandsOf(values);
  const [first, ...later] = demands;
  if (!first) return tooFew(1, 0, 'demands');
  let { size } = first;
  let interval = first.at + 1;
  let last = first.at;
  for (const demand of later) {
    size += alpha * (demand.size - size);
    interval += alpha * (demand.at - last - interval);
    last = demand.at;
  }
  const perStep = size / interval;
  return enough({ size, interval, perStep, unbiasedPerStep: (1 - alpha / 2) * perStep });
};

export type TsbWeights = { alpha: number; beta: number };
export type TsbState = { probability: number; size: number };

/**
 * Chance of a demand, smoothed at every step, times its size, smoothed at demands: it falls towards nothing when demand
 * ends. Teunter, Syntetos & Babai (2011), European Journal of Operational Research 214, 606-615.
 */
export const teunterSyntetosBabai = (
  values: readonly number[],
  { alpha, beta }: TsbWeights,
  start: TsbState,
): TsbState & { perStep: number } => {
  requireProbability(alpha, 'The weight of sizes');
  requireProbability(beta, 'The weight of demands');
  demandsOf(values);
  let { probability, size } = start;
  for (const value of values) {
    probability += beta * ((value > 0 ? 1 : 0) - probability);
    if (value > 0) size += alpha * (value - size);
  }
  return { probability, size, perStep: probability * size };
};

const START_STEPS = 12;

/** Where TSB starts: the share of the first twelve steps with a demand, and the first demand's size. */
export const tsbStart = (values: readonly number[]): TsbState => {
  const first = values.slice(0, START_STEPS);
  const probability = first.length === 0 ? 0 : first.filter((value) => value > 0).length / first.length;
  return { probability, size: values.find((value) => value > 0) ?? 0 };
};

export type LeadTimeDemand = {
  probability: number;
  meanSize: number;
  sizeVariance: number;
  mean: number;
  variance: number;
  noneProbability: number;
};

/** What `steps` steps ask for if demands come by chance alone: a compound Bernoulli sum. Needs one demand. */
export const leadTimeDemand = (values: readonly number[], steps: number): Estimate<LeadTimeDemand> => {
  requireWhole(steps, 'The steps', 1);
  const sizes = demandsOf(values).map(({ size }) => size);
  if (sizes.length === 0) return tooFew(1, 0, 'demands');
  const probability = sizes.length / values.length;
  const meanSize = sum(sizes) / sizes.length;
  const sizeVariance = sizes.length > 1 ? sampleVariance(sizes) : 0;
  return enough({
    probability,
    meanSize,
    sizeVariance,
    mean: steps * probability * meanSize,
    variance: steps * (probability * sizeVariance + probability * (1 - probability) * meanSize ** 2),
    noneProbability: (1 - probability) ** steps,
  });
};
