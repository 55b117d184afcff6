import type { Meaning } from '../hypotheses/hypotheses';
import { likeliestOf, probabilityOf } from '../hypotheses/weigh-hypotheses';
import { otherVisits } from '../neighbours/neighbours';
import type { Rule } from './rule';

const PLATES: readonly Meaning[] = [
  'plate_tenfold',
  'plate_tenth',
  'plate_digits',
  'plate_kg_as_lb',
  'plate_lb_as_kg',
  'plate_oz_as_lb',
  'plate_of_other_visits',
];
const MOST_VISITS = 3;

/** A nameplate that other visits contradict, or that would make a usual pull of a strange one if read otherwise. */
export const nameplateDoubtful: Rule = ({ record, weighed, neighbours, settings }) => {
  const certainty = probabilityOf(weighed, PLATES);
  const meant = likeliestOf(weighed, PLATES);
  if (certainty < settings.raiseSlipsFrom || !meant) return null;
  return {
    rule: 'nameplate_doubtful',
    certainty,
    expectedMassKg: null,
    evidence: {
      meaning: meant.meaning,
      nameplateChargeKg: record.nameplateChargeKg,
      meantChargeKg: meant.nameplateChargeKg,
      recoveredMassKg: record.recoveredMassKg,
      otherVisits: otherVisits(neighbours, record)
        .slice(0, MOST_VISITS)
        .map(({ recordRef, nameplateChargeKg }) => ({ recordRef, nameplateChargeKg })),
    },
  };
};
