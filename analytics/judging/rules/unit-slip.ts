import type { Meaning } from '../hypotheses/hypotheses';
import { likeliestOf, probabilityOf } from '../hypotheses/weigh-hypotheses';
import type { Rule } from './rule';

const SLIPS: readonly Meaning[] = [
  'mass_tenth',
  'mass_tenfold',
  'mass_hundredth',
  'kg_as_lb',
  'lb_as_kg',
  'oz_as_lb',
  'lb_as_oz',
];

/** A mass that fits far better read in another unit, or with the point elsewhere. Never corrected, only said. */
export const unitSlip: Rule = ({ record, weighed, settings }) => {
  const certainty = probabilityOf(weighed, SLIPS);
  const slip = likeliestOf(weighed, SLIPS);
  if (certainty < settings.raiseSlipsFrom || slip?.recoveredMassKg == null) return null;
  const { next } = weighed;
  return {
    rule: 'unit_slip',
    certainty,
    expectedMassKg: slip.recoveredMassKg,
    evidence: {
      meaning: slip.meaning,
      recoveredMassKg: record.recoveredMassKg,
      meantMassKg: slip.recoveredMassKg,
      fullChargeKg: record.fullChargeKg,
      isOffStep: weighed.isOffStep,
      nextWeighing:
        next && record.endWeightKg !== null
          ? { recordRef: next.record.recordRef, startWeightKg: next.startWeightKg, endWeightKg: record.endWeightKg }
          : null,
    },
  };
};
