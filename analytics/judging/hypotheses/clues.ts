import type { NextWeighing } from '../neighbours/cylinder-chain';
import { readingSpreadKg } from '../readings/scale-spread';
import { scaleStep } from '../readings/scale-steps';
import { isOnStep, KG_PER_TICKET_UNIT } from '../readings/ticket-unit';
import type { JudgedRecord } from '../record';
import type { Bench } from './bench';
import type { Hypothesis } from './hypotheses';

/** A written mass off its scale's steps, by chance or by another scale: about so often. */
const OFF_STEP = 0.004;
/** Weighings that don't follow from one another although both are right: gas moved, a ticket missing. */
const BROKEN_CHAIN = 0.03;
const BROKEN_REACH_KG = 10;
/** Plates read differently at two visits without either being a slip of a known kind. */
const OTHER_PLATE = 0.006;
export const SAME_PLATE = 0.01;
/** Finest step that tickets are written in, as rounding hides what lies between. */
export const WRITTEN_STEP = 0.01;

export const bell = (x: number, spread: number): number =>
  Math.exp(-0.5 * (x / spread) ** 2) / (Math.sqrt(2 * Math.PI) * spread);

/** Whether a mass of this meaning could have been read off the scale, as a factor of probability. */
export const onScale = ({ baselines, settings }: Bench, record: JudgedRecord, hypothesis: Hypothesis): number => {
  const step = scaleStep(baselines.steps, record, hypothesis.nameplateChargeKg, settings);
  if (step === null || hypothesis.recoveredMassKg === null) return 1;
  const reading = hypothesis.recoveredMassKg / KG_PER_TICKET_UNIT[record.massUnit];
  const slack = hypothesis.factor === 1 ? undefined : (0.51 * WRITTEN_STEP) / hypothesis.factor;
  return isOnStep(reading, step, slack) ? 1 : (OFF_STEP * WRITTEN_STEP) / step;
};

/** Spread of the difference between this record's end and the next weighing's start, kg. */
export const gapSpreadKg = ({ baselines, settings }: Bench, record: JudgedRecord, next: NextWeighing): number =>
  Math.hypot(
    readingSpreadKg(record, baselines.steps, next.startWeightKg, settings),
    readingSpreadKg(next.record, baselines.steps, next.startWeightKg, settings),
  );

/** How well the next weighing of the cylinder follows if this much went in; density per kg. */
export const chained = (bench: Bench, record: JudgedRecord, next: NextWeighing | null, massKg: number): number => {
  if (!next || record.startWeightKg === null) return 1;
  const spread = gapSpreadKg(bench, record, next);
  const gap = next.startWeightKg - record.startWeightKg - massKg;
  return (1 - BROKEN_CHAIN) * bell(gap, spread) + BROKEN_CHAIN / BROKEN_REACH_KG;
};

/** How well a nameplate agrees with those of other visits. */
export const agreesWithVisits = (plates: readonly number[], nameplateKg: number): number =>
  plates.slice(0, 4).reduce((product, plate) => {
    const same = Math.abs(plate / nameplateKg - 1) < SAME_PLATE;
    return product * (same ? 1 - OTHER_PLATE : OTHER_PLATE);
  }, 1);
