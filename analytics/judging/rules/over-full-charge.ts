import type { Rule } from './rule';

/** More than an overcharged system holds. The certainty is that of any slip at all: which one, another flag says. */
export const overFullCharge: Rule = ({ record, weighed, settings }) => {
  if (record.recoveredMassKg <= settings.mostYield * record.fullChargeKg) return null;
  const asWritten = weighed.meanings[0]?.probability ?? 0;
  return {
    rule: 'over_full_charge',
    certainty: 1 - asWritten,
    expectedMassKg: record.fullChargeKg,
    evidence: { recoveredMassKg: record.recoveredMassKg, fullChargeKg: record.fullChargeKg },
  };
};
