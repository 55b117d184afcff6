import { readingSpreadKg } from '../readings/scale-spread';
import type { Rule } from './rule';

/** 0.25 lb and 0.2 per cent of the mass: what two readings and a hose explain. Common practice. */
const SLACK_KG = 0.113;
const SLACK_SHARE = 0.002;
/** One of the three figures is wrong; now and then it is the tare that was set in between. */
const CERTAINTY = 0.95;

/** End less start is not the recovered mass, or the cylinder grew lighter. */
export const weightsDisagree: Rule = ({ record, baselines, settings }) => {
  const { startWeightKg: start, endWeightKg: end, recoveredMassKg } = record;
  if (start === null || end === null) return null;
  const weighedKg = end - start;
  const slack =
    Math.max(SLACK_KG, 2 * Math.SQRT2 * readingSpreadKg(record, baselines.steps, end, settings)) +
    SLACK_SHARE * recoveredMassKg;
  if (Math.abs(weighedKg - recoveredMassKg) <= slack && weighedKg >= -slack) return null;
  return {
    rule: 'weights_disagree',
    certainty: CERTAINTY,
    expectedMassKg: weighedKg >= 0 ? weighedKg : null,
    evidence: { startWeightKg: start, endWeightKg: end, recoveredMassKg, weighedKg },
  };
};
