import { type Baselines, fitBaselines } from './baselines/baselines';
import { peersOf } from './baselines/peers';
import { weighHypotheses } from './hypotheses/weigh-hypotheses';
import type { Judgement } from './judgement';
import { type Neighbours, neighboursOf } from './neighbours/neighbours';
import { readVacuum } from './readings/vacuum-groups';
import type { JudgedCylinder, JudgedRecord } from './record';
import { cylinderChain } from './rules/cylinder-chain';
import { cylinderOverfilled } from './rules/cylinder-overfilled';
import { dateDoubtful } from './rules/date-doubtful';
import { doubled } from './rules/doubled';
import { holdMissing } from './rules/hold-missing';
import { levelNotReached } from './rules/level-not-reached';
import { lowUnexplained } from './rules/low-unexplained';
import { nameplateDoubtful } from './rules/nameplate-doubtful';
import { overFullCharge } from './rules/over-full-charge';
import type { Rule } from './rules/rule';
import { shortOnArrival } from './rules/short-on-arrival';
import { stoppedEarly } from './rules/stopped-early';
import { unitSlip } from './rules/unit-slip';
import { weightsDisagree } from './rules/weights-disagree';
import { wrongCylinder } from './rules/wrong-cylinder';
import type { JudgingSettings } from './settings';

const RULES: readonly Rule[] = [
  stoppedEarly,
  shortOnArrival,
  lowUnexplained,
  unitSlip,
  weightsDisagree,
  cylinderChain,
  overFullCharge,
  nameplateDoubtful,
  doubled,
  levelNotReached,
  holdMissing,
  cylinderOverfilled,
  wrongCylinder,
  dateDoubtful,
];

const judge = (
  record: JudgedRecord,
  neighbours: Neighbours,
  baselines: Baselines,
  settings: JudgingSettings,
): Judgement[] => {
  const weighed = weighHypotheses({ baselines, neighbours, settings }, record);
  const of = {
    record,
    neighbours,
    baselines,
    settings,
    weighed,
    peers: peersOf(baselines.peers, record, settings),
    vacuum: readVacuum(baselines.vacuums, record, record.fullChargeKg, settings),
  };
  return RULES.flatMap((rule): Judgement[] => {
    const finding = rule(of);
    return finding ? [{ recordId: record.id, ...finding }] : [];
  }).sort((a, b) => b.certainty - a.certainty);
};

/**
 * Judges some records by baselines fitted before. `around` are all records of their appliances and cylinders, the
 * touched ones among them. Gives the flags that a full run with these baselines would give for the touched records:
 * several a record, the surest first.
 */
export const judgeTouched = (
  touchedIds: ReadonlySet<string>,
  around: readonly JudgedRecord[],
  cylinders: readonly JudgedCylinder[],
  baselines: Baselines,
  settings: JudgingSettings,
): Judgement[] => {
  const neighbours = neighboursOf(around, cylinders);
  return around
    .filter(({ id }) => touchedIds.has(id))
    .flatMap((record) => judge(record, neighbours, baselines, settings));
};

/** Fits the baselines of a company and judges all of its records by them. Pure: no clock, no database. */
export const judgeRecords = (
  records: readonly JudgedRecord[],
  cylinders: readonly JudgedCylinder[],
  settings: JudgingSettings,
): { flags: Judgement[]; baselines: Baselines } => {
  const neighbours = neighboursOf(records, cylinders);
  const baselines = fitBaselines(records, settings, neighbours);
  return { baselines, flags: records.flatMap((record) => judge(record, neighbours, baselines, settings)) };
};
