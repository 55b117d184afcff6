import { requireFinite, requireWhole } from '@/analytics/statistics/checked';
import type { Expected } from './expected';
import { sharesAhead } from './mix';
import type { RoutineNoise } from './noise';

/** The month that has begun, which is the first of the months ahead. */
export type RunningMonth = {
  daysPassed: number;
  days: number;
  /** Kg so far by refrigerant; large jobs apart, since a month's pace does not follow from one chiller. */
  routineKg: ReadonlyMap<string, number>;
  largeKg: ReadonlyMap<string, number>;
};

const sum = (masses: ReadonlyMap<string, number>): number => [...masses.values()].reduce((all, mass) => all + mass, 0);

/**
 * How busy the month is against what was expected of its days so far: the mean of a gamma that a month's volume has
 * before, after the portions that have come by chance. Early in the month it stays near 1. Gelman et al. (2013), Bayesian
 * Data Analysis, section 2.6.
 */
const paceOf = (soFarKg: number, expectedKg: number, portionKg: number, noise: RoutineNoise): number => {
  const shape = 1 / (noise.monthly ** 2 + noise.level ** 2);
  return (shape + soFarKg / portionKg) / (shape + expectedKg / portionKg);
};

/**
 * The running month completed: what came in so far stands, and its other days bring what they should at the month's pace.
 * Later months are left as they are. Throws a RangeError on days that are none and masses below 0.
 */
export const completeRunningMonth = (expected: Expected, running: RunningMonth, noise: RoutineNoise): Expected => {
  const { daysPassed, days, routineKg: routineSoFar, largeKg: largeSoFar } = running;
  requireWhole(days, 'The days of the month', 28);
  requireWhole(daysPassed, 'The days passed');
  if (daysPassed > days) throw new RangeError(`${daysPassed} days have passed of ${days}`);
  const masses = [...routineSoFar.values(), ...largeSoFar.values()];
  requireFinite(masses, 'Masses so far');
  if (masses.some((mass) => mass < 0)) throw new RangeError('A mass so far is below 0');

  const { routineKg, jobs, trends } = expected;
  const rest = 1 - daysPassed / days;
  const shares = sharesAhead(trends, 1);
  const portionKg = trends.reduce((all, trend, at) => all + trend.portionKg * (shares[at] ?? 0), 0);
  const [monthKg = 0, ...laterKg] = routineKg;
  const [monthJobs = 0, ...laterJobs] = jobs;
  const pace = portionKg > 0 ? paceOf(sum(routineSoFar), monthKg * (1 - rest), portionKg, noise) : 1;
  const soFarKg = new Map(routineSoFar);
  for (const [refrigerant, mass] of largeSoFar) soFarKg.set(refrigerant, (soFarKg.get(refrigerant) ?? 0) + mass);
  return {
    ...expected,
    refrigerants: [...new Set([...expected.refrigerants, ...soFarKg.keys()])].sort(),
    routineKg: [monthKg * rest * pace, ...laterKg],
    jobs: [monthJobs * rest, ...laterJobs],
    soFarKg,
  };
};
