import { median } from 'simple-statistics';
import { twoSidedP } from '../distributions/normal';
import { type Estimate, enough, tooFew } from '../estimate';
import { benjaminiHochberg } from './adjusted-p';
import { OVERDISPERSION_NEEDS, type Overdispersion, overdispersion } from './overdispersion';
import { type ShrunkMember, shrinkage } from './shrinkage';
import type { TechnicianEffect } from './technician-effects';

/** Share of false ones that is borne among those who are pointed at. */
export const FALSE_DISCOVERY_RATE = 0.1;

/** What may be said: nothing, "worth a look" on the trainer's own screen, or "clear" anywhere. */
export type Finding = 'within chance' | 'worth a look' | 'clear';

export type TechnicianJudgement = TechnicianEffect & {
  /** Scores against chance alone, and with what colleagues normally differ by allowed for. */
  score: number;
  allowingScore: number | null;
  p: number;
  allowingP: number | null;
  finding: Finding;
  shrunk: ShrunkMember;
};
export type TechnicianComparison = {
  technicians: TechnicianJudgement[];
  mean: number;
  betweenVariance: number;
  spread: Estimate<Overdispersion>;
};

const findingOf = (p: number, allowingP: number | null): Finding => {
  if (p > FALSE_DISCOVERY_RATE) return 'within chance';
  return allowingP !== null && allowingP <= FALSE_DISCOVERY_RATE ? 'clear' : 'worth a look';
};

/**
 * Effects judged side by side in two levels: p-values adjusted for the number of technicians (Benjamini-Hochberg) from
 * the plain score, and from one that allows for the normal spread about the median technician. Estimates are drawn
 * towards the mean (Morris). Under `least` technicians the normal spread is unknown, and nothing is called clear. Needs
 * two technicians. Spiegelhalter (2005), Quality and Safety in Health Care 14, 347-351.
 */
export const compareTechnicians = (
  effects: readonly TechnicianEffect[],
  least = OVERDISPERSION_NEEDS,
): Estimate<TechnicianComparison> => {
  const drawn = shrinkage(
    effects.map(({ effect, standardError }) => ({ estimate: effect, variance: standardError ** 2 })),
  );
  if (!drawn.enough) return tooFew(2, effects.length, 'technicians');
  const spread = overdispersion(
    effects.map(({ effect }) => effect),
    effects.map(({ standardError }) => standardError),
    least,
  );
  const centre = median(effects.map(({ effect }) => effect));
  const scores = effects.map(({ effect, standardError }) => effect / standardError);
  const allowing = spread.enough
    ? effects.map(
        ({ effect, standardError }) =>
          (effect - centre) / Math.hypot(standardError, Math.sqrt(spread.value.betweenVarianceWinsorised)),
      )
    : [];
  const ps = benjaminiHochberg(scores.map(twoSidedP));
  const allowingPs = benjaminiHochberg(allowing.map(twoSidedP));
  const technicians = effects.flatMap((effect, index) => {
    const shrunk = drawn.value.members[index];
    if (!shrunk) return [];
    const [p = 1, allowingP = null] = [ps[index], allowingPs[index]];
    const [score = 0, allowingScore = null] = [scores[index], allowing[index]];
    return [{ ...effect, score, allowingScore, p, allowingP, finding: findingOf(p, allowingP), shrunk }];
  });
  const { mean, betweenVariance } = drawn.value;
  return enough({ technicians, mean, betweenVariance, spread });
};
