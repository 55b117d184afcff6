import { linearRegression } from 'simple-statistics';

/** The least-squares line through values at 1, 2, 3 … */
export const lineThrough = (values: readonly number[]): { intercept: number; slope: number } => {
  const { m, b } = linearRegression(values.map((value, at) => [at + 1, value]));
  return { intercept: b, slope: m };
};
