import { z } from 'zod';
import {
  averageRunLengthOfCusum,
  averageRunLengthOfEwma,
  averageRunLengthOfLimits,
} from '@/analytics/statistics/control-charts/average-run-length';
import { cusumChart } from '@/analytics/statistics/control-charts/cusum';
import { ewmaChart } from '@/analytics/statistics/control-charts/ewma';
import { individualsLimits, medianIndividualsLimits } from '@/analytics/statistics/control-charts/individuals-limits';
import { movingRanges } from '@/analytics/statistics/control-charts/moving-ranges';
import { type RunRule, signalsOf, standardScores } from '@/analytics/statistics/control-charts/run-rules';
import { shareLimits } from '@/analytics/statistics/control-charts/share-limits';
import { yearOnYear } from '@/analytics/statistics/season/year-on-year';
import { given } from './given';
import { checkReference, type ReferenceCase } from './reference';

const numbers = z.array(z.number());
const fromOne = (positions: number[]) => positions.map((position) => position + 1);
const positionsWhere = <Point>(points: Point[], holds: (point: Point) => boolean) =>
  points.flatMap((point, index) => (holds(point) ? [index + 1] : []));

/** The reference's names of the rules. */
const RULES: Record<string, RunRule> = {
  t1_beyond_3s: 'beyondLimits',
  t2_nine_same_side: 'nineOneSide',
  t3_six_monotone: 'sixOneWay',
  t4_fourteen_alternating: 'fourteenAlternating',
  t5_two_of_three_beyond_2s: 'twoOfThreeBeyondTwo',
  t6_four_of_five_beyond_1s: 'fourOfFiveBeyondOne',
  t7_fifteen_within_1s: 'fifteenWithinOne',
  t8_eight_outside_1s: 'eightOutsideOne',
  shewhart_eight_same_side: 'eightOneSide',
};

const rounded = (value: number, decimals: number) => Number(value.toFixed(decimals));

/** Half a unit of the last figure printed; 19.035 was printed as 19.04. */
const PRINTED_TO_HUNDREDTHS = { absolute: 0.005 + 1e-9, printed: true };

const individuals = ({ input }: ReferenceCase) => {
  const { x } = z.object({ x: numbers }).parse(input);
  const plain = given(individualsLimits(x));
  const sturdy = given(medianIndividualsLimits(x));
  const scores = standardScores(x, plain);
  return {
    mean: plain.centre,
    moving_ranges: movingRanges(x),
    mr_bar: plain.movingRange,
    sigma_mr: plain.sigma,
    ucl: plain.upper,
    lcl: plain.lower,
    // The constants as charts on paper round them: 3/1.128 to 2.66, and D4 with one decimal more.
    ucl_266: plain.centre + 2.66 * plain.movingRange,
    lcl_266: plain.centre - 2.66 * plain.movingRange,
    mr_ucl: plain.movingRangeUpper,
    mr_ucl_d4: (plain.movingRangeUpper * 3.2665) / 3.267,
    median_mr: sturdy.movingRange,
    sigma_median_mr: sturdy.sigma,
    median: sturdy.centre,
    ucl_median: sturdy.upper,
    lcl_median: sturdy.lower,
    rules: Object.fromEntries(Object.entries(RULES).map(([name, rule]) => [name, fromOne(signalsOf(rule, scores))])),
    published: {
      mean: plain.centre,
      mr_bar_4dp: rounded(plain.movingRange, 4),
      ucl_4dp: rounded(plain.upper, 4),
      lcl_4dp: rounded(plain.lower, 4),
    },
  };
};

const ewma = ({ input }: ReferenceCase) => {
  const schema = z.object({ x: numbers, lambda: z.number(), target: z.number(), sigma: z.number(), L: z.number() });
  const { x, lambda, target, sigma, L } = schema.parse(input);
  const { points, steadyLower, steadyUpper } = ewmaChart(x, { target, sigma, weight: lambda, width: L });
  return {
    ewma: points.map((point) => point.average),
    ucl: points.map((point) => point.upper),
    lcl: points.map((point) => point.lower),
    ucl_steady: steadyUpper,
    lcl_steady: steadyLower,
    signals_exact_limits: positionsWhere(points, (point) => point.beyond),
    signals_steady: positionsWhere(points, ({ average }) => average > steadyUpper || average < steadyLower),
  };
};

