import type { JobType } from '@/lib/vocabulary';
import { FAMILY_NAMES, GIVEN_NAMES } from '../names';
import type { Random } from '../random';
import type { Kind } from './kinds';
import { monthAfter, monthsBetween } from './months';
import type { CrewClass, SimulationOptions } from './options';

export type Worker = {
  name: string;
  class: CrewClass;
  skill: number;
  learning: { drop: number; jobs: number } | null;
  stopsEarly: number;
  firstMonth: string;
  lastMonth: string;
  /** Relative amount of work. */
  pace: number;
  roundsToPounds: boolean;
  /** A scale that reads low from a month on. */
  drift: { fromMonth: string; factor: number } | null;
  jobsDone: number;
  /** Sum over the jobs: expected yield less that of a middling colleague, in shares of nameplate. */
  yieldLead: number;
};

const crewSize = (size: number): number => Math.max(5, Math.round(4 + size / 550));

const classesOf = (count: number, plantsPeople: boolean): CrewClass[] => {
  const planted: CrewClass[] = plantsPeople
    ? ['bad_low_skill', 'bad_stops_early', 'leak_specialist_good', 'large_plant_specialist', 'scale_drifts_low']
    : ['leak_specialist_good', 'large_plant_specialist'];
  return Array.from({ length: count }, (_, i) => planted[i] ?? 'ordinary');
};

/** Makes the crew: one of each planted class, the others ordinary, some of them hired later or gone early. */
export const drawCrew = (options: SimulationOptions, random: Random): Worker[] => {
  const { firstMonth, lastMonth } = options;
  const span = monthsBetween(firstMonth, lastMonth);
  const names = new Set<string>();
  return classesOf(crewSize(options.size), options.plantsPeople).map((of) => {
    let name: string;
    do name = `${random.pick(GIVEN_NAMES)} ${random.pick(FAMILY_NAMES)}`;
    while (names.has(name));
    names.add(name);
    const isHired = of === 'ordinary' ? random.chance(0.35) : of !== 'large_plant_specialist' && random.chance(0.5);
    const leaves = of === 'ordinary' && random.chance(0.2);
    const hiredAt = isHired ? random.integer(Math.floor(span * 0.1), Math.floor(span * 0.6)) : 0;
    const leavesAt = leaves ? random.integer(Math.min(span, hiredAt + 24), span) : span;
    const learns = isHired && of === 'ordinary';
    return {
      name,
      class: of,
      skill:
        of === 'bad_low_skill'
          ? -random.between(0.95, 1.35)
          : of === 'leak_specialist_good'
            ? random.between(0.1, 0.4)
            : random.normal(0, 0.22),
      learning: learns ? { drop: random.between(0.35, 0.8), jobs: random.between(20, 60) } : null,
      stopsEarly: of === 'bad_stops_early' ? random.between(0.16, 0.26) : random.between(0.004, 0.02),
      firstMonth: monthAfter(firstMonth, hiredAt),
      lastMonth: monthAfter(firstMonth, leavesAt),
      pace: Math.exp(random.normal(0, 0.3)),
      roundsToPounds: random.chance(0.2),
      drift:
        of === 'scale_drifts_low'
          ? { fromMonth: monthAfter(lastMonth, -random.integer(12, 30)), factor: 1 - random.between(0.05, 0.09) }
          : null,
      jobsDone: 0,
      yieldLead: 0,
    };
  });
};

const leaning = (worker: Worker, kind: Kind, job: JobType): number => {
  if (worker.class === 'leak_specialist_good') return job === 'repair' ? 5 : 0.7;
  if (worker.class === 'large_plant_specialist') return kind.isLarge ? 8 : 0.8;
  return 1;
};

/** Who of those employed in the month does the job. */
export const whoWorks = (crew: readonly Worker[], month: string, kind: Kind, job: JobType, random: Random): Worker => {
  const there = crew.filter(({ firstMonth, lastMonth }) => firstMonth <= month && month <= lastMonth);
  return random.pick(there.length ? there : crew, (worker) => worker.pace * leaning(worker, kind, job));
};
