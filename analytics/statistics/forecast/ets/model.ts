/**
 * Exponential smoothing in the state space form of Hyndman, Koehler, Snyder & Grose (2002), International Journal of
 * Forecasting 18, 439-454. "A" adds, "M" multiplies, "N" is none.
 */
export type EtsModel = {
  error: 'A' | 'M';
  trend: 'N' | 'A';
  damped: boolean;
  season: 'N' | 'A' | 'M';
  /** Values a season: 12 for months; 1 without a season. */
  period: number;
};

/** How fast level, slope and season follow; `phi` damps the slope. What a model lacks is 0, an undamped phi 1. */
export type EtsWeights = { alpha: number; beta: number; gamma: number; phi: number };

/** Level and slope now, and the season's indices, the most recent one first. */
export type EtsState = { level: number; slope: number; season: number[] };

/** Smoothing weights, free initial states and the variance: what the information criteria count. */
export const parameterCount = ({ trend, damped, season, period }: EtsModel): number =>
  3 + (trend === 'A' ? 2 : 0) + (damped ? 1 : 0) + (season === 'N' ? 0 : period);

/** The usual name, `ETS(A,Ad,N)`. */
export const etsName = ({ error, trend, damped, season }: EtsModel): string =>
  `ETS(${error},${trend}${damped ? 'd' : ''},${season})`;
