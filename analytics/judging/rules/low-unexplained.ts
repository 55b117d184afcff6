import { probabilityOf } from '../hypotheses/weigh-hypotheses';
import { expectedMassKg, isLow, isWeighable, lowEvidence } from './low';
import type { Rule } from './rule';

/**
 * Low without a vacuum that could tell why, or a mass of nothing that no later weighing explains. The certainty is that
 * of an early stop or a slip: most low pulls are units that came short.
 */
export const lowUnexplained: Rule = (of) => {
  const { record, weighed, vacuum, settings } = of;
  // With a later weighing, the cylinder's chain says it better.
  const isNothing = record.recoveredMassKg === 0 && weighed.next === null;
  const certainty = weighed.stopped + probabilityOf(weighed, ['mass_missing', 'mass_wrong']);
  const isRaised = isNothing ? certainty >= settings.raiseSlipsFrom : !vacuum && isLow(of) && isWeighable(of);
  if (!isRaised) return null;
  return {
    rule: 'low_unexplained',
    certainty,
    expectedMassKg: expectedMassKg(of),
    evidence: lowEvidence(of),
  };
};
