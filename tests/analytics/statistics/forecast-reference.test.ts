import { describe } from 'vitest';
import { z } from 'zod';
import {
  coverage,
  intervalScore,
  naiveScale,
  pinballLoss,
  pointErrors,
} from '@/analytics/statistics/forecast/accuracy';
import { adaptiveAlphas, conformalOffsets, conformalReach } from '@/analytics/statistics/forecast/conformal';
import { drawsCrps, normalCrps } from '@/analytics/statistics/forecast/crps';
import { chooseEts } from '@/analytics/statistics/forecast/ets/choose';
import { continueEts } from '@/analytics/statistics/forecast/ets/smooth';
import {
  croston,
  demandPattern,
  leadTimeDemand,
  teunterSyntetosBabai,
} from '@/analytics/statistics/forecast/intermittent';
import {
  bottomUp,
  equalWeights,
  reconcile,
  shrunkWeights,
  structuralWeights,
  varianceWeights,
} from '@/analytics/statistics/forecast/reconciliation';
import { rollingOrigin } from '@/analytics/statistics/forecast/rolling-origin';
import { driftMethod, seasonalNaive } from '@/analytics/statistics/forecast/simple-methods';
import { theta } from '@/analytics/statistics/forecast/theta';
import { given } from './given';
import { checkReference } from './reference';

const numbers = z.array(z.number());

describe('demand that comes now and then', () => {
  const input = z.object({ x: numbers, alpha: z.number(), beta: z.number(), p0: z.number(), z0: z.number() });
  checkReference(
    'intermittent',
    { relative: 1e-10 },
    {
      intermittent: (entry, compare) => {
        const { x, alpha, beta, p0, z0 } = input.parse(entry.input);
        const own = given(croston(x, alpha));
        const pattern = given(demandPattern(x));
        const tsb = teunterSyntetosBabai(x, { alpha, beta }, { probability: p0, size: z0 });
        const lead = given(leadTimeDemand(x, 6));
        compare(
          {
            croston: { size: own.size, interval: own.interval, croston: own.perStep, sba: own.unbiasedPerStep },
            tsb: { prob: tsb.probability, size: tsb.size, forecast: tsb.perStep },
            adi: pattern.interval,
            cv2: pattern.squaredVariation,
            class: pattern.kind ?? 'too few demands',
            lead_time: {
              p: lead.probability,
              mean_size: lead.meanSize,
              var_size: lead.sizeVariance,
              mean_6: lead.mean,
              var_6: lead.variance,
              prob_zero_6: lead.noneProbability,
            },
            croston_by_forecast_package: own.perStep,
          },
          entry.expected,
        );
      },
    },
  );
});

describe('ranges from past errors', () => {
  const input = z.object({
    errors: numbers,
    alphas: numbers,
    aci: z.object({ target_alpha: z.number(), gamma: z.number(), missed: numbers }),
  });
  checkReference(
    'conformal',
    { absolute: 1e-12 },
    {
      conformal: (entry, compare) => {
        const { errors, alphas, aci } = input.parse(entry.input);
        const missed = aci.missed.map((miss) => miss === 1);
        compare(
          {
            symmetric_halfwidth: alphas.map((alpha) => conformalReach(errors, alpha)),
            asymmetric: alphas.map((alpha) => conformalOffsets(errors, alpha)),
            aci_alpha_path: adaptiveAlphas(aci.target_alpha, aci.gamma, missed),
          },
          entry.expected,
        );
      },
    },
  );
});

describe('forecasts that add up', () => {
  const input = z.object({ S: z.array(numbers), base: numbers, residuals: z.array(numbers) });
  checkReference(
    'reconciliation',
    { relative: 1e-8 },
    {
      reconciliation: (entry, compare) => {
        const { S, base, residuals } = input.parse(entry.input);
        const shrunk = shrunkWeights(residuals);
        compare(
          {
            bottom_up: bottomUp(S, base),
            ols: reconcile(S, base, equalWeights(S)),
            wls_struct: reconcile(S, base, structuralWeights(S)),
            wls_var: reconcile(S, base, varianceWeights(residuals)),
            shrink_lambda: shrunk.shrinkage,
            mint_shrink: reconcile(S, base, shrunk.weights),
          },
          entry.expected,
        );
      },
    },
  );
});

