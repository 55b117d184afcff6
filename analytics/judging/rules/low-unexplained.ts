import { probabilityOf } from '../weigh-hypotheses';
import { expectedMassKg, isLow, isWeighable, lowEvidence } from './low';
import type { Rule } from './rule';

/**
 * Low without a vacuum that could tell why, or a mass of nothing that no later weighing explains. The certainty is that
 * of an early stop or a slip: most low pulls are units that came short.
 */
export const lowUnexplained: Rule = (of) => {
  const { record, weighed, vacuum, settings } = of;
  const isMissing = record.recoveredMassKg === 0 && weighed.next === null;
  const missing = probabilityOf(weighed, ['mass_missing']);
  const isRaised = isMissing
    ? missing + weighed.stopped >= settings.raiseFrom
    : !vacuum && isLow(of) && isWeighable(of);
  if (!isRaised) return null;
  return {
    rule: 'low_unexplained',
    certainty: isMissing ? missing : weighed.stopped + probabilityOf(weighed, ['mass_missing', 'weight_wrong']),
    expectedMassKg: expectedMassKg(of),
    evidence: lowEvidence(of),
  };
};
