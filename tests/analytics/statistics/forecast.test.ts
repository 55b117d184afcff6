import { describe, expect, test } from 'vitest';
import { coverage, naiveScale, pointErrors } from '@/analytics/statistics/forecast/accuracy';
import { fitAirline } from '@/analytics/statistics/forecast/airline';
import { conformalOffsets, errorsNeededFor } from '@/analytics/statistics/forecast/conformal';
import { drawsCrps } from '@/analytics/statistics/forecast/crps';
import { chooseEts } from '@/analytics/statistics/forecast/ets/choose';
import { fitEts } from '@/analytics/statistics/forecast/ets/fit';
import { fitHoltWinters } from '@/analytics/statistics/forecast/holt-winters';
import { croston, demandPattern, teunterSyntetosBabai, tsbStart } from '@/analytics/statistics/forecast/intermittent';
import { equalWeights, reconcile } from '@/analytics/statistics/forecast/reconciliation';
import { rollingOrigin } from '@/analytics/statistics/forecast/rolling-origin';
import { seasonalNaive } from '@/analytics/statistics/forecast/simple-methods';
import { theta } from '@/analytics/statistics/forecast/theta';
import { nelderMead } from '@/analytics/statistics/nelder-mead';
import { given } from './given';

describe('the simplex', () => {
  // Rosenbrock (1960), Computer Journal 3: least 0 at (1, 1), at the end of a curved valley.
  test('finds the end of a curved valley', () => {
    const found = nelderMead(([x = 0, y = 0]) => (1 - x) ** 2 + 100 * (y - x * x) ** 2, [-1.2, 1], {
      tolerance: 1e-14,
    });
    expect(found.at[0]).toBeCloseTo(1, 5);
    expect(found.at[1]).toBeCloseTo(1, 5);
  });

  // Powell (1962): least 0 at the origin, where its Hessian is singular.
  test('and the bottom of a flat one', () => {
    const powell = ([a = 0, b = 0, c = 0, d = 0]: readonly number[]) =>
      (a + 10 * b) ** 2 + 5 * (c - d) ** 2 + (b - 2 * c) ** 4 + 10 * (a - d) ** 4;
    expect(nelderMead(powell, [3, -1, 0, 1], { tolerance: 1e-14 }).value).toBeLessThan(1e-8);
  });

  test('walks round where nothing can be computed', () => {
    const found = nelderMead(([x = 0]) => (x < 0 ? Number.NaN : (x - 0.1) ** 2), [3]);
    expect(found.at[0]).toBeCloseTo(0.1, 3);
    expect(() => nelderMead(() => 0, [Number.NaN])).toThrow(RangeError);
  });
});

describe('too little data is told', () => {
  test.each([
    ['seasonal naive', seasonalNaive([1, 2, 3], 12, 1), 13],
    ['Theta', theta([1, 2, 3], 1, 1), 7],
    ['Holt-Winters', fitHoltWinters([1, 2, 3], 4, 'additive'), 8],
    ['the airline model', fitAirline([1, 2, 3], 12), 26],
  ])('%s', (_, estimate, needs) => {
    expect(estimate).toMatchObject({ enough: false, needs, has: 3 });
  });

  test('smoothing by its parameters: twelve months of a damped seasonal model are not enough', () => {
    const model = { error: 'A', trend: 'A', damped: true, season: 'A', period: 12 } as const;
    expect(fitEts([1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12], model)).toMatchObject({ enough: false, needs: 22 });
  });
});

describe('what is no series is refused', () => {
  test('numbers that are none, and values that cannot be multiplied', () => {
    expect(() => seasonalNaive([1, Number.NaN], 1, 1)).toThrow(RangeError);
    const model = { error: 'M', trend: 'N', damped: false, season: 'N', period: 1 } as const;
    expect(() => fitEts([1, 2, 0, 4, 5, 6, 7, 8], model)).toThrow('above 0');
    expect(() => croston([1, -1], 0.1)).toThrow(RangeError);
  });
});

