import { describe, expect, test } from 'vitest';
import { calibratedMass } from '@/analytics/credit-forecast/model/calibration';
import { chooseMethod } from '@/analytics/credit-forecast/model/choice';
import { forecastMass } from '@/analytics/credit-forecast/model/forecast';
import { historyUntil, type MassHistory } from '@/analytics/credit-forecast/model/history';
import { sharesAhead, shareTrends } from '@/analytics/credit-forecast/model/mix';
import { drawPortions, portionsOf } from '@/analytics/credit-forecast/model/portions';
import { rangeOf, reachOf } from '@/analytics/credit-forecast/model/ranges';
import { borrowedSeason, seasonFactors } from '@/analytics/credit-forecast/model/season';
import { trackRecord } from '@/analytics/credit-forecast/model/track-record';
import { seededRandom } from '@/lib/random';
import { given } from '../statistics/given';
import { madeUpCompany } from './made-up-company';

const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;
const wave = (month: number) => 1 + 0.4 * Math.cos((2 * Math.PI * (month - 6)) / 12);

describe('the season', () => {
  test('comes out of a series that has nothing else, from whatever month it begins', () => {
    for (const first of [0, 5]) {
      const values = Array.from({ length: 60 }, (_, at) => 100 * wave((first + at) % 12));
      seasonFactors(values, first).forEach((factor, month) => {
        expect(factor).toBeCloseTo(wave(month), 2);
      });
    }
  });

  test('is none before two years, and averages 1', () => {
    expect(
      seasonFactors(
        Array.from({ length: 23 }, (_, at) => at),
        0,
      ),
    ).toEqual(Array.from({ length: 12 }, () => 1));
    const random = seededRandom('season');
    const factors = seasonFactors(
      Array.from({ length: 90 }, (_, at) => (at === 40 ? null : wave(at % 12) * random.gamma(4))),
      0,
    );
    expect(mean(factors)).toBeCloseTo(1, 12);
  });

  test('of chance alone is nearly flat', () => {
    const random = seededRandom('flat');
    const factors = seasonFactors(
      Array.from({ length: 120 }, () => random.gamma(9)),
      0,
    );
    expect(Math.max(...factors.map((factor) => Math.abs(factor - 1)))).toBeLessThan(0.12);
  });

  test('something rare borrows three quarters of it', () => {
    const routine = Array.from({ length: 12 }, (_, month) => wave(month));
    const none = Array.from({ length: 12 }, () => 0);
    expect(borrowedSeason(none, routine, 0)[6]).toBeCloseTo(1 + 0.75 * 0.4, 9);
  });
});

describe('portions', () => {
  const trend = { refrigerant: 'R-22', logShare: 0, growth: 0, logShareError: 0, growthError: 0 };
  const draws = (meanKg: number, portionKg: number, emptyShare: number) => {
    const portions = portionsOf({ ...trend, portionKg, emptyShare }, meanKg);
    const random = seededRandom(`portions ${meanKg}`);
    return Array.from({ length: 20_000 }, () => drawPortions(meanKg, portions, random));
  };

  // Compound Poisson: variance = mean × E[portion²]/E[portion]; share of nothing = exp(−mean ÷ mean portion).
  test.each([
    [5, 8, 0.3],
    [300, 8, 0],
  ])('a month of %s kg has its mean, its variance and its share of nothing', (meanKg, portionKg, empty) => {
    const kg = draws(meanKg, portionKg, empty);
    const average = mean(kg);
    const variance = mean(kg.map((mass) => (mass - average) ** 2));
    expect(average / meanKg).toBeCloseTo(1, 1);
    expect(variance / (meanKg * portionKg)).toBeGreaterThan(0.9);
    expect(variance / (meanKg * portionKg)).toBeLessThan(1.1);
    expect(mean(kg.map((mass) => (mass === 0 ? 1 : 0)))).toBeCloseTo(empty, 1);
  });

  test('nothing expected, nothing drawn', () => {
    expect(draws(0, 8, 0.5).every((kg) => kg === 0)).toBe(true);
  });
});

