import type { Random } from '@/lib/random';
import type { ShareTrend } from './mix';

/** Above this many portions a month's sum is drawn at once. */
const MANY = 25;
const USUAL_VARIATION = 0.6;
const MOST_VARIATION = 4;

/** Mean kg of a portion and its squared coefficient of variation: a month's mass is a chance number of portions. */
export type Portions = { meanKg: number; variation: number };

/**
 * Portions that make both the variance of a month (mean portion × (1 + CV²) = variance over mean) and the share of months
 * without any, which is exp(−mean/portion) by Poisson.
 */
export const portionsOf = ({ portionKg, emptyShare }: ShareTrend, usualKg: number): Portions => {
  const usual = portionKg / (1 + USUAL_VARIATION);
  const byEmpty = emptyShare > 0 && emptyShare < 1 ? usualKg / -Math.log(emptyShare) : usual;
  const meanKg = Math.min(portionKg, Math.max(portionKg / (1 + MOST_VARIATION), byEmpty));
  return { meanKg, variation: portionKg / meanKg - 1 };
};

/** A month's mass that has this mean: a compound Poisson sum of gamma portions. */
export const drawPortions = (meanKg: number, { meanKg: portion, variation }: Portions, random: Random): number => {
  if (!(meanKg > 0)) return 0;
  const count = meanKg / portion;
  const spread = Math.max(variation, 0.01);
  if (count > MANY) {
    const shape = count / (1 + spread);
    return (random.gamma(shape) * meanKg) / shape;
  }
  const drawn = random.poisson(count);
  return drawn === 0 ? 0 : random.gamma(drawn / spread) * portion * spread;
};
