/** What a figure can measure, as API and address name it. No imports: the browser reads this too. */
export const MEASURES = [
  'recoveredMass',
  'recoveries',
  'fullCharge',
  'totalYield',
  'medianYield',
  'co2e',
  'appliances',
  'flagged',
  'judged',
  'unjudged',
] as const;
export type Measure = (typeof MEASURES)[number];

/** What the value of a measure counts in. */
export type MeasureUnit = 'kg' | 'share' | 'count';

export const MEASURE_UNITS: Record<Measure, MeasureUnit> = {
  recoveredMass: 'kg',
  recoveries: 'count',
  fullCharge: 'kg',
  totalYield: 'share',
  medianYield: 'share',
  co2e: 'kg',
  appliances: 'count',
  flagged: 'count',
  judged: 'count',
  unjudged: 'count',
};

/** How a recovery stands among its like jobs: far below them, judged by enough of them, or too few to say. */
export const LIKE_JOBS_STANDINGS = ['below', 'enough', 'few'] as const;
export type LikeJobsStanding = (typeof LIKE_JOBS_STANDINGS)[number];

/** Measures that count recoveries by how they stand among like jobs: who reads them must be allowed to read flags. */
export const STANDING_OF: Partial<Record<Measure, LikeJobsStanding>> = {
  flagged: 'below',
  judged: 'enough',
  unjudged: 'few',
};
