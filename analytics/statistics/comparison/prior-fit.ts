import { minimise } from '../minimise';

/** Where the precision of a prior is looked for: from almost no pull to almost no spread between members. */
const PRECISION = { least: 1e-4, most: 1e7 } as const;
const REACH = 8;

// On its ridge a likelihood falls with the square of the distance: this near, by 1e-12.
const NEAR_THE_RIDGE = 1e-6;

export type PriorFit = { centre: number; precision: number; logLikelihood: number };

/**
 * The centre (on its unbounded scale) and precision of a prior at which a likelihood is highest: the best centre for
 * each precision, and of those the best.
 */
export const fitPrior = (logLikelihood: (centre: number, precision: number) => number, start: number): PriorFit => {
  const centreFor = (precision: number, width?: number) =>
    minimise((centre) => -logLikelihood(centre, precision), start - REACH, start + REACH, width);
  const best = minimise(
    (logPrecision) => centreFor(Math.exp(logPrecision), NEAR_THE_RIDGE).value,
    Math.log(PRECISION.least),
    Math.log(PRECISION.most),
  );
  const precision = Math.exp(best.at);
  return { centre: centreFor(precision).at, precision, logLikelihood: -best.value };
};
