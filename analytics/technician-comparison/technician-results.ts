import { shrinkage } from '../statistics/comparison/shrinkage';
import { normalQuantile } from '../statistics/distributions/normal';
import { Z_95 } from '../statistics/distributions/z-95';
import { dayWritten, KNOWN_SHORT } from './columns';
import type { CrewComparison } from './compare-crew';
import { learningOf, runStart, trendOf } from './course';
import { habitBehind, habits } from './habits';
import { type JobSeries, jobSeries } from './job-series';
import { BEFORE_CHANGE, FIRST_JOBS, SCALE_IN_DOUBT, SHORT_ON_ARRIVAL } from './judged-jobs';
import { standardErrorOf } from './person-sums';
import type { ComparedRecovery } from './recovery';
import type { Ranged, ScaleFinding, TechnicianResult, WorkChange } from './technician-result';

const POINTS = 100;
/** The funnel's limits: one in forty and one in a thousand by luck on either side. */
const [INNER, OUTER] = [normalQuantile(0.975), normalQuantile(0.999)];

const ranged = (value: number, error: number, times = 1): Ranged => ({
  value: times * value,
  low: times * (value - Z_95 * error),
  high: times * (value + Z_95 * error),
});

const masses = (recoveries: readonly ComparedRecovery[], crew: CrewComparison) => {
  const all = crew.columns.technicians.map(() => ({
    recoveries: 0,
    observed: 0,
    expected: 0,
    leftOut: [0, 0, 0, 0, 0],
  }));
  recoveries.forEach((job, at) => {
    const own = all[crew.columns.technician[at] ?? 0];
    if (!own) return;
    const reason = crew.reasons[at] ?? 0;
    own.recoveries += 1;
    own.leftOut[reason] = (own.leftOut[reason] ?? 0) + 1;
    if (crew.columns.decided[at] === KNOWN_SHORT) return;
    own.observed += job.recoveredMassKg;
    own.expected += job.fullChargeKg * (crew.plain.expected[at] ?? 0);
  });
  return all;
};

const scaleOf = (crew: CrewComparison, person: number): ScaleFinding | null => {
  const found = crew.changes.find(({ technician, cause }) => technician === person && cause === 'scale');
  if (!found) return null;
  return {
    from: dayWritten(found.fromDay),
    to: found.toDay === null ? null : dayWritten(found.toDay),
    jobs: found.jobs,
    readsLow: { value: -found.share, low: -found.high, high: -found.low },
  };
};

const workChangeOf = (crew: CrewComparison, person: number): WorkChange | null => {
  const stops = crew.earlyStopChanges.find(({ technician }) => technician === person);
  if (stops) {
    const { before, after } = stops;
    return { from: dayWritten(stops.fromDay), of: 'early stops', before, after, better: after < before };
  }
  const pulls = crew.changes.find(({ technician, cause }) => technician === person && cause !== 'scale');
  if (!pulls || pulls.toDay !== null) return null;
  return {
    from: dayWritten(pulls.fromDay),
    of: 'full pulls',
    before: pulls.before,
    after: pulls.after,
    better: pulls.share > 0,
  };
};

/** The first job by which somebody is judged whose jobs before a change are not counted. */
const judgedFrom = ({ days, first }: JobSeries, jobsBeforeChange: number): string | null => {
  const day = days.find((_, at) => !first[at]);
  return jobsBeforeChange > 0 && day !== undefined ? dayWritten(day) : null;
};

/** Everything about each technician of a crew, in the order of `crew.columns.technicians`. */
export const technicianResults = (
  recoveries: readonly ComparedRecovery[],
  crew: CrewComparison,
): TechnicianResult[] => {
  const series = jobSeries(crew);
  const own = masses(recoveries, crew);
  const kept = habits(recoveries, crew);
  const judged = crew.effects.flatMap((_, person) => (crew.evidence.technicians[person]?.judged ? [person] : []));
  const drawn = shrinkage(
    judged.map((person) => {
      const { effect = 0, standardError = 1 } = crew.effects[person] ?? {};
      return { estimate: effect, variance: standardError ** 2 };
    }),
  );

  return crew.columns.technicians.map((technicianId, person): TechnicianResult => {
    const [evidence, fair, judgement] = [
      crew.evidence.technicians[person],
      crew.effects[person],
      crew.judgements[person],
    ];
    const [sums, plain, jobs, mass, habit] = [
      crew.sums[person],
      crew.plain.technicians[person],
      series[person],
      own[person],
      kept[person],
    ];
    if (!evidence || !fair || !judgement || !sums || !plain || !jobs || !mass || !habit)
      throw new RangeError(`Nothing is known of technician ${technicianId}`);
    const isJudged = evidence.judged;
    const byStops = judgement.restsOn === 'early stops';
    const side = byStops ? evidence.stops : fair.effect < 0 ? evidence.low : evidence.high;
    const shrunk = drawn.enough ? drawn.value.members[judged.indexOf(person)] : undefined;
    const trend = isJudged ? trendOf(jobs) : null;
    const run = isJudged ? runStart(jobs) : null;
    const spread = crew.evidence.yieldSpread.spread;
    const limit = Math.hypot(fair.standardError, spread) * POINTS;
    return {
      ...judgement,
      technicianId,
      recoveries: mass.recoveries,
      observedMassKg: mass.observed,
      expectedMassKg: mass.expected,
      judgedJobs: sums.jobs,
      weakShare: sums.jobs > 0 ? sums.weakJobs / sums.jobs : 0,
      judgedFrom: isJudged ? judgedFrom(jobs, mass.leftOut[BEFORE_CHANGE] ?? 0) : null,
      leftOut: {
        firstJobs: mass.leftOut[FIRST_JOBS] ?? 0,
        scaleInDoubt: mass.leftOut[SCALE_IN_DOUBT] ?? 0,
        shortOnArrival: mass.leftOut[SHORT_ON_ARRIVAL] ?? 0,
        beforeChange: mass.leftOut[BEFORE_CHANGE] ?? 0,
      },
      method: fair.method,
      effect: isJudged ? ranged(fair.effect, fair.standardError, POINTS) : null,
      plainEffect: isJudged ? ranged(plain.effect, plain.standardError, POINTS) : null,
      shrunkEffect: isJudged && shrunk ? ranged(shrunk.estimate, shrunk.standardError, POINTS) : null,
      p: isJudged ? side.p : null,
      adjustedP: isJudged ? side.adjusted : null,
      shallowerKpa: isJudged && evidence.byVacuum ? ranged(sums.vacuumKpa.mean, standardErrorOf(sums.vacuumKpa)) : null,
      earlyStops:
        isJudged && evidence.byVacuum && sums.earlyOf > 0
          ? {
              found: sums.early,
              of: sums.earlyOf,
              share: sums.early / sums.earlyOf,
              usualShare: evidence.usualEarlyShare,
            }
          : null,
      funnel: isJudged
        ? { equivalentJobs: jobs.variance / fair.standardError ** 2, inner: INNER * limit, outer: OUTER * limit }
        : null,
      scale: scaleOf(crew, person),
      workChange: isJudged ? workChangeOf(crew, person) : null,
      habits: habit,
      habitBehind: isJudged && fair.effect < 0 ? habitBehind(habit) : null,
      trend: trend?.enough
        ? { value: POINTS * trend.value.perYear, low: POINTS * trend.value.low, high: POINTS * trend.value.high }
        : null,
      learning: learningOf(jobs),
      run: run && { side: run.side, from: dayWritten(run.fromDay) },
    };
  });
};
