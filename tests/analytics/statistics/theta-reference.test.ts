import { z } from 'zod';
import { studentTQuantile } from '@/analytics/statistics/distributions/student-t';
import { naiveScale } from '@/analytics/statistics/forecast/accuracy';
import { fitAirline } from '@/analytics/statistics/forecast/airline';
import { normalRange } from '@/analytics/statistics/forecast/range';
import {
  driftMethod,
  meanMethod,
  type SimpleForecast,
  seasonalNaive,
} from '@/analytics/statistics/forecast/simple-methods';
import { theta, thetaAhead, thetaParts } from '@/analytics/statistics/forecast/theta';
import { given } from './given';
import { checkReference } from './reference';

const numbers = z.array(z.number());
const seriesInput = z.object({ y: numbers, frequency: z.number(), h: z.number() });
const thetaExpected = z.looseObject({
  alpha: z.number(),
  ses_level0: z.number(),
  ses_final_level: z.number(),
  sigma2: z.number(),
  mean: numbers,
});

const withRanges = ({ mean, standardError }: SimpleForecast) => {
  const [range80, range95] = [normalRange(mean, standardError, 0.8), normalRange(mean, standardError, 0.95)];
  return {
    mean,
    lower80: range80.lower,
    upper80: range80.upper,
    lower95: range95.lower,
    upper95: range95.upper,
  };
};

const withStudentRanges = ({ mean, standardError }: SimpleForecast, degrees: number) => {
  const end = (p: number) =>
    mean.map((point, step) => point + studentTQuantile(p, degrees) * (standardError[step] ?? Number.NaN));
  return { mean, lower80: end(0.1), upper80: end(0.9), lower95: end(0.025), upper95: end(0.975) };
};

checkReference(
  'theta',
  { relative: 1e-8 },
  {
    theta: (entry, compare) => {
      const { y, frequency, h } = seriesInput.parse(entry.input);
      const { alpha, ses_level0, ses_final_level, sigma2, ...expected } = thetaExpected.parse(entry.expected);
      const parts = thetaParts(y, frequency);
      const given80 = thetaAhead(parts, { alpha, level: ses_final_level, variance: sigma2 }, h);
      compare(
        {
          seasonal_test_passed: parts.season !== null,
          seasonal_figure: parts.season,
          half_slope: parts.halfSlope,
          ...withRanges(given80),
        },
        expected,
      );
      // From the given start the level ends where the reference's does, and it misses by as much on the way.
      let [level, squares] = [ses_level0, 0];
      for (const value of parts.values) {
        squares += (value - level) ** 2;
        level += alpha * (value - level);
      }
      compare({ level, sigma2: squares / (y.length - 2) }, { level: ses_final_level, sigma2 });
      compare(given(theta(y, frequency, h)).mean, expected.mean, { relative: 0.01 });
    },
    baselines: (entry, compare) => {
      const { y, frequency, h } = seriesInput.parse(entry.input);
      compare(
        {
          mean_method: withStudentRanges(given(meanMethod(y, h)), y.length - 1),
          naive: withRanges(given(seasonalNaive(y, 1, h))),
          seasonal_naive: withRanges(given(seasonalNaive(y, frequency, h))),
          drift: withRanges(given(driftMethod(y, h))),
          mase_scale_seasonal: given(naiveScale(y, frequency)).meanAbsolute,
          mase_scale_lag1: given(naiveScale(y, 1)).meanAbsolute,
        },
        entry.expected,
      );
    },
    arima: (entry, compare) => {
      const { y, frequency } = seriesInput.omit({ h: true }).parse(entry.input);
      const { published, ...expected } = z.looseObject({ published: z.unknown(), mean: numbers }).parse(entry.expected);
      const { weights, variance, logLikelihood, ahead } = given(fitAirline(y, frequency));
      const { mean, lower95, upper95 } = withRanges(ahead(expected.mean.length));
      // R's variance divides by what the two weights leave, after a diffuse start; its likelihood has the same maximum.
      compare(
        {
          coef: { ma1: weights.last, sma1: weights.season },
          sigma2: (variance * (y.length - 13)) / (y.length - 15),
          loglik: logLikelihood,
          aic: 6 - 2 * logLikelihood,
          mean,
          lower95,
          upper95,
        },
        expected,
        { relative: 3e-3 },
      );
      compare({ ma1_4dp: weights.last, sma1_4dp: weights.season }, published, { absolute: 2e-4, printed: true });
    },
  },
);
