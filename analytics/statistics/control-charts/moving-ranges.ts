/** Distances between each value and the one before it, in the unit of the values: one fewer than there are values. */
export const movingRanges = (values: readonly number[]): number[] =>
  values.slice(1).map((value, index) => Math.abs(value - (values[index] ?? value)));