describe('errors of forecasts', () => {
  const accuracyInput = z.object({
    train: numbers,
    actual: numbers,
    forecast: numbers,
    lower: numbers,
    upper: numbers,
    season: z.number(),
    alpha: z.number(),
  });
  const crpsInput = z.object({
    normal: z.array(z.object({ y: z.number(), mu: z.number(), sigma: z.number() })),
    ensembles: z.array(z.object({ y: z.number(), x: numbers })),
  });
  const rollingInput = z.object({
    y: numbers,
    frequency: z.number(),
    first_origin: z.number(),
    h: z.number(),
    ses_alpha: z.number(),
  });
  const methodFigures = z.looseObject({ mase: z.number() });

  checkReference(
    'backtest',
    { relative: 1e-9, absolute: 1e-9 },
    {
      accuracy: (entry, compare) => {
        const { train, actual, forecast, lower, upper, season, alpha } = accuracyInput.parse(entry.input);
        const errors = pointErrors(actual, forecast);
        const scale = given(naiveScale(train, season));
        const score = intervalScore(actual, lower, upper, alpha);
        compare(
          {
            me: errors.bias,
            mae: errors.meanAbsolute,
            rmse: errors.rootMeanSquare,
            mape_percent: errors.meanAbsolutePercent,
            smape_percent_M4: errors.symmetricPercent,
            mase: errors.meanAbsolute / scale.meanAbsolute,
            rmsse: errors.rootMeanSquare / scale.rootMeanSquare,
            coverage: coverage(actual, lower, upper),
            winkler_interval_score: score,
            msis: score / scale.meanAbsolute,
            pinball_lower: pinballLoss(actual, lower, alpha / 2),
            pinball_upper: pinballLoss(actual, upper, 1 - alpha / 2),
          },
          entry.expected,
        );
      },
      crps: (entry, compare) => {
        const { normal, ensembles } = crpsInput.parse(entry.input);
        compare(
          {
            normal: normal.map(({ y, mu, sigma }) => normalCrps(y, mu, sigma)),
            ensemble: ensembles.map(({ y, x }) => drawsCrps(y, x)),
          },
          entry.expected,
        );
      },
      rolling_origin: (entry, compare) => {
        const { y, frequency, first_origin, h, ses_alpha } = rollingInput.parse(entry.input);
        const { theta: expectedTheta, ets_auto, ...expected } = z.looseObject({}).parse(entry.expected);
        const scale = given(naiveScale(y.slice(0, first_origin), frequency)).meanAbsolute;
        const figures = (forecast: (history: readonly number[]) => readonly number[]) => {
          const origins = rollingOrigin(y, forecast, { first: first_origin, horizon: h });
          const at = (step: number) => origins.map(({ errors }) => errors[step] ?? Number.NaN);
          const steps = Array.from({ length: h }, (_, step) =>
            pointErrors(
              at(step),
              at(step).map(() => 0),
            ),
          );
          return {
            n_origins: origins.length,
            mae_by_h: steps.map((errors) => errors.meanAbsolute),
            rmse_by_h: steps.map((errors) => errors.rootMeanSquare),
            mase: steps.reduce((sum, errors) => sum + errors.meanAbsolute, 0) / h / scale,
            errors_h1: at(0),
            errors_hmax: at(h - 1),
          };
        };
        const smoothed = (history: readonly number[]) => {
          const level = history.reduce((held, value) => held + ses_alpha * (value - held));
          return Array.from({ length: h }, () => level);
        };
        const snaive = figures((history) => given(seasonalNaive(history, frequency, h)).mean);
        compare(
          {
            n_origins: snaive.n_origins,
            mase_scale_first_window: scale,
            naive: figures((history) => given(seasonalNaive(history, 1, h)).mean),
            snaive,
            drift: figures((history) => given(driftMethod(history, h)).mean),
            ses_fixed: figures(smoothed),
          },
          expected,
        );
        // Own fits may stand in another valley at some origins; over all of them they must be as good.
        if (expectedTheta) {
          const own = figures((history) => given(theta(history, frequency, h)).mean);
          compare(own.mase, methodFigures.parse(expectedTheta).mase, { relative: 0.02 });
        }
        if (ets_auto) {
          const own = figures((history) => {
            const { model, weights, run } = given(
              chooseEts(history, frequency, { restarts: 0, tolerance: 1e-4, mostLooks: 700 }),
            );
            return continueEts(model, weights, run.end, h);
          });
          compare(own.mase, methodFigures.parse(ets_auto).mase, { relative: 0.1 });
        }
      },
    },
  );
});
