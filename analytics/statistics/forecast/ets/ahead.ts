import type { EtsFit } from './fit';
import { productMoments } from './product-moments';
import { continueEts } from './smooth';

/** Mean and variance of the value some steps ahead. */
export type Ahead = { mean: number; variance: number };

/**
 * Means and variances 1 to `horizon` steps ahead. Everything adding: σ²(1 + Σ c²) with cⱼ = α + β(φ + … + φʲ) + γ at
 * whole seasons. Error and season multiplying: the exact moments. Null for other mixtures, whose moments have no closed
 * form here. Hyndman, Koehler, Ord & Snyder (2008), Forecasting with Exponential Smoothing, chapter 6.
 */
export const etsAhead = (fit: EtsFit, horizon: number): Ahead[] | null => {
  const { model, weights, run, variance } = fit;
  if (model.error === 'M' && model.season === 'M') return productMoments(fit, horizon);
  if (model.error === 'M' || model.season === 'M') return null;
  const { alpha, beta, gamma, phi } = weights;
  let [sum, damping, slopes] = [1, 1, 0];
  return continueEts(model, weights, run.end, horizon).map((mean, step) => {
    if (step > 0) {
      damping *= phi;
      slopes += damping;
      const response = alpha + beta * slopes + (step % model.period === 0 ? gamma : 0);
      sum += response * response;
    }
    return { mean, variance: variance * sum };
  });
};
