const GOLDEN = (Math.sqrt(5) - 1) / 2;
const STEPS = 90;

/**
 * Where a function with a single valley between `low` and `high` is lowest, as exactly as its own rounding lets one see
 * (about eight figures). Golden-section search: Kiefer (1953), Proceedings of the American Mathematical Society 4.
 */
export const minimise = (valley: (at: number) => number, low: number, high: number): { at: number; value: number } => {
  let [from, to] = [low, high];
  let left = to - GOLDEN * (to - from);
  let right = from + GOLDEN * (to - from);
  let [leftValue, rightValue] = [valley(left), valley(right)];
  for (let step = 0; step < STEPS && to - from > 1e-12 * (Math.abs(from) + Math.abs(to)); step++) {
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
