import { probabilityOf } from '../hypotheses/weigh-hypotheses';
import type { Rule } from './rule';

/** The cylinder's next weighing says that something else went in than this ticket does. */
export const cylinderChain: Rule = ({ record, weighed, settings }) => {
  const certainty = probabilityOf(weighed, ['mass_missing', 'mass_wrong']);
  const { next } = weighed;
  const { startWeightKg: start, endWeightKg: end } = record;
  if (!next || start === null || end === null || certainty < settings.raiseSlipsFrom) return null;
  const wentInKg = next.startWeightKg - start;
  return {
    rule: 'cylinder_chain',
    certainty,
    expectedMassKg: wentInKg,
    evidence: {
      endWeightKg: end,
      recoveredMassKg: record.recoveredMassKg,
      nextRef: next.record.recordRef,
      nextStartWeightKg: next.startWeightKg,
      wentInKg,
    },
  };
};
