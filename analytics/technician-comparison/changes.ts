import type { Columns } from './columns';
import type { JobChances } from './job-chances';
import { FIRST_JOBS, SHORT_ON_ARRIVAL } from './judged-jobs';
import { type LevelStep, levelOf, levelStep, type Sequence } from './level-step';

/** From a day on, all pulls of a technician came out otherwise than before. */
export type Change = {
  technician: number;
  fromDay: number;
  /** First day on which it was over; null while it lasts. */
  toDay: number | null;
  jobs: number;
  /** Full pulls against those before, as a share of what they were: −0.07 is 7 % less. With its 95 % range. */
  share: number;
  low: number;
  high: number;
  /** Mean share of colleagues' full pulls that he was off by, before and since. */
  before: number;
  after: number;
  p: number;
  /** Final vacuum against that before, in usual deviations (above 0 is shallower); null where too few are told. */
  shallower: number | null;
  /** What explains it: the scale where the vacuum stayed as it was, the work where it went with the yield. */
  cause: 'scale' | 'work' | 'open';
};

/** Chance by luck, allowed for the number of technicians, from which on a step is one. */
const LEAST_CHANCE = 0.02;
/** A scale that errs by less than this is not told from luck; one that errs by more is no drift but a broken one. */
const LEAST_SHARE = 0.025;
const MOST_SHARE = 0.25;
/**
 * How much likelier than the other each explanation must be. To check a scale costs minutes and blames nobody; that
 * somebody works worse takes more (Royall 1997, Statistical Evidence, chapter 1: 8 is fairly strong).
 */
const SCALE_RATIO = 1.5;
const WORK_RATIO = 8;
const MOST_BY_SPREAD = Math.log(4);
/** Vacuums on either side of a step without which nothing is said of its cause. */
const LEAST_VACUUMS = 6;
const Z_95 = 1.96;

/** `slopes` tell, with the weights of the vacuums, how much shallower one gets for each share of the charge that is left. */
type Jobs = { places: number[]; pulls: Sequence; vacuums: Sequence; slopes: Sequence };

/** By technician, the jobs in which a change may be looked for: his first ones are left out, learning is a change too. */
const jobsByTechnician = (columns: Columns, chances: JobChances, reasons: Uint8Array): Jobs[] => {
  const all = columns.technicians.map(() => ({
    places: [] as number[],
    values: [] as number[],
    weights: [] as number[],
    shallower: [] as number[],
    told: [] as number[],
    slopes: [] as number[],
  }));
  for (let at = 0; at < columns.count; at++) {
    const own = all[columns.technician[at] ?? 0];
    if (!own || !chances.comparable[at] || reasons[at] === FIRST_JOBS || reasons[at] === SHORT_ON_ARRIVAL) continue;
    const early = chances.early[at] ?? 0;
    const shallower = chances.shallower[at] ?? Number.NaN;
    const told = Number.isNaN(shallower) ? 0 : 1 - early;
    own.places.push(at);
    own.values.push((columns.yields[at] ?? 0) / (chances.fullYield[at] ?? 1) - 1);
    own.weights.push(1 - (chances.short[at] ?? 0) - early);
    own.shallower.push(told > 0 ? shallower : 0);
    own.told.push(told);
    own.slopes.push(chances.slopes[columns.vacuumKind[at] ?? 0] ?? 0);
  }
  return all.map(({ places, values, weights, shallower, told, slopes }) => ({
    places,
    slopes: { values: slopes, weights: told },
    pulls: { values, weights },
    vacuums: { values: shallower, weights: told },
  }));
};

/** Weighted deviation of the values about the levels on either side of `at`. */
const deviationAbout = ({ values, weights }: Sequence, at: number): number => {
  const levels = [levelOf({ values, weights }, 0, at).mean, levelOf({ values, weights }, at, values.length).mean];
  let [weight, squares] = [0, 0];
  values.forEach((value, place) => {
    const own = weights[place] ?? 0;
    weight += own;
    squares += own * (value - (levels[place < at ? 0 : 1] ?? 0)) ** 2;
  });
  return weight > 2 ? Math.sqrt(squares / (weight - 2)) : 0;
};

const slice = ({ values, weights }: Sequence, from: number): Sequence => ({
  values: values.slice(from),
  weights: weights.slice(from),
});

type Spread = { weight: number; deviation: number };

