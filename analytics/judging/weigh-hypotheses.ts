import { type Stories, storiesOf, totalOf } from './arrivals/likelihood';
import { stopsEarlyOf } from './arrivals/mixture';
import type { Baselines } from './baselines/baselines';
import { plateStepShare, sizeProbability } from './baselines/nameplate-sizes';
import { type Hypothesis, hypothesesOf, type Meaning } from './hypotheses';
import { jobKey, kindKey } from './kinds';
import { type NextWeighing, nextWeighing } from './neighbours/cylinder-chain';
import { lightestKg, type Neighbours, otherVisits } from './neighbours/neighbours';
import { readingSpreadKg } from './readings/scale-spread';
import { scaleStep } from './readings/scale-steps';
import { isOnStep, KG_PER_TICKET_UNIT } from './readings/ticket-unit';
import { readVacuum } from './readings/vacuum-groups';
import type { JudgedRecord } from './record';
import type { JudgingSettings } from './settings';

/** What a record most likely says: probabilities of its meanings, and of the stories if it means what is written. */
export type Weighed = {
  /** Probability of each meaning; they add up to 1. */
  meanings: { hypothesis: Hypothesis; probability: number }[];
  /** Probabilities of the stories together with the record meaning what it says. */
  sound: number;
  short: number;
  empty: number;
  stopped: number;
  next: NextWeighing | null;
  /** Whether the net mass lies between the steps of the scale. */
  isOffStep: boolean;
};

/** A written mass off its scale's steps, by chance or by another scale: about so often. */
const OFF_STEP = 0.004;
/** Weighings that don't follow from one another although both are right: gas moved, a ticket missing. */
const BROKEN_CHAIN = 0.03;
const BROKEN_REACH_KG = 10;
/** Plates read differently at two visits without either being a slip of a known kind. */
const OTHER_PLATE = 0.006;
const SAME_PLATE = 0.01;
/** Finest step that tickets are written in, as rounding hides what lies between. */
const WRITTEN_STEP = 0.01;

const bell = (x: number, spread: number): number =>
  Math.exp(-0.5 * (x / spread) ** 2) / (Math.sqrt(2 * Math.PI) * spread);

export type Bench = { baselines: Baselines; neighbours: Neighbours; settings: JudgingSettings };

/** Whether a mass of this meaning could have been read off the scale, as a factor of probability. */
const onScale = ({ baselines, settings }: Bench, record: JudgedRecord, hypothesis: Hypothesis): number => {
  const step = scaleStep(baselines.steps, record, hypothesis.nameplateChargeKg, settings);
  if (step === null || hypothesis.recoveredMassKg === null) return 1;
  const reading = hypothesis.recoveredMassKg / KG_PER_TICKET_UNIT[record.massUnit];
  const slack = hypothesis.factor === 1 ? undefined : (0.51 * WRITTEN_STEP) / hypothesis.factor;
  return isOnStep(reading, step, slack) ? 1 : (OFF_STEP * WRITTEN_STEP) / step;
};

/** How well the next weighing of the cylinder follows if this much went in; density per kg. */
const chained = (bench: Bench, record: JudgedRecord, next: NextWeighing | null, massKg: number): number => {
  if (!next || record.startWeightKg === null) return 1;
  const { baselines, settings } = bench;
  const spread = Math.hypot(
    readingSpreadKg(record, baselines.steps, next.startWeightKg, settings),
    readingSpreadKg(next.record, baselines.steps, next.startWeightKg, settings),
  );
  const gap = next.startWeightKg - record.startWeightKg - massKg;
  return (1 - BROKEN_CHAIN) * bell(gap, spread) + BROKEN_CHAIN / BROKEN_REACH_KG;
};

const agreesWithVisits = (plates: readonly number[], nameplateKg: number): number =>
  plates.slice(0, 4).reduce((product, plate) => {
    const same = Math.abs(plate / nameplateKg - 1) < SAME_PLATE;
    return product * (same ? 1 - OTHER_PLATE : OTHER_PLATE);
  }, 1);

type Seen = { next: NextWeighing | null; lightestKg: number | null; plates: number[]; stopsEarly: number };
type Judged = { weight: number; stories: Stories | null };

/** The stories of a pull of so much out of a charge of so much. */
const storiesIf = (bench: Bench, record: JudgedRecord, fullChargeKg: number, recoveryYield: number, seen: Seen) => {
  const { baselines, settings } = bench;
  const vacuum = readVacuum(baselines.vacuums, record, fullChargeKg, settings);
  return storiesOf(baselines.arrivals, {
    kind: kindKey(record, fullChargeKg, settings),
    job: jobKey(record),
    recoveryYield,
    vacuum: vacuum && { z: vacuum.z, usual: vacuum.usualKpa / vacuum.spreadKpa },
    stopsEarly: seen.stopsEarly,
    leaves: baselines.arrivals.leavesOf[record.technicianId] ?? 1,
  });
};

