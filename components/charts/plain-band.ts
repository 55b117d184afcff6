import { scaleBand, scaleLinear } from '@visx/scale';
import type { Band } from './use-band';

type PlainBandProps = {
  months: readonly string[];
  width: number;
  height: number;
  margin: { top: number; right: number; bottom: number; left: number };
  /** The highest value to be shown, in the chart's unit. */
  highest: number;
  /** Grid lines wanted; zero leaves the highest value as it is. */
  ticks: number;
};

/** Months side by side and values from zero, as pixels, for pictures that need no XYChart; with the grid's values. */
export const plainBand = ({ months, width, height, margin, highest, ticks }: PlainBandProps) => {
  const [right, bottom] = [width - margin.right, height - margin.bottom];
  const x = scaleBand({ domain: [...months], range: [margin.left, right], paddingInner: 0.22, paddingOuter: 0.11 });
  const y = scaleLinear({ domain: [0, highest || 1], range: [bottom, margin.top], nice: ticks > 0 && ticks });
  const band: Band = {
    xOf: (month) => x(month) ?? 0,
    width: x.bandwidth(),
    step: x.step(),
    yOf: (value) => y(value),
    top: margin.top,
    bottom,
    left: margin.left,
    right,
  };
  return { band, gridValues: ticks > 0 ? y.ticks(ticks) : [] };
};
