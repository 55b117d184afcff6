import { errorsNeededFor } from '@/analytics/statistics/forecast/conformal';
import type { TrackRecord } from './track-record';

/** Shares of coming months that ranges are made for. */
export const RANGE_LEVELS = [0.5, 0.8, 0.95] as const;
export type RangeLevel = (typeof RANGE_LEVELS)[number];

/** Past forecasts that count as much as what the draws promise by themselves. */
const PRIOR_WEIGHT = 40;
/** Ranges may be made this much wider or narrower in what they leave out. */
const MOST_OUTSIDE_FACTOR = 3;

/**
 * The share of the draws that a range must hold so that, by past forecasts, the share `level` of what came lay within:
 * the ⌈(n + 1) · level⌉-th smallest reach. Nested conformal prediction: Gupta, Kuchibhotla & Ramdas (2022), Pattern
 * Recognition 127, 108496. Past months overlap, so the draws' own promise keeps a part in it. Null where there are too few
 * forecasts for the level: 80 % takes 9, 95 % takes 39.
 */
export const calibratedMass = (reaches: readonly number[], level: number): number | null => {
  const needs = errorsNeededFor(1 - level);
  if (reaches.length < needs) return null;
  const sorted = [...reaches].sort((a, b) => a - b);
  const own = sorted[Math.ceil((sorted.length + 1) * level - 1e-9) - 1] ?? 1;
  const weight = sorted.length / (sorted.length + PRIOR_WEIGHT);
  const mass = weight * own + (1 - weight) * level;
  const outside = 1 - level;
  return 1 - Math.min(outside * MOST_OUTSIDE_FACTOR, Math.max(outside / MOST_OUTSIDE_FACTOR, 1 - mass));
};

/** Reaches of the months about a horizon, which are few for each alone. */
const neighbours = (byStep: readonly (readonly number[])[], step: number): number[] =>
  byStep.slice(Math.max(0, step - 1), step + 2).flat();

/** What share of the draws to show for all refrigerants together in the month `step` (from 0), and for a single one. */
export const totalMassOf = ({ totalReach }: TrackRecord, step: number, level: RangeLevel): number | null =>
  calibratedMass(neighbours(totalReach, step), level);
export const refrigerantMassOf = ({ refrigerantReach }: TrackRecord, level: RangeLevel): number | null =>
  calibratedMass(refrigerantReach, level);
