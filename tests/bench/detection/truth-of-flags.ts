import type { FlagRule } from '@/lib/vocabulary';
import type { SimulatedFault } from '@/seed/simulation/options';
import type { SimulatedTruth } from '@/seed/simulation/truth';

const MASS_SLIPS: readonly SimulatedFault[] = ['decimal_low', 'decimal_high', 'kg_as_lb', 'oz_as_lb'];

/** Which planted faults make a flag of this rule true. Rules that are missing here have no planted truth. */
const TRUE_FOR: Partial<Record<FlagRule, readonly SimulatedFault[]>> = {
  stopped_early: ['stopped_early'],
  unit_slip: MASS_SLIPS,
  nameplate_doubtful: ['nameplate_x10', 'nameplate_digits_swapped'],
  duplicate: ['duplicate'],
  over_full_charge: [...MASS_SLIPS, 'nameplate_digits_swapped'],
  cylinder_chain: [...MASS_SLIPS, 'zero_recovered', 'swapped_weights'],
  weights_disagree: [...MASS_SLIPS, 'zero_recovered', 'swapped_weights'],
  low_unexplained: ['stopped_early', 'zero_recovered', ...MASS_SLIPS],
};

/** Rules that say that something was written wrongly. */
export const SLIP_RULES: ReadonlySet<FlagRule> = new Set([
  'unit_slip',
  'nameplate_doubtful',
  'duplicate',
  'over_full_charge',
  'cylinder_chain',
  'weights_disagree',
]);

/** Planted faults by row, in the form that flags are held against. */
export const plantedFaults = (truth: Pick<SimulatedTruth, 'bad_records' | 'naturally_low_rows'>) => ({
  kinds: new Map(truth.bad_records.map(({ row, kinds }) => [String(row), new Set<SimulatedFault>(kinds)])),
  short: new Set(truth.naturally_low_rows.map(String)),
});
export type PlantedFaults = ReturnType<typeof plantedFaults>;

/** A flag as it is held against the truth, whichever way it was come by. */
export type ScoredFlag = {
  /** Number of the record's row in the file, counted from 1 below the header. */
  recordId: string;
  rule: FlagRule;
  certainty: number;
  recoveredMassKg: number;
};

/** Whether a flag is true in the way it says; null for a rule whose truth is not planted. */
export const isTrue = ({ rule, recordId }: ScoredFlag, planted: PlantedFaults): boolean | null => {
  if (rule === 'short_on_arrival') return planted.short.has(recordId);
  const kinds = TRUE_FOR[rule];
  return kinds ? kinds.some((kind) => planted.kinds.get(recordId)?.has(kind)) : null;
};
