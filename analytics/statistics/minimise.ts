const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Where a function with a single valley between `low` and `high` is lowest, to within `width`; its own rounding hides
 * what is nearer than about 1e-8. Golden-section search: Kiefer (1953), Proceedings of the American Mathematical Society
 * 4, 502-506.
 */
export const minimise = (
  valley: (at: number) => number,
  low: number,
  high: number,
  width = 1e-9,
): { at: number; value: number } => {
  let [from, to] = [low, high];
  let left = to - GOLDEN * (to - from);
  let right = from + GOLDEN * (to - from);
  let [leftValue, rightValue] = [valley(left), valley(right)];
  // Bounds far from 0 cannot come nearer to each other than their own last bits.
  while (to - from > Math.max(width, 4 * Number.EPSILON * Math.max(Math.abs(from), Math.abs(to)))) {
    if (leftValue <= rightValue) {
      [to, right, rightValue] = [right, left, leftValue];
      left = to - GOLDEN * (to - from);
      leftValue = valley(left);
    } else {
      [from, left, leftValue] = [left, right, rightValue];
      right = from + GOLDEN * (to - from);
      rightValue = valley(right);
    }
  }
  return leftValue <= rightValue ? { at: left, value: leftValue } : { at: right, value: rightValue };
};
