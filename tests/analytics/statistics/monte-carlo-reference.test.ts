import { expect } from 'vitest';
import { z } from 'zod';
import { logNormalQuantile } from '@/analytics/statistics/distributions/log-normal';
import {
  betaMoments,
  logNormalMoments,
  logNormalProduct,
  type Moments,
  portfolioMoments,
  productMoments,
} from '@/analytics/statistics/monte-carlo/moments';
import { expectedPayment, paymentShare } from '@/analytics/statistics/monte-carlo/payment-steps';
import { type Draws, drawnMean, drawnQuantile, simulate } from '@/analytics/statistics/monte-carlo/simulate';
import type { Random } from '@/lib/random';
import { checkReference } from './reference';

const DRAWS = 200_000;
/** Standard errors that a seeded simulation may stand off: the tolerance that the reference names. */
const STANDARD_ERRORS = 4;

const numbers = z.array(z.number());
const quantilesSchema = z.looseObject({
  mean: z.number(),
  sd: z.number(),
  quantiles: numbers,
  density_at_quantiles: numbers,
});
type Expected = z.infer<typeof quantilesSchema>;

/** Draws must give mean and quantiles to within their own chance error. */
const expectDraws = (draws: Draws, expected: Expected, ps: readonly number[]) => {
  expect(Math.abs(drawnMean(draws).mean - expected.mean)).toBeLessThan(
    (STANDARD_ERRORS * expected.sd) / Math.sqrt(draws.length),
  );
  ps.forEach((p, at) => {
    const off = Math.abs(drawnQuantile(draws, p).value - (expected.quantiles[at] ?? Number.NaN));
    const density = expected.density_at_quantiles[at] ?? Number.NaN;
    expect(off).toBeLessThan((STANDARD_ERRORS * Math.sqrt((p * (1 - p)) / draws.length)) / density);
  });
};

const named = ({ mean, standardDeviation }: Moments) => ({ mean, sd: standardDeviation });
const logNormal = (random: Random, meanLog: number, sdLog: number) => Math.exp(random.normal(meanLog, sdLog));
const priceAndMass = z.object({
  price_meanlog: z.number(),
  price_sdlog: z.number(),
  mass_mean: z.number(),
  mass_sd: z.number(),
  p: numbers,
});

