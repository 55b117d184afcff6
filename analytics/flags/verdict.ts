import type { FlagDecision, FlagRule } from '@/lib/vocabulary';

/** Decisions that say the recovery or the record was bad. */
const FAULTS: readonly FlagDecision[] = ['incomplete_recovery', 'wrong_nameplate', 'entry_error'];
/** Decisions that say the system had little to give. */
export const EXCUSES: readonly FlagDecision[] = ['leaked_before', 'known_low_charge'];

/** Whether a decision bears a flag out: `short_on_arrival` by a system that was short, every other one by a fault. */
export const isConfirmed = (rule: FlagRule, decision: FlagDecision): boolean =>
  (rule === 'short_on_arrival' ? EXCUSES : FAULTS).includes(decision);
