'use client';

import { MonthAxisOf, type MonthAxisProps } from './month-axis-of';
import { useBand } from './use-band';

/** The months under the bars of an XYChart. */
export const MonthAxis = (props: MonthAxisProps) => {
  const band = useBand();
  return band ? <MonthAxisOf band={band} {...props} /> : null;
};
