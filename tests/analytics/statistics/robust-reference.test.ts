import { mean } from 'simple-statistics';
import { expect } from 'vitest';
import { z } from 'zod';
import type { Estimate } from '@/analytics/statistics/estimate';
import { standardDeviation } from '@/analytics/statistics/moments';
import { deviations, MAD_TO_SIGMA } from '@/analytics/statistics/robust/deviations';
import { adjustedFences, fences } from '@/analytics/statistics/robust/fences';
import { medcouple } from '@/analytics/statistics/robust/medcouple';
import { doubleScale, MODIFIED_Z_LIMIT, modifiedScale, scoreOn } from '@/analytics/statistics/robust/modified-z';
import { qn } from '@/analytics/statistics/robust/qn';
import { fiveNumbers, medianUnbiasedQuantile, quantile } from '@/analytics/statistics/robust/quantile';
import { sn } from '@/analytics/statistics/robust/sn';
import { autocorrelation } from '@/analytics/statistics/trend/autocorrelation';
import { given } from './given';
import { checkReference, type ReferenceCase } from './reference';

/** NumAcc2 is stated by its rule. */
const inputOf = (entry: ReferenceCase): number[] => {
  const input = z.object({ x: z.array(z.number()).optional(), rule: z.string().optional() }).parse(entry.input);
  if (input.x) return input.x;
  expect(input.rule).toBe('1.2 followed by 500 pairs of 1.1, 1.3');
  return [1.2, ...Array.from({ length: 500 }, () => [1.1, 1.3]).flat()];
};

/** R gives 0 as the spread of a single value; here that is too few, which this stands for. */
const orZero = <Value>(estimate: Estimate<Value>, pick: (value: Value) => number): number => {
  if (estimate.enough) return pick(estimate.value);
  expect(estimate).toMatchObject({ needs: 2, has: 1 });
  return 0;
};
const orNull = (estimate: Estimate<number>): number | null => (estimate.enough ? estimate.value : null);

const RULES = {
  'median deviation': '0.6745*(x-median)/MAD',
  'mean deviation': 'MAD=0: (x-median)/(1.253314*meanAD)',
  'all equal': 'all equal: 0',
};
const PROBABILITIES = [0.05, 0.25, 0.5, 0.75, 0.95];
const UPPER_QUARTILE_OF_NORMAL = 0.6744897501960817;

const scoresOf = (x: number[]) => {
  const scale = modifiedScale(x);
  if (!scale.enough) return { rule: RULES['all equal'], scores: x.map(() => 0) };
  return { rule: RULES[scale.value.basis], scores: x.map((value) => scoreOn(scale.value, value) ?? Number.NaN) };
};

const skewed = (x: number[]) => {
  if (x.length < 3) return {};
  const bounds = given(adjustedFences(x, 3));
  return {
    medcouple: given(medcouple(x)),
    adjbox_fences: [bounds.lower, bounds.upper],
    n_outside_adjbox: x.filter((value) => value < bounds.lower || value > bounds.upper).length,
  };
};

const figuresOf = (x: number[]) => {
  const spread = deviations(x);
  const { rule, scores } = scoresOf(x);
  const sides = doubleScale(x);
  const numbers = given(fiveNumbers(x));
  const tukey = fences(x);
  const mad = orZero(spread, (value) => value.mad);
  const single = { lower: x[0], upper: x[0] };
  const { lower, upper } = tukey.enough ? tukey.value : single;
  const certified = {
    mean: mean(x),
    sd: orNull(standardDeviation(x)),
    lag1_autocorrelation: orNull(autocorrelation(x)),
  };
  return {
    n: x.length,
    mean: mean(x),
    sd: orNull(standardDeviation(x)),
    median: given(quantile(x, 0.5)),
    mad_raw: mad,
    mad_normal: MAD_TO_SIGMA * mad,
    mad_normal_exact: mad / UPPER_QUARTILE_OF_NORMAL,
    mean_abs_dev_from_median: orZero(spread, (value) => value.meanDeviation),
    mad_lower_raw: orZero(spread, (value) => value.lowerMad),
    mad_upper_raw: orZero(spread, (value) => value.upperMad),
    Sn: orZero(sn(x), (found) => found.value),
    Sn_no_finite: orZero(sn(x), (found) => found.uncorrected),
    Qn: orZero(qn(x), (found) => found.value),
    Qn_no_finite: orZero(qn(x), (found) => found.uncorrected),
    quantiles_type7: PROBABILITIES.map((p) => given(quantile(x, p))),
    quantiles_type8: PROBABILITIES.map((p) => given(medianUnbiasedQuantile(x, p))),
    fivenum_tukey: [numbers.least, numbers.lowerHinge, numbers.median, numbers.upperHinge, numbers.most],
    tukey_fences_type7: [lower, upper],
    ...skewed(x),
    modified_z_rule: rule,
    modified_z: scores,
    double_mad_z: x.map((value) => (sides.enough ? scoreOn(sides.value, value) : null)),
    n_abs_z_over_3_5: scores.filter((score) => Math.abs(score) > MODIFIED_Z_LIMIT).length,
    n_z_below_minus_3_5: scores.filter((score) => score < -MODIFIED_Z_LIMIT).length,
    nist_certified: certified,
  };
};

checkReference(
  'robust',
  { relative: 1e-9 },
  {
    '': (entry, compare) => {
      const { Qn_robustbase, medcouple, medcouple_naive, ...expected } = z
        .looseObject({
          Qn_robustbase: z.number(),
          medcouple: z.number().optional(),
          medcouple_naive: z.number().optional(),
        })
        .parse(entry.expected);
      const figures = figuresOf(inputOf(entry));
      compare(figures, expected);
      // robustbase keeps the distance in 32 bits, and writes a medcouple of nought as 1e-15.
      compare(figures.Qn, Qn_robustbase, { relative: 1e-7, printed: true });
      for (const skew of [medcouple, medcouple_naive]) {
        if (skew !== undefined) compare(figures.medcouple, skew, { absolute: 1e-9 });
      }
    },
  },
);
