import { Z_95 } from '../statistics/distributions/z-95';
import type { Evidence } from './evidence';
import type { FairEffect } from './fair-effect';
import { COMPARISON_SETTINGS as S } from './settings';

/** What is said of a technician, in the words of the published contract. */
export type Verdict = 'below' | 'within' | 'above' | 'too few';

export type Judgement = {
  verdict: Verdict;
  /** What `below` rests on: the usual pull, or how many were stopped early. */
  restsOn: 'usual pull' | 'early stops' | null;
  /** Whether a trainer should look, for whatever reason. */
  look: boolean;
};

const excessOf = ({ early, earlyOf, usualEarlyShare }: Evidence): number =>
  earlyOf > 0 ? early / earlyOf - usualEarlyShare : 0;

/**
 * Below or above only where both the chances and the size say so, and the likely range does not say otherwise. In a crew
 * of fewer than five, nobody knows how sound people differ: then at most a look is asked for.
 */
export const judge = (evidence: Evidence, fair: FairEffect, spreadKnown: boolean, changed: boolean): Judgement => {
  if (!evidence.judged) return { verdict: 'too few', restsOn: null, look: false };
  const half = Z_95 * fair.standardError;
  const clear = (p: number): boolean => spreadKnown && p <= S.falseDiscoveryRate;
  const manyStops = evidence.stops.adjusted <= S.lookRate && excessOf(evidence) >= S.leastEarlyExcess;
  const restsOn =
    clear(evidence.low.adjusted) && fair.effect <= -S.leastEffect && fair.effect + half < 0
      ? 'usual pull'
      : clear(evidence.stops.adjusted) && excessOf(evidence) >= S.leastEarlyExcess && fair.effect < 0
        ? 'early stops'
        : null;
  if (restsOn) return { verdict: 'below', restsOn, look: true };
  const above = clear(evidence.high.adjusted) && fair.effect >= S.leastEffect && fair.effect - half > 0;
  const lowAlone = Math.min(evidence.lowYield.adjusted, evidence.shallowVacuum.adjusted, evidence.low.adjusted);
  const look = changed || manyStops || (lowAlone <= S.lookRate && fair.effect < 0);
  return { verdict: above ? 'above' : 'within', restsOn: null, look };
};
