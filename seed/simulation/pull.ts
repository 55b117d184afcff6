import type { JobType } from '@/lib/vocabulary';
import type { Random } from '../random';
import type { Worker } from './crew';
import type { Kind } from './kinds';
import { monthOfYear } from './months';

/** What truly happened at the appliance. */
export type Pull = {
  /** Of the nameplate. */
  share: number;
  shortOnArrival: boolean;
  stoppedEarly: boolean;
  vacuumInHg: number;
  /** What the person is expected to get out of this unit more than a middling colleague; share of nameplate. */
  yieldLead: number;
};

const LOST: Record<JobType, { leaked: number; empty: number }> = {
  disposal: { leaked: 0.16, empty: 0.05 },
  service: { leaked: 0.08, empty: 0.01 },
  repair: { leaked: 0.68, empty: 0.2 },
  conversion: { leaked: 0.1, empty: 0.01 },
};

const arrival = (job: JobType, random: Random): { share: number; isShort: boolean } => {
  const { leaked, empty } = LOST[job];
  const kind = random.between(0, 1);
  if (kind < empty) return { share: random.beta(1.1, 14), isShort: true };
  if (kind < empty + leaked) return { share: random.beta(3.2, 2.2), isShort: true };
  return { share: 1.04 * random.beta(52, 3.2), isShort: false };
};

const logistic = (x: number) => 1 / (1 + Math.exp(-x));
const logit = (p: number) => Math.log(p / (1 - p));

/** What a crew's middling pull gets out of each kind of appliance, as logits; drawn once a company. */
export const drawBases = (kinds: readonly Kind[], random: Random): Map<Kind, number> =>
  new Map(kinds.map((kind) => [kind, logit(random.between(0.88, 0.98))]));

const usualVacuum = (kind: Kind): number => (kind.name === 'small' ? 4 : kind.isLarge ? 15 : 10);
/** Share of the usual vacuum that a pull of no efficiency at all would miss. */
const VACUUM_SLOPE = 0.5;

/** Efficiency by person and season, without the luck of the day, as a logit. */
export const steadyLogit = (base: number, worker: Worker, month: string): number => {
  const { learning } = worker;
  const stillLearning = learning ? learning.drop * Math.exp(-worker.jobsDone / learning.jobs) : 0;
  const cold = [11, 0, 1].includes(monthOfYear(month)) ? 0.12 : 0;
  return base + worker.skill - stillLearning - cold;
};

const ORDINARY_STOPS = 0.012;
/** What an early stop leaves behind, on average. */
const STOP_COSTS = 0.525;

/** One pull: arrival, efficiency, early stop and the vacuum that follows from them. */
export const pullDown = (
  job: { kind: Kind; type: JobType; month: string; worker: Worker; base: number },
  random: Random,
): Pull => {
  const { share, isShort } = arrival(job.type, random);
  const steady = steadyLogit(job.base, job.worker, job.month);
  const thorough = logistic(steady + random.normal(0, 0.42));
  const stoppedEarly = random.chance(job.worker.stopsEarly);
  const efficiency = stoppedEarly ? thorough * random.between(0.25, 0.7) : thorough;
  const vacuum = usualVacuum(job.kind) * (1 + VACUUM_SLOPE * (efficiency - 0.94)) + random.normal(0, 0.9);
  const own = logistic(steady) * (1 - STOP_COSTS * job.worker.stopsEarly);
  const middling = logistic(job.base) * (1 - STOP_COSTS * ORDINARY_STOPS);
  return {
    share: share * efficiency,
    shortOnArrival: isShort,
    stoppedEarly,
    vacuumInHg: Math.max(0, vacuum),
    yieldLead: share * (own - middling),
  };
};
