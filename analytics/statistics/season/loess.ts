/** A local regression over equally spaced values: how many neighbours, and a level (0) or a line (1) through them. */
export type Smoother = {
  window: number;
  degree: 0 | 1;
  /** Fit at every `jump`-th position only and draw straight lines between. */
  jump: number;
};

type Span = { first: number; last: number };

const tricube = (distance: number, reach: number): number => {
  if (distance > 0.999 * reach) return 0;
  return distance <= 0.001 * reach ? 1 : (1 - (distance / reach) ** 3) ** 3;
};

/**
 * The local fit at `position` (from 0, may lie outside) from the values of `span`; undefined where all their weights
 * are zero. Cleveland et al. (1990), Journal of Official Statistics 6, 3-73, section 2.
 */
export const fitAt = (
  values: readonly number[],
  position: number,
  span: Span,
  { window, degree }: Pick<Smoother, 'window' | 'degree'>,
  weights?: readonly number[],
): number | undefined => {
  const { first, last } = span;
  const spare = window > values.length ? Math.floor((window - values.length) / 2) : 0;
  const reach = Math.max(position - first, last - position) + spare;
  const near: number[] = [];
  let total = 0;
  let mean = 0;
  for (let at = first; at <= last; at++) {
    const weight = tricube(Math.abs(at - position), reach) * (weights?.[at] ?? 1);
    near.push(weight);
    total += weight;
    mean += weight * at;
  }
  if (total <= 0) return undefined;
  mean /= total;

  let slope = 0;
  if (degree === 1 && reach > 0) {
    const spread = near.reduce((sum, weight, index) => sum + (weight / total) * (first + index - mean) ** 2, 0);
    // A line through what is practically one position would be steep by chance.
    if (Math.sqrt(spread) > 0.001 * (values.length - 1)) slope = (position - mean) / spread;
  }
  return near.reduce((sum, weight, index) => {
    const at = first + index;
    return sum + (weight / total) * (1 + slope * (at - mean)) * (values[at] ?? 0);
  }, 0);
};

const spanAt = (position: number, length: number, window: number): Span => {
  if (window >= length) return { first: 0, last: length - 1 };
  const half = Math.floor((window + 1) / 2);
  const first = Math.min(Math.max(0, position - half + 1), length - window);
  return { first, last: first + window - 1 };
};

const join = (fitted: (number | undefined)[]): number[] => {
  const joined = fitted.map((value) => value ?? 0);
  let left = 0;
  fitted.forEach((value, right) => {
    if (value === undefined) return;
    const step = (value - (joined[left] ?? value)) / Math.max(1, right - left);
    for (let at = left + 1; at < right; at++) joined[at] = (joined[left] ?? 0) + step * (at - left);
    left = right;
  });
  return joined;
};

/** The series smoothed at every position. A position without weight keeps its own value. */
export const smooth = (values: readonly number[], smoother: Smoother, weights?: readonly number[]): number[] => {
  const { length } = values;
  if (length < 2) return [...values];
  const jump = Math.min(smoother.jump, length - 1);
  const fits = values.map((value, position) =>
    position % jump === 0 || position === length - 1
      ? (fitAt(values, position, spanAt(position, length, smoother.window), smoother, weights) ?? value)
      : undefined,
  );
  return join(fits);
};
