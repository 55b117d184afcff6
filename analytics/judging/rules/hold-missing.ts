import type { Rule } from './rule';

/** A hold written down as nothing was not made; one not written down may have been. */
const CERTAINTY = { none: 0.8, unstated: 0.4 } as const;

/** No hold, where the company's tickets usually state one. */
export const holdMissing: Rule = ({ record, baselines, settings }) => {
  const { holdMinutes } = record;
  const statedShare = baselines.habits.holdStated[record.recoveredOn.slice(0, 4)] ?? 0;
  if ((holdMinutes !== null && holdMinutes > 0) || statedShare < settings.habitFrom) return null;
  return {
    rule: 'hold_missing',
    certainty: holdMinutes === null ? CERTAINTY.unstated * statedShare : CERTAINTY.none,
    expectedMassKg: null,
    evidence: { holdMinutes, statedShare },
  };
};