checkReference(
  'montecarlo',
  { relative: 1e-6 },
  {
    product_lognormals: (entry, compare) => {
      const schema = z.object({
        meanlog1: z.number(),
        sdlog1: z.number(),
        meanlog2: z.number(),
        sdlog2: z.number(),
        correlation_of_logs: z.number(),
        p: numbers,
      });
      const { meanlog1, sdlog1, meanlog2, sdlog2, correlation_of_logs: correlation, p } = schema.parse(entry.input);
      const expected = quantilesSchema.parse(entry.expected);
      const [first, second] = [
        { meanLog: meanlog1, sdLog: sdlog1 },
        { meanLog: meanlog2, sdLog: sdlog2 },
      ];
      const both = logNormalProduct(first, second, correlation);
      const quantiles = p.map((at) => logNormalQuantile(at, both.meanLog, both.sdLog));
      const { mean, sd } = expected;
      compare({ ...named(logNormalMoments(both)), quantiles }, { mean, sd, quantiles: expected.quantiles });
      const draws = simulate(entry.name, DRAWS, (random) => {
        const shared = random.normal(0, 1);
        const own = correlation * shared + Math.sqrt(1 - correlation ** 2) * random.normal(0, 1);
        return Math.exp(meanlog1 + sdlog1 * shared + meanlog2 + sdlog2 * own);
      });
      expectDraws(draws, expected, p);
    },
    lognormal_times_normal: (entry, compare) => {
      const { price_meanlog, price_sdlog, mass_mean, mass_sd, p } = priceAndMass.parse(entry.input);
      const { mean, sd, ...expected } = quantilesSchema.parse(entry.expected);
      const price = logNormalMoments({ meanLog: price_meanlog, sdLog: price_sdlog });
      compare(named(productMoments([price, { mean: mass_mean, standardDeviation: mass_sd }])), { mean, sd });
      const draws = simulate(
        entry.name,
        DRAWS,
        (random) => logNormal(random, price_meanlog, price_sdlog) * random.normal(mass_mean, mass_sd),
      );
      expectDraws(draws, { mean, sd, ...expected }, p);
    },
    lognormal_normal_beta: (entry, compare) => {
      const schema = priceAndMass.extend({ purity_a: z.number(), purity_b: z.number() });
      const { price_meanlog, price_sdlog, mass_mean, mass_sd, purity_a, purity_b, p } = schema.parse(entry.input);
      const { mean, sd, ...expected } = quantilesSchema.parse(entry.expected);
      const price = logNormalMoments({ meanLog: price_meanlog, sdLog: price_sdlog });
      const mass = { mean: mass_mean, standardDeviation: mass_sd };
      compare(named(productMoments([price, mass, betaMoments(purity_a, purity_b)])), { mean, sd });
      const draws = simulate(
        entry.name,
        DRAWS,
        (random) =>
          logNormal(random, price_meanlog, price_sdlog) *
          random.normal(mass_mean, mass_sd) *
          random.beta(purity_a, purity_b),
      );
      expectDraws(draws, { mean, sd, ...expected }, p);
    },
    tiered_credit: (entry, compare) => {
      const schema = z.object({
        purity_cut_points: numbers,
        payment_share_by_tier: numbers,
        purity_a: z.number(),
        purity_b: z.number(),
        mass: z.number(),
        price: z.number(),
      });
      const { purity_cut_points, payment_share_by_tier, purity_a, purity_b, mass, price } = schema.parse(entry.input);
      const steps = payment_share_by_tier.map((share, at) => ({
        fromPurity: [0, ...purity_cut_points][at] ?? 1,
        share,
      }));
      const payment = expectedPayment(steps, purity_a, purity_b);
      compare(
        {
          tier_probabilities: payment.probabilities,
          mean_credit: mass * price * payment.meanShare,
          sd_credit: mass * price * payment.shareDeviation,
          prob_no_credit: payment.nothingProbability,
        },
        entry.expected,
      );
      const draws = simulate(entry.name, DRAWS, (random) => paymentShare(steps, random.beta(purity_a, purity_b)));
      const { mean, standardError } = drawnMean(draws);
      expect(Math.abs(mean - payment.meanShare)).toBeLessThan(STANDARD_ERRORS * standardError);
    },
    portfolio_moments: (entry, compare) => {
      const schema = z.object({
        mass_mean: numbers,
        mass_sd: numbers,
        price_mean: numbers,
        price_cv: numbers,
        log_price_correlation: z.number(),
      });
      const { mass_mean, mass_sd, price_mean, price_cv, log_price_correlation } = schema.parse(entry.input);
      const holdings = mass_mean.map((mean, at) => ({
        mass: { mean, standardDeviation: mass_sd[at] ?? Number.NaN },
        price: price_mean[at] ?? Number.NaN,
        priceVariation: price_cv[at] ?? Number.NaN,
      }));
      compare(named(portfolioMoments(holdings, log_price_correlation)), entry.expected);
    },
    gum_monte_carlo: (entry, compare) => {
      const { half_width_rectangular: half, wide_half_width: wide } = z
        .object({ half_width_rectangular: z.number(), wide_half_width: z.number() })
        .parse(entry.input);
      const spread = (draw: (random: Random) => number) => {
        const draws = simulate(entry.name, DRAWS, draw);
        return {
          u: drawnMean(draws).standardError * Math.sqrt(draws.length),
          half95: (drawnQuantile(draws, 0.975).value - drawnQuantile(draws, 0.025).value) / 2,
        };
      };
      const flat = (random: Random, reach = half) => random.between(-reach, reach);
      const threeFlat = (random: Random) => flat(random) + flat(random) + flat(random);
      const normal = spread((random) => 2 * random.normal(0, 1));
      const rectangular = spread((random) => threeFlat(random) + flat(random));
      const oneWide = spread((random) => threeFlat(random) + flat(random, wide));
      // 4 standard errors of the 2.5 % quantile of 200,000 draws are about 0.5 % of it.
      compare(
        {
          u_four_normal: normal.u,
          half95_four_normal: normal.half95,
          u_four_rectangular: rectangular.u,
          half95_four_rectangular: rectangular.half95,
          u_three_unit_one_wide: oneWide.u,
          half95_three_unit_one_wide_rectangular: oneWide.half95,
        },
        entry.expected,
        { relative: 0.01 },
      );
    },
  },
);
