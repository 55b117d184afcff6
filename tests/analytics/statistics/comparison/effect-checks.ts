import { z } from 'zod';
import { derSimonianLaird } from '@/analytics/statistics/comparison/dersimonian-laird';
import { pauleMandel } from '@/analytics/statistics/comparison/paule-mandel';
import { type Effect, pooledMean } from '@/analytics/statistics/comparison/pooled-mean';
import { randomEffects } from '@/analytics/statistics/comparison/random-effects';
import { restrictedLikelihood } from '@/analytics/statistics/comparison/restricted-likelihood';
import { shrinkage } from '@/analytics/statistics/comparison/shrinkage';
import { given } from '../given';
import type { Checks } from '../reference';

const numbers = z.array(z.number());
const ITERATED = { relative: 1e-6 };

const modelFigures = (effects: Effect[], betweenVariance: number) => {
  const model = given(randomEffects(effects, betweenVariance));
  return {
    tau2: model.betweenVariance,
    estimate: model.mean,
    se: model.standardError,
    ci95: [model.interval.lower, model.interval.upper],
    Q: model.q,
    Q_p: model.qP,
    I2_percent: model.iSquaredPercent,
    H2: model.hSquared,
    shrunk: model.members.map((member) => member.estimate),
    shrunk_lower95: model.members.map((member) => member.lower),
    shrunk_upper95: model.members.map((member) => member.upper),
  };
};

const randomEffectsCheck: Checks[string] = (entry, compare) => {
  const { yi, vi } = z.object({ yi: numbers, vi: numbers }).parse(entry.input);
  const models = z.strictObject({
    FE: z.unknown(),
    DL: z.unknown(),
    PM: z.unknown(),
    REML: z.unknown(),
    published: z.object({
      DL_tau2_2dp: z.number().optional(),
      DL_tau2: z.number().optional(),
      Q_1dp: z.number().optional(),
      pooled_1dp: z.number().optional(),
    }),
  });
  const { published, ...expected } = models.parse(entry.expected);
  const effects = yi.map((estimate, index) => ({ estimate, variance: vi[index] ?? Number.NaN }));
  const fixed = pooledMean(effects);
  const laird = modelFigures(effects, given(derSimonianLaird(effects)));
  compare(
    {
      FE: { estimate: fixed.mean, se: fixed.standardError },
      DL: laird,
      PM: modelFigures(effects, given(pauleMandel(effects))),
      REML: modelFigures(effects, given(restrictedLikelihood(effects))),
    },
    expected,
    ITERATED,
  );
  const printed = { DL_tau2_2dp: laird.tau2, DL_tau2: laird.tau2, Q_1dp: laird.Q, pooled_1dp: laird.estimate };
  const decimals = published.DL_tau2_2dp === undefined ? 0.05 : 0.005;
  compare(printed, published, { absolute: decimals + 1e-9, printed: true });
};

const average = (y: number) => (Math.sin(y / Math.sqrt(45)) + 1) / 2;
const squaredErrors = (estimates: number[], truth: number[]) =>
  estimates.reduce((sum, estimate, index) => sum + (estimate - (truth[index] ?? Number.NaN)) ** 2, 0);

/** Averages over the rest of the season, which the 45 at-bats are to foretell: Efron & Morris (1975), table 1. */
const SEASON = [
  0.346, 0.298, 0.276, 0.222, 0.273, 0.27, 0.263, 0.21, 0.269, 0.23, 0.264, 0.256, 0.303, 0.264, 0.226, 0.286, 0.316,
  0.2,
];

const equalVariance: Checks[string] = (entry, compare) => {
  const schema = z.union([
    z.object({ hits: numbers, at_bats: z.literal(45), season_average: numbers }),
    z.object({ y: numbers, V: z.number() }),
  ]);
  const input = schema.parse(entry.input);
  const onArc = 'hits' in input;
  const shares = onArc ? input.hits.map((hits) => hits / 45) : input.y;
  const y = onArc ? shares.map((share) => Math.sqrt(45) * Math.asin(2 * share - 1)) : shares;
  const variance = onArc ? 1 : input.V;
  const truth = onArc ? input.season_average : SEASON;
  const { mean, members } = given(shrinkage(y.map((estimate) => ({ estimate, variance }))));
  const squares = squaredErrors(
    y,
    y.map(() => mean),
  );
  const estimates = members.map((member) => member.estimate);
  compare(
    {
      k: y.length,
      grand_mean: mean,
      S: squares,
      B_james_stein: ((y.length - 3) * variance) / squares,
      B_used: members[0]?.weight,
      estimate: estimates,
      s: members.map((member) => member.standardError),
      lower95: members.map((member) => member.lower),
      upper95: members.map((member) => member.upper),
      y,
      estimate_as_average: estimates.map(average),
      sse_raw: squaredErrors(shares, truth),
      sse_shrunk: squaredErrors(onArc ? estimates.map(average) : estimates, truth),
    },
    entry.expected,
  );
};

export const effectChecks: Checks = { random_effects: randomEffectsCheck, morris_equal_variance: equalVariance };
