import type { JudgedRecord } from '../judging/record';
import type { ComparedRecovery } from './recovery';

const decidedOf = ({ decisions }: JudgedRecord): ComparedRecovery['decided'] => {
  const taken = new Set(decisions.map(({ decision }) => decision));
  if (taken.has('leaked_before') || taken.has('known_low_charge')) return 'short on arrival';
  return taken.has('incomplete_recovery') ? 'stopped early' : null;
};

/** A record as people are compared by it; null for an entry error, which is left out. */
export const comparedRecovery = (record: JudgedRecord): ComparedRecovery | null => {
  if (record.isExcluded) return null;
  const { finalVacuumKpaAbs, requiredLevelKpaAbs, holdMinutes } = record;
  return {
    technicianId: record.technicianId,
    category: record.category,
    jobType: record.jobType,
    fullChargeKg: record.fullChargeKg,
    recoveredMassKg: record.recoveredMassKg,
    recoveredOn: record.recoveredOn,
    finalVacuumKpaAbs,
    requiredLevelKpaAbs,
    held: holdMinutes === null ? null : holdMinutes > 0,
    weighedTwice: record.startWeightKg !== null && record.endWeightKg !== null,
    writtenSameDay: null,
    decided: decidedOf(record),
  };
};
