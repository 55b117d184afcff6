/** One layer of a stack as a chart draws it: its name and colour are decided by who knows what it is. */
export type ChartLayer = { id: string; name: string; colour: string };

/** One bar: the value of each layer by its id, in the chart's unit. */
export type ChartMonth = {
  month: string;
  values: Record<string, number>;
  total: number;
  /** The same month a year before, drawn as a line across the bar; null draws none. */
  yearBefore: number | null;
  /** Not over, or cut: drawn hatched. */
  unfinished: boolean;
};

/** A numbered note over the months that it touches. */
export type ChartNote = { id: string; no: number; first: string; last: string };
