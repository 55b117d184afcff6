import { totalOf } from '../arrivals/likelihood';
import { stopsEarlyOf } from '../arrivals/stops-early';
import { type NextWeighing, nextWeighing } from '../neighbours/cylinder-chain';
import { otherVisits } from '../neighbours/neighbours';
import type { JudgedRecord } from '../record';
import type { Bench, Seen } from './bench';
import { gapSpreadKg, onScale, SAME_PLATE } from './clues';
import { asWritten, type Hypothesis, hypothesesOf, type Meaning } from './hypotheses';
import { weigh } from './weigh';

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

/** Yields between these are usual, whatever the job; no slip of a known kind ends there but by chance. */
const PLAIN = { least: 0.7, most: 1.05 } as const;
/** A next weighing off by more than so many spreads is a reason to look closer. */
const FAR = 4;

/** Whether nothing about a record asks for a second reading: yield, scale steps, next weighing, other plates. */
const isPlain = (bench: Bench, record: JudgedRecord, written: Hypothesis, seen: Seen): boolean => {
  const y = record.recoveredMassKg / record.fullChargeKg;
  if (y < PLAIN.least || y > PLAIN.most || onScale(bench, record, written) < 1) return false;
  if (seen.plates.some((plate) => Math.abs(plate / record.nameplateChargeKg - 1) >= SAME_PLATE)) return false;
  if (!seen.next || record.startWeightKg === null) return true;
  const gap = seen.next.startWeightKg - record.startWeightKg - record.recoveredMassKg;
  return Math.abs(gap) <= FAR * gapSpreadKg(bench, record, seen.next);
};

/** What a pull adds to its person's share of early stops is taken out of it from this on. */
const NOTICEABLE = 0.001;

/** Weighs all that a record may mean against each other. */
export const weighHypotheses = (bench: Bench, record: JudgedRecord): Weighed => {
  const { baselines, neighbours } = bench;
  const seen: Seen = {
    next: nextWeighing(neighbours, record),
    plates: otherVisits(neighbours, record).map((visit) => visit.nameplateChargeKg),
    stopsEarly: stopsEarlyOf(baselines.arrivals, record.technicianId),
  };
  const written = asWritten(record);
  const first = weigh(bench, record, written, seen).stories;
  const stopped = first ? first.stopped / (totalOf(first) || 1) : 0;
  // A pull is no witness against itself: the person's share is taken without it.
  if (stopped > NOTICEABLE)
    seen.stopsEarly = stopsEarlyOf(baselines.arrivals, record.technicianId, { pulls: 1, stopped });
  const hypotheses = isPlain(bench, record, written, seen) ? [written] : hypothesesOf(record, neighbours);
  const judged = hypotheses.map((hypothesis) => ({ hypothesis, ...weigh(bench, record, hypothesis, seen) }));
  const total = judged.reduce((sum, { weight }) => sum + weight, 0) || 1;
  const meanings = judged.map(({ hypothesis, weight }) => ({ hypothesis, probability: weight / total }));
  const [own] = judged;
  const share = (key: 'sound' | 'short' | 'empty' | 'stopped') =>
    own?.stories ? ((own.weight / total) * own.stories[key]) / (totalOf(own.stories) || 1) : 0;
  return {
    meanings,
    sound: share('sound'),
    short: share('short'),
    empty: share('empty'),
    stopped: share('stopped'),
    next: seen.next,
    isOffStep: onScale(bench, record, written) < 1,
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