/** How far apart the values from `from` up to `to` lie about their own level. */
const spreadOf = ({ values, weights }: Sequence, from: number, to: number): Spread => {
  const { mean, weight } = levelOf({ values, weights }, from, to);
  let squares = 0;
  for (let at = from; at < to; at++) squares += (weights[at] ?? 0) * ((values[at] ?? 0) - mean) ** 2;
  return { weight, deviation: weight > 0 ? Math.sqrt(squares / weight) : 0 };
};

/** Where a fall from `step` on came to its end: a rise back in what follows. */
const endOf = (pulls: Sequence, step: LevelStep, deviation: number): number | null => {
  const back = levelStep(slice(pulls, step.at), deviation);
  return back && back.p <= LEAST_CHANCE && back.difference > -step.difference / 2 ? step.at + back.at : null;
};

/** Log of how much likelier the scale makes the change of vacuum than the work does: under "work" it follows the yield. */
const byVacuum = (change: number, shallower: number, error: number, perShare: number): number =>
  ((shallower + change * perShare) ** 2 - shallower ** 2) / (2 * error * error);

const logNormal = (value: number, mean: number, deviation: number): number =>
  -0.5 * ((value - mean) / deviation) ** 2 - Math.log(deviation);

/**
 * The same by how far full pulls lie apart. A scale takes a constant share off each and leaves them as close together as
 * they were; who works worse also works less evenly, by about a quarter (invented companies; a weak sign, and kept so).
 */
const bySpread = (before: Spread, after: Spread): number => {
  if (before.deviation <= 0 || after.deviation <= 0) return 0;
  const growth = Math.log(after.deviation / before.deviation);
  const error = Math.sqrt(1 / (2 * before.weight) + 1 / (2 * after.weight));
  const ratio = logNormal(growth, 0, Math.hypot(error, 0.1)) - logNormal(growth, 0.25, Math.hypot(error, 0.15));
  return Math.max(-MOST_BY_SPREAD, Math.min(MOST_BY_SPREAD, ratio));
};

const causeOf = (logRatio: number): Change['cause'] => {
  if (logRatio >= Math.log(SCALE_RATIO)) return 'scale';
  return logRatio <= -Math.log(WORK_RATIO) ? 'work' : 'open';
};

/**
 * The clearest lasting change in each technician's full pulls, and whether the final vacuum went with it. A scale that
 * reads a share too little takes that share off every pull and leaves the vacuum alone; who works worse ends shallower.
 */
export const changes = (columns: Columns, chances: JobChances, reasons: Uint8Array): Change[] => {
  const people = columns.technicians.length;
  return jobsByTechnician(columns, chances, reasons).flatMap(({ places, pulls, vacuums, slopes }, technician) => {
    const usual = deviationAbout(pulls, pulls.values.length);
    const first = levelStep(pulls, usual);
    if (!first) return [];
    const deviation = deviationAbout(pulls, first.at);
    const step = levelStep(pulls, deviation);
    if (!step || step.p * people > LEAST_CHANCE) return [];
    const end = step.difference < 0 ? endOf(pulls, step, deviation) : null;
    const to = end ?? pulls.values.length;
    const before = levelOf(pulls, 0, step.at);
    const after = levelOf(pulls, step.at, to);
    const share = (1 + after.mean) / (1 + before.mean) - 1;
    const error = deviation * Math.sqrt(1 / before.weight + 1 / after.weight);
    const vacuumBefore = levelOf(vacuums, 0, step.at);
    const vacuumAfter = levelOf(vacuums, step.at, to);
    const told = Math.min(vacuumBefore.weight, vacuumAfter.weight) >= LEAST_VACUUMS;
    const shallower = told ? vacuumAfter.mean - vacuumBefore.mean : null;
    const vacuumError = Math.sqrt(1 / Math.max(1, vacuumBefore.weight) + 1 / Math.max(1, vacuumAfter.weight));
    const drift = share <= -LEAST_SHARE && share >= -MOST_SHARE;
    const unevenness = bySpread(spreadOf(pulls, 0, step.at), spreadOf(pulls, step.at, to));
    const perShare = levelOf(slopes, step.at, to).mean;
    const cause = shallower === null ? 'open' : causeOf(byVacuum(share, shallower, vacuumError, perShare) + unevenness);
    return [
      {
        technician,
        fromDay: columns.days[places[step.at] ?? 0] ?? 0,
        toDay: end === null ? null : (columns.days[places[end] ?? 0] ?? null),
        jobs: to - step.at,
        share,
        low: share - Z_95 * error,
        high: share + Z_95 * error,
        before: before.mean,
        after: after.mean,
        p: Math.min(1, step.p * people),
        shallower,
        cause: cause === 'scale' && !drift ? 'open' : cause,
      },
    ];
  });
};
