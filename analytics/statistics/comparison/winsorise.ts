import { requireProbability } from '../checked';
import { type Estimate, enough } from '../estimate';
import { quantile } from '../robust/quantile';

export type Winsorised = { values: number[]; lower: number; upper: number };

/** The outer `share` of each side drawn in to the quantile (type 7) there, so that no one value rules the spread. */
export const winsorise = (values: readonly number[], share = 0.1): Estimate<Winsorised> => {
  requireProbability(2 * share, 'Twice the share to draw in');
  const low = quantile(values, share);
  const high = quantile(values, 1 - share);
  if (!low.enough) return low;
  if (!high.enough) return high;
  const [lower, upper] = [low.value, high.value];
  return enough({ values: values.map((value) => Math.min(upper, Math.max(lower, value))), lower, upper });
};
