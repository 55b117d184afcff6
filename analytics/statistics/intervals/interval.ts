/** Bounds between which a quantity likely lies. */
export type Interval = { lower: number; upper: number };
