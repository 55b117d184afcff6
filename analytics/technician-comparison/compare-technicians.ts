import { median } from 'simple-statistics';
import { coachingChange } from './coaching-change';
import { dayNumber } from './columns';
import { type CrewComparison, compareCrew } from './compare-crew';
import { monthsOf, trendOf } from './course';
import { jobSeries } from './job-series';
import type { ComparedRecovery } from './recovery';
import type { TechnicianCourse, TechnicianResult } from './technician-result';
import { technicianResults } from './technician-results';

export type ComparisonInput = {
  /** How many jobs a technician did before the first of the recoveries: his first forty are not held against him. */
  earlierJobs?: ReadonlyMap<string, number>;
};
export type TechnicianComparison = {
  technicians: TechnicianResult[];
  crew: {
    /** Technicians of whom something is said; under five, nobody is called below or above. */
    judged: number;
    spreadKnown: boolean;
    /** Effect of the technician in the middle: the middle of the funnel. Points of nameplate; null where nobody is judged. */
    centre: number | null;
    /** How much sound technicians differ beyond luck, as a standard deviation in points. */
    normalSpread: number;
  };
};

const POINTS = 100;

const summed = (crew: CrewComparison, technicians: TechnicianResult[]): TechnicianComparison => {
  const effects = technicians.flatMap(({ effect }) => (effect ? [effect.value] : []));
  return {
    technicians,
    crew: {
      judged: effects.length,
      spreadKnown: crew.evidence.spreadKnown,
      centre: effects.length > 0 ? median(effects) : null,
      normalSpread: POINTS * crew.evidence.yieldSpread.spread,
    },
  };
};

/** Compares technicians on like jobs. Recoveries in the order of time, entry errors left out; results in the order of ids. */
export const compareTechnicians = (
  recoveries: readonly ComparedRecovery[],
  { earlierJobs }: ComparisonInput = {},
): TechnicianComparison => {
  const crew = compareCrew(recoveries, earlierJobs);
  return summed(crew, technicianResults(recoveries, crew));
};

const courseOf = (
  crew: CrewComparison,
  technicianId: string,
  coachedOn: readonly string[],
): TechnicianCourse | null => {
  const series = jobSeries(crew, { withJobsBeforeChange: true })[crew.columns.technicians.indexOf(technicianId)];
  if (!series) return null;
  const trend = trendOf(series);
  return {
    months: monthsOf(series),
    trend: trend.enough ? trend.value : null,
    coaching: coachedOn.map((startedOn) => {
      const change = coachingChange(series, dayNumber(startedOn));
      return { startedOn, change: change.enough ? change.value : null };
    }),
  };
};

/** One technician against the crew: the result, and month by month with what came of each coaching. Null without a recovery. */
export const compareTechnician = (
  recoveries: readonly ComparedRecovery[],
  technicianId: string,
  coachedOn: readonly string[],
  { earlierJobs }: ComparisonInput = {},
): { own: TechnicianResult | null; course: TechnicianCourse | null } => {
  const crew = compareCrew(recoveries, earlierJobs);
  const own = technicianResults(recoveries, crew).find((result) => result.technicianId === technicianId) ?? null;
  return { own, course: courseOf(crew, technicianId, coachedOn) };
};
