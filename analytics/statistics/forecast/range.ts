import { normalQuantile } from '../distributions/normal';

/** Points with the lower and upper ends of a range about each, in the unit of the series. */
export type PointsInRange = { mean: number[]; lower: number[]; upper: number[] };

/** A range that holds the share `level` of a normal variable, from means and standard errors of forecasts. */
export const normalRange = (
  means: readonly number[],
  standardErrors: readonly number[],
  level: number,
): PointsInRange => {
  const z = normalQuantile(0.5 + level / 2);
  const reach = means.map((_, step) => z * (standardErrors[step] ?? Number.NaN));
  return {
    mean: [...means],
    lower: means.map((mean, step) => mean - (reach[step] ?? Number.NaN)),
    upper: means.map((mean, step) => mean + (reach[step] ?? Number.NaN)),
  };
};
