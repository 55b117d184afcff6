import type { JobType } from '@/lib/vocabulary';
import { type Place, unitAt } from './appliances';
import { workDays, yearOf } from './calendar';
import { EQUIPMENT, type EquipmentKind } from './equipment';
import type { Plan } from './plan';
import type { Random } from './random';
import { expectedJobs } from './seasons';

/** A visit that will end in a recovery, in the order of the calendar. */
export type Visit = { place: Place; day: string; time: string; type: JobType };

/** Nobody scraps a unit younger than this many years. */
const LEAST_AGE_AT_DISPOSAL = 9;
const JOBS: readonly JobType[] = ['service', 'repair', 'conversion', 'disposal'];

const jobType = (place: Place, month: string, random: Random): JobType => {
  const unit = unitAt(place);
  const age = yearOf(month) - yearOf(unit.manufacturedOn);
  // Old units are scrapped more and more often, until the last one is.
  const wear = Math.max(0, age - LEAST_AGE_AT_DISPOSAL) / 6;
  return random.pick(JOBS, (job) => {
    const usual = place.equipment.jobs[job];
    if (job === 'disposal') return usual * wear;
    if (job === 'repair' && unit.leaksAgain) return usual * 5;
    return usual;
  });
};

const clock = (random: Random): string => {
  const minutes = random.integer(7 * 60 + 20, 17 * 60 + 10);
  return `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`;
};

/** All visits of a month, earliest first. A unit is pulled down at most once a day. */
export const visitsOf = (
  month: string,
  {
    plan,
    firstMonth,
    placesOf,
  }: { plan: Plan; firstMonth: string; placesOf: (kind: EquipmentKind) => readonly Place[] },
  random: Random,
): Visit[] => {
  const days = workDays(month);
  const seen = new Set<string>();
  const visits = EQUIPMENT.flatMap((kind) => {
    const places = placesOf(kind);
    const mean = expectedJobs(kind, month, firstMonth) * plan.scale * Math.exp(random.normal(0, 0.05));
    return Array.from({ length: random.poisson(mean) }, (): Visit => {
      const place = random.pick(places, (p) => (unitAt(p).leaksAgain ? 2.4 : 1));
      return { place, day: random.pick(days), time: clock(random), type: jobType(place, month, random) };
    });
  }).filter(({ place, day }) => {
    const key = `${place.site.name}/${place.equipment.prefix}-${place.number}/${day}`;
    return !seen.has(key) && seen.add(key);
  });
  const at = ({ day, time }: Visit) => `${day}T${time}`;
  return visits.sort((a, b) => (at(a) < at(b) ? -1 : at(a) > at(b) ? 1 : 0));
};
