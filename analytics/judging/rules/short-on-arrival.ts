import { expectedMassKg, isLow, isWeighable, lowEvidence } from './low';
import type { Rule } from './rule';

/** So likely before a record says so of a unit. */
const LEAST = 0.7;
/** The records cannot tell a unit that came short from gas that went somewhere else: one in ten is left to that. */
const MOST = 0.9;

/** Low, but with the usual vacuum: the unit probably came short. No fault of anybody; a leak note is missing. */
export const shortOnArrival: Rule = (of) => {
  const { weighed, vacuum } = of;
  const short = weighed.short + weighed.empty;
  if (!vacuum || !isLow(of) || !isWeighable(of) || short < LEAST) return null;
  return {
    rule: 'short_on_arrival',
    certainty: MOST * short,
    expectedMassKg: expectedMassKg(of),
    evidence: lowEvidence(of),
  };
};
