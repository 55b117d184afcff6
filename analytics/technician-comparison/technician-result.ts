import type { CoachingChange } from './coaching-change';
import type { Learning, MonthOfJobs, Trend } from './course';
import type { HabitName, Habits } from './habits';
import type { Judgement } from './verdict';

/** A value with its 95 % range. */
export type Ranged = { value: number; low: number; high: number };

/** From a day on all pulls came out lower, and the final vacuum did not go with them. */
export type ScaleFinding = {
  from: string;
  /** First day on which it was over; null while it lasts. */
  to: string | null;
  jobs: number;
  /** What the scale takes off a pull, as a share of it. */
  readsLow: Ranged;
};
/** From a day on the work went otherwise: how full pulls came out, or how many were stopped early. */
export type WorkChange = {
  from: string;
  of: 'full pulls' | 'early stops';
  before: number;
  after: number;
  better: boolean;
};

/**
 * One technician against like jobs of his colleagues. Effects and what is derived from them are points of nameplate (per
 * cent of the full charge), masses kg, vacuums kPa, shares 0 to 1. Where nothing is said of him (`too few`) they are null.
 */
export type TechnicianResult = Judgement & {
  technicianId: string;
  recoveries: number;
  observedMassKg: number;
  /** What colleagues' like jobs would have given. Both leave out units that are known to have come short. */
  expectedMassKg: number;
  judgedJobs: number;
  /** Share of the judged jobs that no colleague's were like. */
  weakShare: number;
  /** First day by which he is judged, where his work has changed since; null where all counts. */
  judgedFrom: string | null;
  leftOut: { firstJobs: number; scaleInDoubt: number; shortOnArrival: number; beforeChange: number };
  method: 'short units excused' | 'all jobs';
  effect: Ranged | null;
  /** All jobs as they are, each weighted by how much its kind tells: shown beside it. */
  plainEffect: Ranged | null;
  /** The effect drawn towards the crew's mean by how much luck is in it. */
  shrunkEffect: Ranged | null;
  /** Chance of it by luck alone, and the same allowed for the size of the crew. */
  p: number | null;
  adjustedP: number | null;
  /** Above 0 is shallower than on colleagues' like jobs. */
  shallowerKpa: Ranged | null;
  earlyStops: { found: number; of: number; share: number; usualShare: number } | null;
  /** Position in the funnel, and half the width of its two limits there, normal differences of sound people allowed for. */
  funnel: { equivalentJobs: number; inner: number; outer: number } | null;
  scale: ScaleFinding | null;
  workChange: WorkChange | null;
  habits: Habits;
  habitBehind: HabitName | null;
  trend: Ranged | null;
  learning: Learning | null;
  run: { side: 'above' | 'below'; from: string } | null;
};

/** What a technician's own page shows besides. Shares of the full charge. */
export type TechnicianCourse = {
  months: MonthOfJobs[];
  trend: Trend | null;
  coaching: { startedOn: string; change: CoachingChange | null }[];
};
