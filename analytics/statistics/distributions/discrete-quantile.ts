// Cumulated probabilities carry a few roundings; a count that reaches p but for those has reached it.
const ROUNDING = 64 * Number.EPSILON;

/** The least whole number from 0 to `most` at which `cdf` reaches `p`; `most` may be Infinity if p < 1. */
export const discreteQuantile = (p: number, most: number, cdf: (count: number) => number): number => {
  if (p === 0) return 0;
  if (p === 1) return most;
  const reaches = (count: number) => cdf(count) >= p * (1 - ROUNDING);
  let low = -1;
  let high = Math.min(most, 1);
  while (high < most && !reaches(high)) {
    low = high;
    high = Math.min(most, 2 * high + 1);
  }
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (reaches(middle)) high = middle;
    else low = middle;
  }
  return high;
};
