import { type Stories, storiesOf, totalOf } from '../arrivals/likelihood';
import { personOf } from '../arrivals/mixture';
import { plateStepShare, sizeProbability } from '../baselines/nameplate-sizes';
import { jobKey, kindKey } from '../kinds';
import { scaleStep } from '../readings/scale-steps';
import { KG_PER_TICKET_UNIT } from '../readings/ticket-unit';
import { readVacuum } from '../readings/vacuum-groups';
import type { JudgedRecord } from '../record';
import type { Bench, Seen } from './bench';
import { agreesWithVisits, bell, chained, onScale, WRITTEN_STEP } from './clues';
import type { Hypothesis } from './hypotheses';

/** Weight of a meaning against the others, and the stories behind it where its mass is told. */
export type Judged = { weight: number; stories: Stories | null };

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
    ...personOf(baselines.arrivals, record.technicianId),
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

/** No meaning gives more than this of a charge; the written one may. */
const MOST_MEANT = 1.4;

/** Probability of what is written under one meaning, up to a factor that all meanings share. */
export const weigh = (bench: Bench, record: JudgedRecord, hypothesis: Hypothesis, seen: Seen): Judged => {
  const { nameplateChargeKg, recoveredMassKg, meaning } = hypothesis;
  if (meaning !== 'as_written' && recoveredMassKg !== null && recoveredMassKg > MOST_MEANT * nameplateChargeKg)
    return { weight: 0, stories: null };
  const { weight, stories } =
    recoveredMassKg === null
      ? weighUntold(bench, record, hypothesis, seen)
      : weighTold(bench, record, hypothesis, recoveredMassKg, seen);
  const plate =
    sizeProbability(bench.baselines.sizes, record, nameplateChargeKg) *
    plateStepShare(record, nameplateChargeKg) *
    agreesWithVisits(seen.plates, nameplateChargeKg);
  return { weight: hypothesis.prior * plate * weight, stories };
};
