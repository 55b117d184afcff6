import { describe, expect, test } from 'vitest';
import { type ForecastOptions, forecastMass } from '@/analytics/credit-forecast/model/forecast';
import type { MassHistory } from '@/analytics/credit-forecast/model/history';
import { type TrackRecord, trackRecord } from '@/analytics/credit-forecast/model/track-record';
import { given } from '../statistics/given';
import { madeUpCompany, trueRoutineKg } from './made-up-company';

const OPTIONS: ForecastOptions = { horizon: 12, paths: 1000, seed: 'a' };
const records = new Map<MassHistory, TrackRecord>();
const forecast = (history: MassHistory, options: Partial<ForecastOptions> = {}) => {
  const record = records.get(history) ?? trackRecord(history, 'a');
  records.set(history, record);
  return given(forecastMass(history, record, { ...OPTIONS, ...options }));
};

describe('a steady company with a season', () => {
  const company = { months: 96, routineKg: 100, noise: 0.1 };
  const history = madeUpCompany('steady', company);
  const ahead = forecast(history);

  test('each month is within a tenth of the mean that made it', () => {
    ahead.months.forEach(({ total }, step) => {
      expect(total.meanGrams / 1000 / trueRoutineKg(company, step)).toBeGreaterThan(0.9);
      expect(total.meanGrams / 1000 / trueRoutineKg(company, step)).toBeLessThan(1.1);
    });
  });

  test('parts add up to each total, and totals to the sum, to the gram', () => {
    for (const { total, byRefrigerant } of ahead.months) {
      const parts = [...byRefrigerant.values()].reduce((sum, { meanGrams }) => sum + meanGrams, 0);
      expect(parts).toBe(total.meanGrams);
      expect(Number.isInteger(total.meanGrams)).toBe(true);
    }
    expect(ahead.months.reduce((sum, { total }) => sum + total.meanGrams, 0)).toBe(ahead.sum.meanGrams);
  });

  test('wider levels hold narrower ones, and the range of the year is narrower than the sum of the months', () => {
    for (const { ranges } of ahead.months.map(({ total }) => total)) {
      const lowers = ranges.map(({ lowerGrams }) => lowerGrams);
      const uppers = ranges.map(({ upperGrams }) => upperGrams);
      expect(lowers).toEqual(lowers.toSorted((a, b) => b - a));
      expect(uppers).toEqual(uppers.toSorted((a, b) => a - b));
    }
    const width = (ranges: { level: number; lowerGrams: number; upperGrams: number }[]) => {
      const own = ranges.find(({ level }) => level === 0.8);
      return (own?.upperGrams ?? 0) - (own?.lowerGrams ?? 0);
    };
    const months = ahead.months.reduce((sum, { total }) => sum + width(total.ranges), 0);
    expect(width(ahead.sum.ranges)).toBeLessThan(months);
  });

  test('the same seed gives the same forecast, another one other draws of the same means', () => {
    expect(forecast(history).months[3]?.total).toEqual(ahead.months[3]?.total);
    const other = forecast(history, { seed: 'b' });
    expect(other.months[3]?.total.meanGrams).toBe(ahead.months[3]?.total.meanGrams);
    expect(other.months[3]?.total.ranges).not.toEqual(ahead.months[3]?.total.ranges);
  });

  test('draws average to the means', () => {
    const { paths, sum } = forecast(history, { paths: 4000 });
    const drawn = paths.kg.reduce((all, kg) => all + kg, 0) / paths.count;
    expect(drawn / (sum.meanGrams / 1000)).toBeCloseTo(1, 1);
  });
});

