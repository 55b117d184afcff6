/** What a figure can measure, as API and address name it. No imports: the browser reads this too. */
export const MEASURES = [
  'recoveredMass',
  'recoveries',
  'fullCharge',
  'totalYield',
  'medianYield',
  'co2e',
  'co2eAr6',
  'appliances',
  'flagged',
  'judged',
  'unjudged',
  'routineMass',
  'heldShare',
  'downToLevelShare',
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
  co2eAr6: 'kg',
  appliances: 'count',
  flagged: 'count',
  judged: 'count',
  unjudged: 'count',
  routineMass: 'kg',
  heldShare: 'share',
  downToLevelShare: 'share',
};

/** How a recovery stands among its like jobs: far below them, judged by enough of them, or too few to say. */
export const LIKE_JOBS_STANDINGS = ['below', 'enough', 'few'] as const;
export type LikeJobsStanding = (typeof LIKE_JOBS_STANDINGS)[number];

/** What a record may be asked to state: a hold after the pull-down, a final vacuum. */
export const STATED_READINGS = ['hold', 'vacuum'] as const;
export type StatedReading = (typeof STATED_READINGS)[number];

/** Routine jobs, and those at large plant of which each makes a month of its own. */
export const PLANT_SIZES = ['routine', 'large'] as const;
export type PlantSize = (typeof PLANT_SIZES)[number];

/** What narrows the records of a figure besides its scope. */
export type MeasureRecords = { likeJobs?: LikeJobsStanding; states?: StatedReading; plant?: PlantSize };

/** Of which records in scope a measure is made, where it is not all that count. */
export const RECORDS_OF: Partial<Record<Measure, MeasureRecords>> = {
  flagged: { likeJobs: 'below' },
  judged: { likeJobs: 'enough' },
  unjudged: { likeJobs: 'few' },
  routineMass: { plant: 'routine' },
  heldShare: { states: 'hold' },
  downToLevelShare: { states: 'vacuum' },
};

/** Whether a measure tells how recoveries stand among like jobs: who reads it must be allowed to read flags. */
export const isJudgement = (measure: Measure): boolean => RECORDS_OF[measure]?.likeJobs !== undefined;
