import { z } from 'zod';
import { betaBinomial } from '@/analytics/statistics/comparison/beta-binomial';
import { binomialLimit, normalLimit, poissonLimit } from '@/analytics/statistics/comparison/exact-limits';
import { gammaPoisson } from '@/analytics/statistics/comparison/gamma-poisson';
import { marshallRates } from '@/analytics/statistics/comparison/marshall';
import { overdispersion } from '@/analytics/statistics/comparison/overdispersion';
import { squareRootDeviations } from '@/analytics/statistics/comparison/square-root-scores';
import { given } from '../given';
import type { Checks } from '../reference';

const numbers = z.array(z.number());
const PARAMETERS = { relative: 1e-4 };
const LOG_LIKELIHOOD = { absolute: 1e-6 };
const POSTERIOR = { relative: 1e-5 };

const spreadFigures = (deviations: number[], standardErrors: number[]) => {
  const found = given(overdispersion(deviations, standardErrors));
  return {
    phi_raw: found.factor,
    winsor_bounds: [found.bounds.lower, found.bounds.upper],
    phi_winsorised_10: found.factorWinsorised,
    tau2_raw: found.betweenVariance,
    tau2_winsorised: found.betweenVarianceWinsorised,
    z_multiplicative: found.multiplicativeScores,
    z_additive: found.additiveScores,
  };
};

const found = <Fit extends { spread: string }>(fit: Fit): Extract<Fit, { spread: 'found' }> => {
  if (fit.spread !== 'found') throw new Error(`Members spread: ${fit.spread}`);
  // The check above leaves this kind alone, which a generic type cannot tell.
  return fit as Extract<Fit, { spread: 'found' }>;
};

const funnelProportion: Checks[string] = ({ input, expected }, compare) => {
  const schema = z.object({ x: numbers, n: numbers, limit_probabilities: numbers });
  const { x, n, limit_probabilities } = schema.parse(input);
  const total = (values: number[]) => values.reduce((sum, value) => sum + value, 0);
  const target = total(x) / total(n);
  const deviations = x.map((hits, index) => hits / (n[index] ?? 1) - target);
  const errors = n.map((size) => Math.sqrt((target * (1 - target)) / size));
  compare(
    {
      target,
      limits_exact_interpolated: n.map((size) => limit_probabilities.map((p) => binomialLimit(p, size, target))),
      limits_normal: errors.map((error) => limit_probabilities.map((p) => normalLimit(p, target, error))),
      z: given(overdispersion(deviations, errors)).scores,
      ...spreadFigures(deviations, errors),
    },
    expected,
  );
};

const ratioParts = z.object({
  limits_exact_interpolated_ratio: z.unknown(),
  sqrt_scale_z: z.unknown(),
  sqrt_scale_overdispersion: z.unknown(),
  marshall_eb: z.unknown(),
  gamma_poisson_ml: z.strictObject({
    shape: z.number(),
    rate: z.number(),
    loglik: z.number(),
    posterior_mean: numbers,
    lower95: numbers,
    upper95: numbers,
    prob_below_1: numbers,
  }),
});

const funnelRatio: Checks[string] = (entry, compare) => {
  const schema = z.object({ observed: numbers, expected: numbers, limit_probabilities: numbers });
  const { observed, expected, limit_probabilities } = schema.parse(entry.input);
  const { gamma_poisson_ml, ...closed } = z.strictObject(ratioParts.shape).parse(entry.expected);
  const { deviations, standardErrors } = squareRootDeviations(observed, expected);
  const marshall = given(marshallRates(observed, expected));
  compare(
    {
      limits_exact_interpolated_ratio: expected.map((mean) => limit_probabilities.map((p) => poissonLimit(p, mean))),
      sqrt_scale_z: given(overdispersion(deviations, standardErrors)).scores,
      sqrt_scale_overdispersion: spreadFigures(deviations, standardErrors),
      marshall_eb: {
        mean: marshall.mean,
        variance: marshall.betweenVariance,
        weight: marshall.members.map((member) => member.weight),
        estimate: marshall.members.map((member) => member.ratio),
      },
    },
    closed,
  );
  const { shape, rate, logLikelihood, members } = found(given(gammaPoisson(observed, expected)));
  compare({ shape, rate }, { shape: gamma_poisson_ml.shape, rate: gamma_poisson_ml.rate }, PARAMETERS);
  compare(logLikelihood, gamma_poisson_ml.loglik, LOG_LIKELIHOOD);
  const { posterior_mean, lower95, upper95, prob_below_1 } = gamma_poisson_ml;
  const posterior = {
    posterior_mean: members.map((member) => member.mean),
    lower95: members.map((member) => member.lower),
    upper95: members.map((member) => member.upper),
  };
  compare(posterior, { posterior_mean, lower95, upper95 }, POSTERIOR);
  // A tail of 1e-20 moves by more than its digits when the parameters move in their sixth.
  compare(
    members.map((member) => member.probabilityBelowOne),
    prob_below_1,
    { ...PARAMETERS, absolute: 1e-9 },
  );
};

const betaBinomialEb: Checks[string] = (entry, compare) => {
  const { x, n } = z.object({ x: numbers, n: numbers }).parse(entry.input);
  const parts = { a: z.number(), b: z.number(), prior_mean: z.number(), loglik: z.number() };
  const expected = z.strictObject({ ...parts, posterior_mean: numbers, lower95: numbers, upper95: numbers });
  const { a, b, prior_mean, loglik, ...posterior } = expected.parse(entry.expected);
  const fit = found(given(betaBinomial(x, n)));
  compare({ a: fit.a, b: fit.b, prior_mean: fit.mean }, { a, b, prior_mean }, PARAMETERS);
  compare(fit.logLikelihood, loglik, LOG_LIKELIHOOD);
  compare(
    {
      posterior_mean: fit.members.map((member) => member.mean),
      lower95: fit.members.map((member) => member.lower),
      upper95: fit.members.map((member) => member.upper),
    },
    posterior,
    POSTERIOR,
  );
};

export const funnelChecks: Checks = {
  funnel_proportion: funnelProportion,
  funnel_ratio: funnelRatio,
  beta_binomial_eb: betaBinomialEb,
};