/** Probability of a record whose mass is told, up to a factor that all meanings share. */
const weighTold = (bench: Bench, record: JudgedRecord, hypothesis: Hypothesis, massKg: number, seen: Seen): Judged => {
  const { baselines, settings } = bench;
  const fullChargeKg = hypothesis.nameplateChargeKg + record.fullChargeKg - record.nameplateChargeKg;
  const step = scaleStep(baselines.steps, record, fullChargeKg, settings) ?? WRITTEN_STEP;
  const stepShare = Math.min(1, (step * KG_PER_TICKET_UNIT[record.massUnit]) / fullChargeKg);
  // A mass of nothing stands for the lower half of a step.
  const isNothing = massKg === 0;
  const stories = storiesIf(bench, record, fullChargeKg, isNothing ? stepShare / 4 : massKg / fullChargeKg, seen);
  const ofMass = totalOf(stories) * stepShare * (isNothing ? 0.5 : 1) * onScale(bench, record, hypothesis);
  return { weight: ofMass * chained(bench, record, seen.next, massKg), stories };
};

/** The same where the ticket doesn't tell the mass: the next weighing does, or nothing. */
const weighUntold = (bench: Bench, record: JudgedRecord, hypothesis: Hypothesis, seen: Seen): Judged => {
  const { baselines, settings } = bench;
  const { fullChargeKg } = record;
  // Any mass up to the charge might have been written by mistake.
  const step = scaleStep(baselines.steps, record, fullChargeKg, settings) ?? WRITTEN_STEP;
  const written =
    hypothesis.meaning === 'mass_missing'
      ? 1
      : Math.min(1, (step * KG_PER_TICKET_UNIT[record.massUnit]) / fullChargeKg);
  const wentIn = seen.next && record.startWeightKg !== null ? seen.next.startWeightKg - record.startWeightKg : null;
  if (wentIn === null) {
    const vacuum = readVacuum(baselines.vacuums, record, fullChargeKg, settings);
    return { weight: written * (vacuum ? bell(vacuum.z, 1) : 1), stories: null };
  }
  const stories = storiesIf(bench, record, fullChargeKg, wentIn / fullChargeKg, seen);
  return { weight: (written * totalOf(stories)) / fullChargeKg, stories: null };
};

const weigh = (bench: Bench, record: JudgedRecord, hypothesis: Hypothesis, seen: Seen): Judged => {
  const { nameplateChargeKg, recoveredMassKg } = hypothesis;
  const { weight, stories } =
    recoveredMassKg === null
      ? weighUntold(bench, record, hypothesis, seen)
      : weighTold(bench, record, hypothesis, recoveredMassKg, seen);
  const plate =
    sizeProbability(bench.baselines.sizes, record, nameplateChargeKg, seen.lightestKg) *
    plateStepShare(record, nameplateChargeKg) *
    agreesWithVisits(seen.plates, nameplateChargeKg);
  return { weight: hypothesis.prior * plate * weight, stories };
};

const ownPart = (told: Stories): { pulls: number; stopped: number } => ({
  pulls: 1,
  stopped: told.stopped / (totalOf(told) || 1),
});

/** Weighs all that a record may mean against each other. */
export const weighHypotheses = (bench: Bench, record: JudgedRecord): Weighed => {
  const { baselines, neighbours } = bench;
  const seen: Seen = {
    next: nextWeighing(neighbours, record),
    lightestKg: lightestKg(neighbours, record),
    plates: otherVisits(neighbours, record).map((visit) => visit.nameplateChargeKg),
    stopsEarly: stopsEarlyOf(baselines.arrivals, record.technicianId),
  };
  const hypotheses = hypothesesOf(record, neighbours);
  const written = hypotheses[0];
  const first = written ? weigh(bench, record, written, seen).stories : null;
  // A pull is no witness against itself: the person's share is taken without it.
  if (first) seen.stopsEarly = stopsEarlyOf(baselines.arrivals, record.technicianId, ownPart(first));
  const judged = hypotheses.map((hypothesis) => ({ hypothesis, ...weigh(bench, record, hypothesis, seen) }));
  const total = judged.reduce((sum, { weight }) => sum + weight, 0) || 1;
  const meanings = judged.map(({ hypothesis, weight }) => ({ hypothesis, probability: weight / total }));
  const asWritten = judged[0];
  const stories = asWritten?.stories;
  const share = (key: 'sound' | 'short' | 'empty' | 'stopped') =>
    stories && asWritten ? ((asWritten.weight / total) * stories[key]) / (totalOf(stories) || 1) : 0;
  return {
    meanings,
    sound: share('sound'),
    short: share('short'),
    empty: share('empty'),
    stopped: share('stopped'),
    next: seen.next,
    isOffStep: written ? onScale(bench, record, written) < 1 : false,
  };
};

/** Probability that the record means one of these. */
export const probabilityOf = (weighed: Weighed, meanings: readonly Meaning[]): number =>
  weighed.meanings.reduce((sum, { hypothesis, probability }) => {
    return meanings.includes(hypothesis.meaning) ? sum + probability : sum;
  }, 0);

/** The likeliest of these meanings. */
export const likeliestOf = (weighed: Weighed, meanings: readonly Meaning[]): Hypothesis | null => {
  const found = weighed.meanings
    .filter(({ hypothesis }) => meanings.includes(hypothesis.meaning))
    .sort((a, b) => b.probability - a.probability)[0];
  return found?.hypothesis ?? null;
};
