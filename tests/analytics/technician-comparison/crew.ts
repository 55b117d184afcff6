import type { ComparedRecovery } from '@/analytics/technician-comparison/recovery';
import { normals, uniforms } from '../statistics/random';

/** Somebody of a hand-made crew; all that is not told is as with the others. */
export type Person = {
  id: string;
  jobs?: number;
  /** Share of the charge that his full pulls leave more than the others'. */
  leaves?: number;
  /** Share of his pulls that he stops at half, and another one from a job on. */
  stops?: number;
  stopsFrom?: { job: number; stops: number };
  leaks?: number;
  /** From a job on his scale reads a share low, or his work leaves a share more. */
  scale?: { job: number; low: number };
  worse?: { job: number; leaves: number };
  category?: string;
  /** Days after the first of the crew on which he begins. */
  begins?: number;
};

const DAY_MS = 86_400_000;
const FIRST = Date.UTC(2023, 0, 2);
const DAYS = 1000;
/** Usual vacuum in kPa absolute, its deviation, and what a pull that leaves everything would miss: 10, 0.9 and 5 inHg. */
const [USUAL_KPA, DEVIATION_KPA, SLOPE_KPA] = [67.5, 3.05, 17];

/**
 * A crew's recoveries over a thousand days: full pulls give 0.92 of the charge, give or take 0.04; a unit that leaked
 * gives half; the vacuum gets shallower with what is left behind, and neither a leak nor a scale touches it.
 */
export const crewOf = (people: readonly Person[], seed: number): ComparedRecovery[] => {
  const [luck, draw] = [normals(seed), uniforms(seed + 1)];
  const all = people.flatMap((person) => {
    const count = person.jobs ?? 150;
    return Array.from({ length: count }, (_, job): ComparedRecovery => {
      const leaked = draw() < (person.leaks ?? 0.2);
      const isStopped =
        draw() < (person.stopsFrom && job >= person.stopsFrom.job ? person.stopsFrom.stops : (person.stops ?? 0.01));
      const leaves = (person.leaves ?? 0) + (person.worse && job >= person.worse.job ? person.worse.leaves : 0);
      const full = 0.92 - leaves + 0.03 * luck() * (1 + 4 * leaves);
      const efficiency = isStopped ? full * (0.3 + 0.4 * draw()) : full;
      const charge = leaked ? 0.2 + 0.6 * draw() : 1 + 0.02 * luck();
      const reads = person.scale && job >= person.scale.job ? 1 - person.scale.low : 1;
      const begins = person.begins ?? 0;
      const day = begins + Math.floor(((DAYS - begins) * job) / count);
      return {
        technicianId: person.id,
        category: person.category ?? 'comfort_cooling',
        jobType: leaked ? 'repair' : 'service',
        fullChargeKg: 5,
        recoveredMassKg: Math.max(0, 5 * charge * efficiency * reads),
        recoveredOn: new Date(FIRST + day * DAY_MS).toISOString().slice(0, 10),
        finalVacuumKpaAbs: USUAL_KPA + SLOPE_KPA * (0.92 - efficiency) + DEVIATION_KPA * luck(),
        requiredLevelKpaAbs: 70,
        held: null,
        weighedTwice: true,
        writtenSameDay: null,
        decided: null,
      };
    });
  });
  return all.sort((a, b) => (a.recoveredOn < b.recoveredOn ? -1 : Number(a.recoveredOn > b.recoveredOn)));
};

/** Eleven people who work alike. */
export const alike: readonly Person[] = [
  'Ada',
  'Ben',
  'Cleo',
  'Dan',
  'Eve',
  'Finn',
  'Gus',
  'Hal',
  'Ida',
  'Jo',
  'Kit',
].map((id) => ({ id }));

/** The same, but for some. */
export const crewWith = (...changed: Person[]): Person[] =>
  alike.map((person) => changed.find(({ id }) => id === person.id) ?? person);
