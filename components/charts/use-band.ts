'use client';

import { DataContext } from '@visx/xychart';
import { useContext } from 'react';

/** Pixels of the chart being drawn: where a month's band begins, how wide it is, how high a value stands. */
export type Band = {
  xOf: (month: string) => number;
  width: number;
  step: number;
  yOf: (value: number) => number;
  top: number;
  bottom: number;
  left: number;
  right: number;
};

/** The scales of the surrounding XYChart as plain pixels; null until it has measured itself. */
export const useBand = (): Band | null => {
  const { xScale, yScale, margin, innerHeight, innerWidth } = useContext(DataContext);
  if (!xScale || !yScale || !margin || !innerHeight || !innerWidth || !('bandwidth' in xScale)) return null;
  const width = xScale.bandwidth();
  const left = margin.left;
  const bottom = margin.top + innerHeight;
  return {
    xOf: (month) => Number(xScale(month) ?? 0),
    width,
    step: 'step' in xScale ? xScale.step() : width,
    yOf: (value) => Number(yScale(value) ?? bottom),
    top: margin.top,
    bottom,
    left,
    right: left + innerWidth,
  };
};
