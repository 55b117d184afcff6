import type { Columns } from './columns';
import type { JobChances } from './job-chances';
import { COUNTS } from './judged-jobs';
import { SumsWithout } from './sums-without';

/** What a technician's judged jobs add up to. Yields as shares of the full charge, vacuums in usual deviations. */
export type PersonSums = {
  jobs: number;
  /** Jobs that too few colleagues' were like. */
  weakJobs: number;
  /** Jobs with a final vacuum told that can be compared. */
  vacuumJobs: number;
  /** Full pulls: their weight, mean difference from colleagues', and variance of one about it. */
  full: Moments;
  /** Jobs on units that did not come short, stopped early or not. */
  present: Moments;
  /** Mean yield of colleagues' on such units. */
  presentExpected: number;
  /** Final vacuum of pulls that were not stopped early: above 0 is shallower than colleagues', also in kPa. */
  vacuum: Moments;
  vacuumKpa: Moments;
  /** Pulls that look stopped early, and jobs on units that did not come short, both as sums of chances. */
  early: number;
  earlyOf: number;
};
export type Moments = {
  weight: number;
  mean: number;
  variance: number;
  squaredWeights: number;
  /** What the sum may be off by because it is not sure which jobs belong to it, as a variance. */
  doubt: number;
};

const PRIOR_YIELDS = 5;
const PRIOR_SPREAD = 20;

class MomentSums {
  weight = 0;
  sum = 0;
  squares = 0;
  squaredWeights = 0;
  /** Σ of weight × variance that one such job usually has. */
  usual = 0;
  /** Σ of squared value × variance of the weight, where the weight is a chance. */
  doubt = 0;

  add(weight: number, value: number, usualVariance: number): void {
    this.weight += weight;
    this.sum += weight * value;
    this.squares += weight * value * value;
    this.squaredWeights += weight * weight;
    this.usual += weight * usualVariance;
    this.doubt += weight * (1 - weight) * value * value;
  }

  /** Own variance drawn towards the usual one, and never below it: a lucky run is small in spread too. */
  moments(): Moments {
    if (this.weight <= 0) return { weight: 0, mean: 0, variance: 0, squaredWeights: 0, doubt: 0 };
    const mean = this.sum / this.weight;
    const usual = this.usual / this.weight;
    const own = Math.max(0, this.squares / this.weight - mean * mean);
    const drawn = (this.weight * own + PRIOR_SPREAD * usual) / (this.weight + PRIOR_SPREAD);
    const variance = Math.max(usual, drawn);
    return { weight: this.weight, mean, variance, squaredWeights: this.squaredWeights, doubt: this.doubt };
  }
}

/** Standard error of a weighted mean of jobs. Infinity where there are none. */
export const standardErrorOf = ({ weight, variance, squaredWeights, doubt }: Moments): number =>
  weight > 0 ? Math.sqrt(variance * squaredWeights + doubt) / weight : Number.POSITIVE_INFINITY;

/** Sums by technician, and by job what colleagues' jobs on such units gave (those that came short left out). */
export type CrewSums = { technicians: PersonSums[]; expected: Float64Array; usualVariance: number };

/** Sums by technician over the jobs that count, against what colleagues' jobs of the kind gave. */
export const personSums = (columns: Columns, chances: JobChances, reasons: Uint8Array): CrewSums => {
  const { count, kind, technician, yields } = columns;
  const people = columns.technicians.length;
  const present = new SumsWithout(columns.kinds, people);
  for (let at = 0; at < count; at++) {
    if (reasons[at] !== COUNTS) continue;
    present.add(kind[at] ?? 0, technician[at] ?? 0, 1 - (chances.short[at] ?? 0), yields[at] ?? 0);
  }
  const spread = new MomentSums();
  const expected = new Float64Array(count);
  for (let at = 0; at < count; at++) {
    const k = kind[at] ?? 0;
    const t = technician[at] ?? 0;
    const own = present.expected(k, t, PRIOR_YIELDS);
    expected[at] = own;
    if (reasons[at] === COUNTS && chances.comparable[at])
      spread.add(1 - (chances.short[at] ?? 0), (yields[at] ?? 0) - own, 0);
  }
  const usualPresent = spread.weight > 0 ? spread.squares / spread.weight : 0;

  const sums = columns.technicians.map(() => ({
    jobs: 0,
    weakJobs: 0,
    vacuumJobs: 0,
    early: 0,
    earlyOf: 0,
    expected: 0,
    full: new MomentSums(),
    present: new MomentSums(),
    vacuum: new MomentSums(),
    vacuumKpa: new MomentSums(),
  }));
  for (let at = 0; at < count; at++) {
    const own = sums[technician[at] ?? 0];
    if (!own || reasons[at] !== COUNTS) continue;
    own.jobs += 1;
    if (!chances.comparable[at]) {
      own.weakJobs += 1;
      continue;
    }
    const short = chances.short[at] ?? 0;
    const early = chances.early[at] ?? 0;
    const full = 1 - short - early;
    own.full.add(full, (yields[at] ?? 0) - (chances.fullYield[at] ?? 0), (chances.yieldDeviation[at] ?? 0) ** 2);
    own.present.add(1 - short, (yields[at] ?? 0) - (expected[at] ?? 0), usualPresent);
    own.expected += expected[at] ?? 0;
    const shallower = chances.shallower[at] ?? Number.NaN;
    if (Number.isNaN(shallower)) continue;
    own.vacuumJobs += 1;
    own.vacuum.add(1 - early, shallower, 1);
    own.vacuumKpa.add(1 - early, chances.shallowerKpa[at] ?? 0, 0);
    own.early += early;
    own.earlyOf += 1 - short;
  }
  const technicians = sums.map(({ full, present: there, vacuum, vacuumKpa, expected: sum, ...own }) => ({
    ...own,
    presentExpected: sum / Math.max(1, own.jobs - own.weakJobs),
    full: full.moments(),
    present: there.moments(),
    vacuum: vacuum.moments(),
    vacuumKpa: vacuumKpa.moments(),
  }));
  return { technicians, expected, usualVariance: usualPresent };
};
