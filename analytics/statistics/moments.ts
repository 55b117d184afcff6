import { sampleStandardDeviation } from 'simple-statistics';
import { requireFinite } from './checked';
import { type Estimate, enough, tooFew } from './estimate';

/** Sample standard deviation (n − 1), in the unit of the values. Needs two. */
export const standardDeviation = (values: readonly number[]): Estimate<number> => {
  requireFinite(values, 'Values');
  return values.length < 2 ? tooFew(2, values.length, 'values') : enough(sampleStandardDeviation([...values]));
};
