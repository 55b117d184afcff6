import { sum } from 'simple-statistics';
import { requireProbability } from '@/analytics/statistics/checked';
import { type Estimate, enough, tooFew } from '@/analytics/statistics/estimate';

/** What one visit says: by kind of job, the probability that the unit came short and the share of such jobs that do. */
export type VisitEvidence = {
  kind: string;
  short: number;
  /** Share of short ones that `short` was computed with. */
  usualShare: number;
};

/** Two kinds of appliance: `leaking` of them leak, and come short at `shortWhenLeaking` of their visits; others by job. */
export type LeakModel = { leaking: number; shortWhenLeaking: number; shortOtherwise: Record<string, number> };

export type LeakingAppliances = {
  model: LeakModel /** Probability to leak, in the order of the appliances. */;
  chances: number[];
};

const STEPS = 200;
const ENOUGH = 1e-7;
/** Appliances that are needed to tell what is usual of them. */
const LEAST_APPLIANCES = 20;

// A little of what is known before any record: one appliance in twenty leaks (weight of 20 appliances), a leaking one
// comes short at two of three visits (weight of 30 visits), others at one of ten (weight of 10 visits a kind of job).
const PRIOR = { leaking: [1, 19], shortWhenLeaking: [20, 10], shortOtherwise: [1, 9] } as const;
const START: Omit<LeakModel, 'shortOtherwise'> = { leaking: 0.05, shortWhenLeaking: 0.67 };

const LEAST = 1e-6;
const within = (share: number): number => Math.min(1 - LEAST, Math.max(LEAST, share));

/** How much likelier the yield is of a unit that came short than of one that did not: posterior odds over prior odds. */
const shortOdds = ({ short, usualShare }: VisitEvidence): number => {
  const [after, before] = [within(short), within(usualShare)];
  return (after / (1 - after)) * ((1 - before) / before);
};

/**
 * How much likelier a visit is of a leaking appliance than of another, where leaking ones come short at the share `q` and
 * others at `p` of such jobs: (q r + 1 − q) ÷ (p r + 1 − p), with r = how much likelier the yield is of a short unit.
 * Good (1950), Probability and the Weighing of Evidence, ch. 6.
 */
export const visitFactor = (visit: VisitEvidence, q: number, p: number): number => {
  requireProbability(visit.short, 'The probability of a visit');
  const r = shortOdds(visit);
  return (q * r + 1 - q) / (p * r + 1 - p);
};

/** Probability that an appliance leaks: prior odds times the factor of each visit. */
export const leakChance = (visits: readonly VisitEvidence[], model: LeakModel): number => {
  const logOdds = visits.reduce(
    (total, visit) =>
      total + Math.log(visitFactor(visit, model.shortWhenLeaking, model.shortOtherwise[visit.kind] ?? 0.1)),
    Math.log(model.leaking / (1 - model.leaking)),
  );
  return 1 / (1 + Math.exp(-logOdds));
};

/** Probability that a visit found the unit short, of an appliance that comes short at the share `q` of such visits. */
const shortGiven = (visit: VisitEvidence, q: number): number => {
  const r = shortOdds(visit);
  return (q * r) / (q * r + 1 - q);
};

const share = (hits: number, trials: number, [a, b]: readonly [number, number]): number =>
  within((hits + a) / (trials + a + b));

/** One step: who leaks under the model, then the model that fits who leaks. */
const step = (appliances: readonly (readonly VisitEvidence[])[], model: LeakModel): LeakModel => {
  const chances = appliances.map((visits) => leakChance(visits, model));
  const leaking = { hits: 0, trials: 0 };
  const others = new Map<string, { hits: number; trials: number }>();
  appliances.forEach((visits, index) => {
    const chance = chances[index] ?? 0;
    for (const visit of visits) {
      leaking.hits += chance * shortGiven(visit, model.shortWhenLeaking);
      leaking.trials += chance;
      const kind = others.get(visit.kind) ?? { hits: 0, trials: 0 };
      kind.hits += (1 - chance) * shortGiven(visit, model.shortOtherwise[visit.kind] ?? 0.1);
      kind.trials += 1 - chance;
      others.set(visit.kind, kind);
    }
  });
  return {
    leaking: share(sum(chances), appliances.length, PRIOR.leaking),
    shortWhenLeaking: share(leaking.hits, leaking.trials, PRIOR.shortWhenLeaking),
    shortOtherwise: Object.fromEntries(
      [...others].map(([kind, { hits, trials }]) => [kind, share(hits, trials, PRIOR.shortOtherwise)]),
    ),
  };
};

/**
 * Which appliances leak, from how often each came short against jobs like its own: two latent classes of appliances with
 * binomial counts, fitted by EM to the most likely values under weak beta priors. Dempster, Laird & Rubin (1977), JRSS B
 * 39, 1-38; McLachlan & Peel (2000), Finite Mixture Models, ch. 2. Needs 20 appliances with at least one visit each;
 * throws RangeError when a visit's probability is none.
 */
export const leakingAppliances = (appliances: readonly (readonly VisitEvidence[])[]): Estimate<LeakingAppliances> => {
  if (appliances.length < LEAST_APPLIANCES) return tooFew(LEAST_APPLIANCES, appliances.length, 'appliances');
  const kinds = new Set(appliances.flatMap((visits) => visits.map(({ kind }) => kind)));
  let model: LeakModel = { ...START, shortOtherwise: Object.fromEntries([...kinds].map((kind) => [kind, 0.1])) };
  for (let times = 0; times < STEPS; times++) {
    const next = step(appliances, model);
    const moved = Math.abs(next.leaking - model.leaking) + Math.abs(next.shortWhenLeaking - model.shortWhenLeaking);
    model = next;
    if (moved < ENOUGH) break;
  }
  return enough({ model, chances: appliances.map((visits) => leakChance(visits, model)) });
};