describe('ranges', () => {
  const even = Float64Array.from({ length: 1001 }, (_, at) => at);
  const mostlyNothing = Float64Array.from({ length: 1000 }, (_, at) => Math.max(0, at - 499));

  test('leave out as much on either side', () => {
    expect(rangeOf(even, 0.8)).toEqual({ lowerKg: expect.closeTo(100, 6), upperKg: expect.closeTo(900, 6) });
  });

  test('begin at nothing where nothing is usual', () => {
    const { lowerKg, upperKg } = rangeOf(mostlyNothing, 0.8);
    expect(lowerKg).toBe(0);
    expect(upperKg).toBeCloseTo(300, 0);
  });

  test('reach is the least share of the draws that holds a mass', () => {
    expect(reachOf(even, 900)).toBeCloseTo(0.8, 2);
    expect(reachOf(even, 100)).toBeCloseTo(0.8, 2);
    expect(reachOf(mostlyNothing, 300)).toBeCloseTo(0.8, 2);
    expect(reachOf(mostlyNothing, 0)).toBe(0);
    expect(reachOf(new Float64Array(100), 5)).toBeNull();
  });
});

describe('calibration', () => {
  const reaches = (most: number) => Array.from({ length: 400 }, (_, at) => (most * (at + 0.5)) / 400);

  test('draws that have been right are left as they are', () => {
    expect(calibratedMass(reaches(1), 0.8)).toBeCloseTo(0.8, 1);
  });

  test('too wide ones are narrowed and too narrow ones widened', () => {
    expect(calibratedMass(reaches(0.7), 0.8)).toBeLessThan(0.65);
    const missed = [...reaches(1), ...Array.from({ length: 100 }, () => 0.99)];
    expect(calibratedMass(missed, 0.8)).toBeGreaterThan(0.85);
  });

  test('80 % takes 9 forecasts and 95 % takes 39', () => {
    const few = (count: number) => reaches(1).slice(0, count);
    expect(calibratedMass(few(8), 0.8)).toBeNull();
    expect(calibratedMass(few(9), 0.8)).not.toBeNull();
    expect(calibratedMass(few(38), 0.95)).toBeNull();
    expect(calibratedMass(few(39), 0.95)).not.toBeNull();
  });
});

describe('the choice of a method', () => {
  test('needs four years', () => {
    expect(chooseMethod(madeUpCompany('short', { months: 47, routineKg: 100, noise: 0.1 }))).toEqual({
      method: 'combination',
      record: [],
      origins: 0,
    });
  });

  test('beats the seasonal naive method where months are noisy', () => {
    const { record, origins } = chooseMethod(madeUpCompany('noisy', { months: 96, routineKg: 100, noise: 0.25 }));
    expect(origins).toBe(36);
    expect(record.find(({ method }) => method === 'combination')?.relativeError).toBeLessThan(0.85);
  });

  test('sees nothing of what comes after', () => {
    const history = madeUpCompany('later', { months: 96, routineKg: 100, noise: 0.2 });
    const cut = historyUntil(history, 84);
    const changed = new Map(
      [...history.routineKg].map(([name, kg]) => [name, kg.map((mass, at) => (at < 84 ? mass : 1e6))]),
    );
    expect(chooseMethod(historyUntil({ ...history, routineKg: changed }, 84))).toEqual(chooseMethod(cut));
  });
});

describe('a refrigerant that is gone', () => {
  test('falls towards nothing', () => {
    const months = 96;
    const history: MassHistory = {
      firstMonthOfYear: 0,
      months,
      routineKg: new Map<string, number[]>([
        ['R-22', Array.from({ length: months }, (_, at) => (at < 66 ? 20 : 0))],
        ['R-410A', Array.from({ length: months }, (_, at) => (at < 66 ? 80 : 100))],
      ]),
      largeJobs: [],
      lost: new Set(),
    };
    const [gone = 1] = sharesAhead(shareTrends(history), 6);
    expect(gone).toBeLessThan(0.03);
  });
});

test('a start that would run away is held at three times the best year, and that is said', () => {
  const months = 60;
  const history: MassHistory = {
    firstMonthOfYear: 0,
    months,
    routineKg: new Map([['R-32', Array.from({ length: months }, (_, at) => (at < 58 ? 0.01 : 400))]]),
    largeJobs: [],
    lost: new Set(),
  };
  const { sum, cautions } = given(
    forecastMass(history, trackRecord(history, 'a'), { horizon: 12, paths: 200, seed: 'a' }),
  );
  const best = 10 * 0.01 + 800;
  expect(sum.meanGrams / 1000).toBeLessThanOrEqual(3 * best + 0.01);
  const isHeld = cautions.some(({ kind }) => kind === 'held at three times the best year');
  expect(isHeld).toBe(sum.meanGrams / 1000 > 3 * best - 0.01);
});