describe('smoothing', () => {
  test('a series with a nothing in it chooses among models that add', () => {
    const values = [3, 0, 4, 2, 5, 3, 4, 0, 2, 4, 3, 5, 2, 3, 4, 3];
    expect(given(chooseEts(values, 1)).model.error).toBe('A');
  });
});

describe('demand now and then', () => {
  // By hand: 4 0 0 6 0 2 then eight nothings, α 0.2, β 0.1: Croston still says 2.58 a month, TSB 0.63.
  test('ends for TSB and goes on for Croston', () => {
    const values = [4, 0, 0, 6, 0, 2, 0, 0, 0, 0, 0, 0, 0, 0];
    expect(given(croston(values, 0.2)).perStep).toBeCloseTo(2.58, 2);
    const weights = { alpha: 0.2, beta: 0.1 };
    expect(teunterSyntetosBabai(values, weights, { probability: 0.25, size: 4 }).perStep).toBeCloseTo(0.63, 2);
    expect(tsbStart(values)).toEqual({ probability: 3 / 12, size: 4 });
  });

  test('none at all has no pattern, one has no class', () => {
    expect(demandPattern([0, 0])).toMatchObject({ enough: false });
    expect(given(demandPattern([0, 5])).kind).toBeNull();
  });
});

describe('measures of error', () => {
  test('no per cent of nothing', () => {
    expect(pointErrors([0, 2], [1, 2]).meanAbsolutePercent).toBeNull();
    expect(pointErrors([0, 2], [0, 2]).symmetricPercent).toBeNull();
    expect(naiveScale([3, 3, 3], 1)).toMatchObject({ enough: false });
  });

  test('the ends of a range are inside', () => {
    expect(coverage([1, 2, 3], [1, 1, 1], [2, 2, 2])).toBeCloseTo(2 / 3, 12);
  });

  // By hand: draws 0 and 2 about 1: mean distance 1, mean difference of two draws 1, score 1 − ½.
  test('CRPS of two draws', () => {
    expect(drawsCrps(1, [0, 2])).toBe(0.5);
    expect(drawsCrps(1, [2, 0])).toBe(0.5);
  });
});

test('a rolling origin shows the forecast nothing of what comes', () => {
  const values = [1, 2, 3, 4, 5, 6];
  const seen: number[] = [];
  const origins = rollingOrigin(
    values,
    (history, horizon) => {
      seen.push(history.length);
      expect(history).toEqual(values.slice(0, history.length));
      return Array.from({ length: horizon }, () => history.at(-1) ?? 0);
    },
    { first: 3, horizon: 2 },
  );
  expect(seen).toEqual([3, 4]);
  expect(origins.map(({ errors }) => errors)).toEqual([
    [1, 2],
    [1, 2],
  ]);
});

// By hand, 19 errors: 80 % takes the 2nd and the 18th, 95 % is refused.
test('a conformal level without errors enough is not shown', () => {
  const errors = Array.from({ length: 19 }, (_, at) => at - 9);
  expect(conformalOffsets(errors, 0.2)).toEqual({ lower: -8, upper: 8 });
  expect(conformalOffsets(errors, 0.05)).toEqual({ lower: null, upper: null });
  expect(errorsNeededFor(0.2)).toBe(9);
  expect(errorsNeededFor(0.05)).toBe(39);
});

// By hand: 10, parts 4 and 3; the three of them share the 3 that are missing.
test('reconciled forecasts add up', () => {
  const summing = [
    [1, 1],
    [1, 0],
    [0, 1],
  ];
  const [total = 0, ...parts] = reconcile(summing, [10, 4, 3], equalWeights(summing));
  expect(total).toBeCloseTo(9, 12);
  expect(parts[0]).toBeCloseTo(5, 12);
  expect(parts[1]).toBeCloseTo(4, 12);
});
