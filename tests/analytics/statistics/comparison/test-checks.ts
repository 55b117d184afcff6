import { z } from 'zod';
import {
  benjaminiHochberg,
  benjaminiYekutieli,
  bonferroni,
  hochberg,
  holm,
} from '@/analytics/statistics/comparison/adjusted-p';
import { mannKendall } from '@/analytics/statistics/trend/mann-kendall';
import { seasonalKendall } from '@/analytics/statistics/trend/seasonal-kendall';
import { theilSen } from '@/analytics/statistics/trend/theil-sen';
import { given } from '../given';
import type { Checks } from '../reference';

const multiplicity: Checks[string] = ({ input, expected }, compare) => {
  const { p } = z.object({ p: z.array(z.number()) }).parse(input);
  const rejected = (adjusted: number[]) => adjusted.filter((value) => value <= 0.05).length;
  const [found, plain] = [benjaminiHochberg(p), bonferroni(p)];
  compare(
    {
      BH: found,
      BY: benjaminiYekutieli(p),
      holm: holm(p),
      hochberg: hochberg(p),
      bonferroni: plain,
      n_rejected_BH_05: rejected(found),
      n_rejected_bonferroni_05: rejected(plain),
      published_BH: rejected(found),
      published_bonferroni: rejected(plain),
    },
    expected,
  );
};

const trend: Checks[string] = (entry, compare) => {
  const schema = z.object({ x: z.array(z.number().nullable()), frequency: z.number() });
  const { x, frequency } = schema.parse(entry.input);
  const { sen_ci_rule: _, ...expected } = z.looseObject({ sen_ci_rule: z.string() }).parse(entry.expected);
  const test = given(mannKendall(x));
  const slope = given(theilSen(x));
  const figures = {
    S: test.score,
    varS: test.variance,
    z: test.z,
    p_two_sided: test.p,
    sen_slope: slope.slopePerStep,
    sen_ci95: [slope.lower, slope.upper],
  };
  if (frequency === 1) return compare(figures, expected);
  const { score, variance, z: standardScore, p, slopePerYear } = given(seasonalKendall(x, frequency));
  const seasonal = { S: score, varS: variance, z: standardScore, p_two_sided: p, sen_slope_per_year: slopePerYear };
  return compare({ ...figures, seasonal }, expected);
};

export const testChecks: Checks = { multiplicity, trend };
