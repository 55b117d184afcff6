import { logBeta, logGamma } from '../../statistics/distributions/log-gamma';

/** Yields are looked up on a grid: cell i holds the density at (i + ½) × GRID_STEP. */
export const GRID_STEP = 0.005;
/** Nothing but an overcharge or a slip yields more. */
export const TOP_YIELD = 1.12;
const CELLS = 320;

const grid = (density: (y: number) => number): number[] =>
  Array.from({ length: CELLS }, (_, i) => density((i + 0.5) * GRID_STEP));

/** Density at a yield, from a grid; beyond it what an overcharge leaves. */
export const lookUp = (densities: readonly number[], y: number): number => {
  if (y < 0) return 0;
  return densities[Math.floor(y / GRID_STEP)] ?? 1e-9;
};

/** Share of sound systems that somebody had filled beyond the nameplate, and how far: common practice. */
const OVERCHARGED = 0.004;
const OVERCHARGE_SPREAD = 0.07;

/**
 * Yields of sound systems: what is missing to the top follows a gamma distribution, which has the long lower tail of
 * careless pulls; a few are overcharged.
 */
export const soundShape = (mean: number, variance: number): number[] => {
  const missing = TOP_YIELD - mean;
  const shape = (missing * missing) / variance;
  const rate = missing / variance;
  const constant = shape * Math.log(rate) - logGamma(shape);
  return grid((y) => {
    const short = TOP_YIELD - y;
    const usual = short > 0 ? Math.exp(constant + (shape - 1) * Math.log(short) - rate * short) : 0;
    const over = y > 1 ? Math.exp(-(y - 1) / OVERCHARGE_SPREAD) / OVERCHARGE_SPREAD : 0;
    return (1 - OVERCHARGED) * usual + OVERCHARGED * over;
  });
};

/** Yields between none and all, by a beta distribution with this mean and variance. */
export const partShape = (mean: number, variance: number): number[] => {
  const size = (mean * (1 - mean)) / variance - 1;
  const [a, b] = [mean * size, (1 - mean) * size];
  const constant = -logBeta(a, b);
  return grid((y) => (y < 1 ? Math.exp(constant + (a - 1) * Math.log(y) + (b - 1) * Math.log(1 - y)) : 0));
};
