import { scaleLinear } from '@visx/scale';

/** One dot of a funnel: how much there is to go by, and how far from the others it lies. */
export type FunnelPoint = {
  key: string;
  name: string;
  /** To the right: the more, the surer. Above zero. */
  amount: number;
  /** Up and down: zero is what the others give. */
  value: number;
  /** The range of the value, drawn while it is read. */
  low: number;
  high: number;
  /** Marked and named always; the others only while they are read. */
  isMarked: boolean;
};

/** A pair of lines between which chance alone would leave most points, the narrower the more there is to go by. */
export type FunnelLimit = { name: string; halfWidth: (amount: number) => number };

type Box = { width: number; height: number; margin: { top: number; right: number; bottom: number; left: number } };

/** The least amount that a limit is drawn from: towards zero it grows without end. */
const LEAST_AMOUNT = 4;
const STEPS = 80;

/** Amounts and values as pixels: everything that is to be told lies inside, and above as much as below zero. */
export const funnelScales = (points: readonly FunnelPoint[], limits: readonly FunnelLimit[], box: Box) => {
  const { width, height, margin } = box;
  const amounts = points.map(({ amount }) => amount);
  const most = Math.max(...amounts, LEAST_AMOUNT * 2);
  const least = Math.max(LEAST_AMOUNT, Math.min(...amounts, most));
  // Limits at the smallest amounts would leave the points no room; half again what the points need shows where they go.
  const reach = Math.max(
    ...points.map(({ value }) => Math.abs(value)),
    ...limits.map((one) => one.halfWidth(most)),
    1e-9,
  );
  const limited = Math.min(reach * 1.5, Math.max(reach * 1.1, ...limits.map((one) => one.halfWidth(least))));
  const x = scaleLinear<number>({ domain: [0, most * 1.04], range: [margin.left, width - margin.right] });
  const y = scaleLinear<number>({ domain: [-limited, limited], range: [height - margin.bottom, margin.top], nice: 8 });
  return { x, y, most };
};

/** The path of a limit above (`sign` 1) or below (−1) zero, cut off where the picture ends. */
export const limitPath = (
  { halfWidth }: FunnelLimit,
  sign: 1 | -1,
  { x, y, most }: ReturnType<typeof funnelScales>,
): string => {
  const highest = Math.max(...y.domain());
  const amounts = Array.from({ length: STEPS + 1 }, (_, step) => most * 1.04 * ((step + 1) / (STEPS + 1)) ** 2);
  return amounts
    .filter((amount) => halfWidth(amount) <= highest)
    .map((amount, at) => `${at ? 'L' : 'M'}${x(amount).toFixed(1)} ${y(sign * halfWidth(amount)).toFixed(1)}`)
    .join('');
};
