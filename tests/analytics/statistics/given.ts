import type { Estimate } from '@/analytics/statistics/estimate';

/** The value of an estimate that the data of a test must carry. */
export const given = <Value>(estimate: Estimate<Value>): Value => {
  if (estimate.enough) return estimate.value;
  throw new Error(`Needs ${estimate.needs} ${estimate.of}, has ${estimate.has}`);
};
