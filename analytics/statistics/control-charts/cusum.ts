import { requireFinite, requireFiniteNumber, requireNotNegative, requirePositive } from '../checked';

export type CusumDesign = {
  /** Level on target, in the unit of the values. */
  target: number;
  /** Slack per value and sum that signals, in the unit of the values: 0.5 and 5 standard deviations by default use. */
  slack: number;
  threshold: number;
  /** Sum to begin with: half of the threshold after something was put right, to hear early if it was not. */
  headStart?: number;
};
export type CusumPoint = {
  /** What has gathered above and below the target, and over how many values. */
  above: number;
  below: number;
  aboveRun: number;
  belowRun: number;
  /** Which sum is over the threshold, and the position (from 0) of the value at which its run began. */
  signal: { side: 'above' | 'below'; runStart: number } | null;
};

/** In standard deviations: one false alarm in about 465 values, a shift of one standard deviation found in about 10. */
export const CUSUM_DEFAULTS = { slack: 0.5, threshold: 5 } as const;

/**
 * Tabular CUSUM: C⁺ = max(0, x − target − k + C⁺), C⁻ = max(0, target − k − x + C⁻). If both sums are over the
 * threshold, the larger is named. NIST/SEMATECH e-Handbook, 6.3.2.3; head start of Lucas & Crosier (1982),
 * Technometrics 24, 199-205.
 */
export const cusumChart = (values: readonly number[], design: CusumDesign): CusumPoint[] => {
  const { target, slack, threshold, headStart = 0 } = design;
  requireFinite(values, 'The values of the chart');
  requireFiniteNumber(target, 'The target');
  requireNotNegative(slack, 'The slack');
  requirePositive(threshold, 'The threshold');
  requireNotNegative(headStart, 'The head start');

  let [above, below, aboveRun, belowRun] = [headStart, headStart, 0, 0];
  return values.map((value, index) => {
    above = Math.max(0, value - target - slack + above);
    below = Math.max(0, target - slack - value + below);
    aboveRun = above > 0 ? aboveRun + 1 : 0;
    belowRun = below > 0 ? belowRun + 1 : 0;
    const side = above >= below ? 'above' : 'below';
    const run = side === 'above' ? aboveRun : belowRun;
    const signal = Math.max(above, below) > threshold ? ({ side, runStart: index + 1 - run } as const) : null;
    return { above, below, aboveRun, belowRun, signal };
  });
};
