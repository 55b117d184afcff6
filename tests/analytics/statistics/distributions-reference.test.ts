import { z } from 'zod';
import { betaCdf, betaQuantile } from '@/analytics/statistics/distributions/beta';
import { binomialCdf, binomialQuantile } from '@/analytics/statistics/distributions/binomial';
import { chiSquareQuantile, gammaQuantile } from '@/analytics/statistics/distributions/gamma';
import { logGamma } from '@/analytics/statistics/distributions/log-gamma';
import { logNormalQuantile } from '@/analytics/statistics/distributions/log-normal';
import { negativeBinomialQuantile } from '@/analytics/statistics/distributions/negative-binomial';
import { normalCdf, normalQuantile } from '@/analytics/statistics/distributions/normal';
import { poissonCdf, poissonQuantile } from '@/analytics/statistics/distributions/poisson';
import { studentTCdf, studentTQuantile } from '@/analytics/statistics/distributions/student-t';
import type { Interval } from '@/analytics/statistics/intervals/interval';
import { byar, garwood } from '@/analytics/statistics/intervals/poisson-mean';
import { agrestiCoull, clopperPearson, jeffreys, wilson } from '@/analytics/statistics/intervals/proportion';
import { type Checks, checkReference, type ReferenceCase } from './reference';

type Row = Record<string, number>;

/** Rows of arguments with the value they give. */
const byRow =
  (valueAt: (...args: number[]) => number, args: string[]): Checks[string] =>
  (entry, compare) => {
    const rows: Row[] = z.array(z.record(z.string(), z.number())).parse(entry.rows);
    compare(
      rows.map((row) => valueAt(...args.map((name) => row[name] ?? Number.NaN))),
      rows.map((row) => row.value),
    );
  };

const bounds = ({ lower, upper }: Interval) => [lower, upper];
const rowsOf = <Item extends z.ZodType>(entry: ReferenceCase, item: Item) => z.array(item).parse(entry.rows);

checkReference(
  'distributions',
  { relative: 1e-9, absolute: 1e-12 },
  {
    normal_quantile: byRow(normalQuantile, ['p']),
    normal_cdf: byRow(normalCdf, ['x']),
    t_quantile: byRow(studentTQuantile, ['p', 'df']),
    t_cdf: byRow(studentTCdf, ['x', 'df']),
    chisq_quantile: byRow(chiSquareQuantile, ['p', 'df']),
    gamma_quantile: byRow(gammaQuantile, ['p', 'shape', 'rate']),
    beta_quantile: byRow(betaQuantile, ['p', 'a', 'b']),
    beta_cdf: byRow(betaCdf, ['x', 'a', 'b']),
    binomial_cdf: byRow(binomialCdf, ['k', 'n', 'p']),
    binomial_quantile: byRow(binomialQuantile, ['p', 'n', 'prob']),
    poisson_cdf: byRow(poissonCdf, ['k', 'mu']),
    poisson_quantile: byRow(poissonQuantile, ['p', 'mu']),
    negbin_quantile: byRow(negativeBinomialQuantile, ['p', 'size', 'prob']),
    lognormal_quantile: byRow(logNormalQuantile, ['p', 'm', 's']),
    lgamma: byRow(logGamma, ['x']),
    proportion_intervals_95: (entry, compare) => {
      for (const { x, n, ...expected } of rowsOf(entry, z.looseObject({ x: z.number(), n: z.number() }))) {
        const intervals = {
          clopper_pearson: bounds(clopperPearson(x, n)),
          wilson: bounds(wilson(x, n)),
          jeffreys: bounds(jeffreys(x, n)),
          agresti_coull: bounds(agrestiCoull(x, n)),
        };
        compare(intervals, expected);
      }
    },
    poisson_mean_intervals_95: (entry, compare) => {
      for (const { observed, ...expected } of rowsOf(entry, z.looseObject({ observed: z.number() }))) {
        compare({ garwood_exact: bounds(garwood(observed)), byar: bounds(byar(observed)) }, expected);
      }
    },
  },
);