const cusum = ({ input }: ReferenceCase) => {
  const schema = z.object({ x: numbers, target: z.number(), k: z.number(), h: z.number(), head_start: z.number() });
  const { x, target, k, h, head_start } = schema.parse(input);
  const points = cusumChart(x, { target, slack: k, threshold: h, headStart: head_start });
  return {
    c_plus: points.map((point) => point.above),
    c_minus: points.map((point) => point.below),
    n_plus: points.map((point) => point.aboveRun),
    n_minus: points.map((point) => point.belowRun),
    signals_plus: positionsWhere(points, (point) => point.signal?.side === 'above'),
    signals_minus: positionsWhere(points, (point) => point.signal?.side === 'below'),
  };
};

const shares = ({ input }: ReferenceCase) => {
  const { x, n } = z.object({ x: numbers, n: numbers }).parse(input);
  const { centre, spread, groups } = given(shareLimits(x, n));
  return {
    p_bar: centre,
    p_ucl: groups.map((group) => group.upper),
    p_lcl: groups.map((group) => group.lower),
    sigma_z: spread,
    laney_ucl: groups.map((group) => group.laneyUpper),
    laney_lcl: groups.map((group) => group.laneyLower),
  };
};

const years = ({ input }: ReferenceCase) => {
  const schema = z.object({ masses_this_year: numbers, masses_last_year: numbers });
  const { masses_this_year, masses_last_year } = schema.parse(input);
  const { now, before, ratio } = yearOnYear(masses_this_year, masses_last_year);
  return {
    total: now.total,
    se_total: now.standardError,
    previous: before.total,
    ratio: ratio.enough ? ratio.value.ratio : null,
    se_log_ratio: ratio.enough ? ratio.value.logStandardError : null,
    lower95: ratio.enough ? ratio.value.lower : null,
    upper95: ratio.enough ? ratio.value.upper : null,
  };
};

/** The reference's names of the charts. */
const RUN_LENGTHS: Record<string, (shift: number) => number> = {
  cusum_k05_h4: (shift) => averageRunLengthOfCusum({ slack: 0.5, threshold: 4 }, shift),
  cusum_k05_h5: (shift) => averageRunLengthOfCusum({ slack: 0.5, threshold: 5 }, shift),
  ewma_l02_c2962: (shift) => averageRunLengthOfEwma({ weight: 0.2, width: 2.962 }, shift),
  ewma_l03_c3: (shift) => averageRunLengthOfEwma({ weight: 0.3, width: 3 }, shift),
  shewhart_3s: (shift) => averageRunLengthOfLimits(3, shift),
};

const dots = z.looseObject({ expected: z.looseObject({ published: z.looseObject({}).optional() }) });

checkReference(
  'spc',
  { relative: 1e-9 },
  {
    xmr: (entry, compare) => compare(individuals(entry), entry.expected),
    ewma: (entry, compare) => {
      const { published, ...expected } = dots.parse(entry).expected;
      const figures = ewma(entry);
      compare(figures, expected);
      if (!published) return;
      compare({ ewma_2dp: figures.ewma }, { ewma_2dp: published.ewma_2dp }, PRINTED_TO_HUNDREDTHS);
      // The handbook cuts its factor to four figures, so its limits are good to about 1e-3.
      const limits = { ucl_4dp: figures.ucl_steady, lcl_4dp: figures.lcl_steady };
      compare(limits, { ucl_4dp: published.ucl_4dp, lcl_4dp: published.lcl_4dp }, { absolute: 1e-3, printed: true });
    },
    cusum: (entry, compare) => {
      const { published, cumulative, ...expected } = dots.parse(entry).expected;
      const figures = cusum(entry);
      compare(figures, expected);
      // The sum itself is what both sides are made of where neither is held at zero and nothing is allowed for.
      const { x, target } = z.object({ x: numbers, target: z.number() }).parse(entry.input);
      const free = cusumChart(x, { target, slack: 0, threshold: 1e9, headStart: 1000 });
      compare(
        free.map((point) => point.above - 1000),
        cumulative,
        { absolute: 1e-8 },
      );
      if (!published) return;
      const printed = { c_plus_2dp: figures.c_plus, first_signal: figures.signals_plus[0] };
      compare(printed, published, PRINTED_TO_HUNDREDTHS);
    },
    p_and_laney_p: (entry, compare) => compare(shares(entry), entry.expected),
    arl: (entry, compare) => {
      const { note: _, ...expected } = z
        .object({ note: z.string() })
        .catchall(z.array(z.object({ shift: z.number(), arl: z.number() })))
        .parse(entry.expected);
      for (const [chart, rows] of Object.entries(expected)) {
        const lengthAt = RUN_LENGTHS[chart];
        compare(
          rows.map(({ shift }) => lengthAt?.(shift)),
          rows.map(({ arl }) => arl),
          { relative: 1e-3 },
        );
      }
    },
    year_on_year: (entry, compare) => compare(years(entry), entry.expected),
  },
);
