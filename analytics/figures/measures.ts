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
  'farBelow',
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
  farBelow: 'count',
  routineMass: 'kg',
  heldShare: 'share',
  downToLevelShare: 'share',
};

/** How a recovery stands among its like jobs: far below them. */
export const LIKE_JOBS_STANDINGS = ['below'] as const;
export type LikeJobsStanding = (typeof LIKE_JOBS_STANDINGS)[number];

/** What a record may be asked to state: a hold after the pull-down, a final vacuum. */
export const STATED_READINGS = ['hold', 'vacuum'] as const;
export type StatedReading = (typeof STATED_READINGS)[number];

/** Routine jobs, and those at large plant of which each makes a month of its own. */
export const PLANT_SIZES = ['routine', 'large'] as const;
export type PlantSize = (typeof PLANT_SIZES)[number];

/** What narrows the records of a figure besides its scope. */
export type MeasureRecords = {
  flagged?: 'yes';
  likeJobs?: LikeJobsStanding;
  states?: StatedReading;
  plant?: PlantSize;
};

/** Of which records in scope a measure is made, where it is not all that count. */
export const RECORDS_OF: Partial<Record<Measure, MeasureRecords>> = {
  flagged: { flagged: 'yes' },
  farBelow: { likeJobs: 'below' },
  routineMass: { plant: 'routine' },
  heldShare: { states: 'hold' },
  downToLevelShare: { states: 'vacuum' },
};

/** Whether a measure tells which records need a look: who reads it must be allowed to read flags. */
export const isFlagFigure = (measure: Measure): boolean => RECORDS_OF[measure]?.flagged !== undefined;

/** Whether a measure tells how recoveries stand among those of everybody: not for a technician, who sees his own. */
export const isComparison = (measure: Measure): boolean => RECORDS_OF[measure]?.likeJobs !== undefined;

/** Whether a measure judges recoveries in one of these ways. */
export const isJudgement = (measure: Measure): boolean => isFlagFigure(measure) || isComparison(measure);