describe('short and broken histories', () => {
  test('less than a year is told, not guessed', () => {
    const history = madeUpCompany('young', { months: 11, routineKg: 50, noise: 0.2 });
    const answer = forecastMass(history, trackRecord(history, 'a'), OPTIONS);
    expect(answer).toEqual({ enough: false, needs: 12, has: 11, of: 'whole months' });
  });

  test('a year has neither season nor range, and both are said', () => {
    const ahead = forecast(madeUpCompany('year', { months: 14, routineKg: 50, noise: 0.2 }));
    expect(ahead.cautions.map(({ kind }) => kind)).toEqual(['no season yet', 'range not known yet']);
    expect(ahead.months.every(({ total }) => total.ranges.length === 0)).toBe(true);
    const [first] = ahead.months;
    expect(ahead.months.every(({ total }) => total.meanGrams === first?.total.meanGrams)).toBe(true);
  });

  test('a lost month is told and is no month of nothing', () => {
    const whole = madeUpCompany('lost', { months: 60, routineKg: 100, noise: 0.05 });
    const zeroed = new Map(
      [...whole.routineKg].map(([name, masses]) => [name, masses.map((mass, at) => (at === 57 ? 0 : mass))]),
    );
    const told = forecast({ ...whole, routineKg: zeroed, lost: new Set([57]) });
    expect(told.cautions).toContainEqual({ kind: 'lost months', months: 1 });
    expect(told.sum.meanGrams / forecast(whole).sum.meanGrams).toBeCloseTo(1, 1);
  });

  test('refrigerants hardly seen, and those long gone, are named', () => {
    const history = madeUpCompany('rare', { months: 60, routineKg: 100, noise: 0.1, refrigerants: 1 });
    const at = (...places: number[]) => Array.from({ length: 60 }, (_, month) => (places.includes(month) ? 2 : 0));
    const masses = new Map([...history.routineKg, ['R-12', at(3, 9, 20, 35)], ['R-32', at(57, 59)]]);
    expect(forecast({ ...history, routineKg: masses }).cautions).toEqual([
      { kind: 'hardly seen', refrigerants: ['R-32'] },
      { kind: 'not seen for two years', refrigerants: ['R-12'] },
    ]);
  });

  test('nothing recovered for years is forecast as nothing', () => {
    const history: MassHistory = {
      firstMonthOfYear: 0,
      months: 40,
      routineKg: new Map([['R-22', Array.from({ length: 40 }, () => 0)]]),
      largeJobs: [],
      lost: new Set(),
    };
    expect(forecast(history).sum.meanGrams).toBe(0);
  });

  test('masses that are none, and jobs outside of the history, are refused', () => {
    const history = madeUpCompany('bad', { months: 24, routineKg: 50, noise: 0.2 });
    const record = trackRecord(history, 'a');
    expect(() => forecastMass({ ...history, months: 25 }, record, OPTIONS)).toThrow(RangeError);
    const job = { at: 24, refrigerant: 'R-1', recoveredKg: 60 };
    expect(() => forecastMass({ ...history, largeJobs: [job] }, record, OPTIONS)).toThrow('outside');
  });
});

describe('the mix', () => {
  test('a refrigerant that takes over goes on taking over, but less each month', () => {
    const months = 84;
    const share = (at: number) => 1 / (1 + Math.exp(-(at - 60) / 20));
    const volume = Array.from({ length: months }, () => 100);
    const history: MassHistory = {
      firstMonthOfYear: 0,
      months,
      routineKg: new Map([
        ['R-22', volume.map((kg, at) => kg * (1 - share(at)))],
        ['R-410A', volume.map((kg, at) => kg * share(at))],
      ]),
      largeJobs: [],
      lost: new Set(),
    };
    const ahead = forecast(history);
    const part = (step: number) =>
      (ahead.months[step]?.byRefrigerant.get('R-410A')?.meanGrams ?? 0) / (ahead.months[step]?.total.meanGrams ?? 1);
    expect(part(0)).toBeGreaterThan(share(months - 1) - 0.05);
    expect(part(11)).toBeGreaterThan(part(0));
    expect(part(11)).toBeLessThanOrEqual(1);
  });
});

describe('the running month', () => {
  const history = madeUpCompany('running', { months: 72, routineKg: 100, noise: 0.1, largeJobsPerMonth: 1 });
  const plain = forecast(history);
  const first = plain.months[0]?.total.meanGrams ?? 0;
  const running = (daysPassed: number, kg: number) =>
    forecast(history, {
      running: { daysPassed, days: 30, routineKg: new Map([['R-1', kg]]), largeKg: new Map() },
    });

  test('at its end it is what came in', () => {
    expect(running(30, 42).months[0]?.total.meanGrams).toBe(42_000);
  });

  test('before its first day it is the forecast', () => {
    expect(running(0, 0).months[0]?.total.meanGrams).toBe(first);
  });

  test('never less than what came in, and a busy half makes more than a quiet one', () => {
    const busy = running(15, 200).months[0]?.total;
    expect(busy?.meanGrams).toBeGreaterThan(200_000);
    expect(busy?.ranges.every(({ lowerGrams }) => lowerGrams >= 200_000)).toBe(true);
    expect(busy?.meanGrams).toBeGreaterThan(running(15, 20).months[0]?.total.meanGrams ?? Number.POSITIVE_INFINITY);
  });

  test('later months do not move', () => {
    expect(running(15, 200).months[1]?.total.meanGrams).toBe(plain.months[1]?.total.meanGrams);
  });

  test('a refrigerant seen for the first time this month is in it', () => {
    const ahead = forecast(history, {
      running: { daysPassed: 10, days: 30, routineKg: new Map([['R-new', 3]]), largeKg: new Map() },
    });
    expect(ahead.months[0]?.byRefrigerant.get('R-new')?.meanGrams).toBe(3000);
    expect(ahead.months[1]?.byRefrigerant.get('R-new')?.meanGrams).toBe(0);
  });

  test('days that are none are refused', () => {
    expect(() => running(31, 1)).toThrow(RangeError);
  });
});
