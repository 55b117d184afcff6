import type { FlagRule } from '@/lib/vocabulary';
import type { Peers } from './baselines/peers';
import type { Meaning } from './hypotheses/hypotheses';

/** A low pull as numbers: what came out, what like jobs of others give, what the gauge said. */
export type LowEvidence = {
  recoveredMassKg: number;
  fullChargeKg: number;
  peers: Peers | null;
  vacuum: { kpaAbs: number; usualKpaAbs: number; spreadKpa: number; z: number } | null;
};

/** The numbers behind a flag, by rule. Masses in kg, pressures in kPa absolute; small JSON. */
export type EvidenceByRule = {
  stopped_early: LowEvidence & {
    /** Share of this person's pulls that look stopped early, this one left out. */ share: number;
  };
  short_on_arrival: LowEvidence;
  low_unexplained: LowEvidence;
  unit_slip: {
    meaning: Meaning;
    recoveredMassKg: number;
    meantMassKg: number;
    fullChargeKg: number;
    isOffStep: boolean;
    nextWeighing: { recordRef: string; startWeightKg: number; endWeightKg: number } | null;
  };
  weights_disagree: { startWeightKg: number; endWeightKg: number; recoveredMassKg: number; weighedKg: number };
  cylinder_chain: {
    endWeightKg: number;
    recoveredMassKg: number;
    nextRef: string;
    nextStartWeightKg: number;
    wentInKg: number;
  };
  over_full_charge: { recoveredMassKg: number; fullChargeKg: number };
  nameplate_doubtful: {
    meaning: Meaning;
    nameplateChargeKg: number;
    meantChargeKg: number;
    recoveredMassKg: number;
    otherVisits: { recordRef: string; nameplateChargeKg: number }[];
  };
  duplicate: { ofRef: string; recoveredOn: string; recoveredMassKg: number };
  level_not_reached: { finalVacuumKpaAbs: number; requiredLevelKpaAbs: number; reachedShare: number };
  hold_missing: { holdMinutes: number | null; statedShare: number };
  cylinder_overfilled: { grossKg: number; tareKg: number; netKg: number; fillLimitKg: number };
  wrong_cylinder: { refrigerant: string; cylinderRefrigerant: string; otherPulls: number };
  date_doubtful: { recoveredOn: string; from: string | null; to: string | null; today: string };
};

type JudgementOf<Rule extends FlagRule> = {
  recordId: string;
  rule: Rule;
  /** Probability that the record is bad in this way, 0 to 1. */
  certainty: number;
  /** What like jobs or the likely meaning would have given, kg; null where nothing says so. */
  expectedMassKg: number | null;
  evidence: EvidenceByRule[Rule];
};

/** A reason to look at a record: by which rule, how sure, on what numbers. */
export type Judgement = { [Rule in FlagRule]: JudgementOf<Rule> }[FlagRule];

/** A flag's rule and numbers, as they are stored and explained. */
export type Told = { [Rule in FlagRule]: { rule: Rule; evidence: EvidenceByRule[Rule] } }[FlagRule];

/** What a rule finds in a record; the record's id is added by the judge. */
export type Finding = { [Rule in FlagRule]: Omit<JudgementOf<Rule>, 'recordId'> }[FlagRule];
