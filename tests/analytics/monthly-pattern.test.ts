import { describe, expect, test } from 'vitest';
import { monthlyPattern, type WholeMonth } from '@/analytics/monthly-pattern/pattern';
import { everyMonth } from '@/analytics/monthly-trends/series';

/** A level of 100 kg that grows by 1 kg a month, three times as much in July as in January, and a fixed ripple. */
const made = (months: string[], change: (month: WholeMonth) => Partial<WholeMonth> = () => ({})): WholeMonth[] =>
  months.map((month, index) => {
    const season = 1 + 0.5 * Math.sin(((Number(month.slice(5)) - 4) / 6) * Math.PI);
    const ripple = 1 + 0.05 * Math.sin(index * 2.3) + 0.03 * Math.cos(index * 5.1);
    const plain = { month, recoveredMass: (100 + index) * season * ripple, recoveries: 20 };
    return { ...plain, ...change(plain) };
  });
const FIVE_YEARS = everyMonth('2020-01', '2024-12');

const patternOf = (months: WholeMonth[]) => {
  const found = monthlyPattern(months);
  if (!found.enough) throw new Error(`Needs ${found.needs} ${found.of}, has ${found.has}`);
  return found.value;
};
const outside = (months: WholeMonth[]) =>
  patternOf(months)
    .months.filter(({ signals }) => signals.includes('beyondLimits'))
    .map(({ month }) => month);

test('finds the season that was made and the trend under it', () => {
  const { months, steady, seasonStrength } = patternOf(made(FIVE_YEARS));
  const july = months.find(({ month }) => month === '2022-07');
  const january = months.find(({ month }) => month === '2022-01');
  expect(steady).toBe(true);
  expect(seasonStrength).toBeGreaterThan(0.9);
  // Made with 1.5 and 0.5 of the level.
  expect((july?.seasonFactor ?? 0) / (january?.seasonFactor ?? 1)).toBeGreaterThan(2.6);
  expect((july?.seasonFactor ?? 0) / (january?.seasonFactor ?? 1)).toBeLessThan(3.4);
  expect((months.at(-1)?.trend ?? 0) / (months[0]?.trend ?? 1)).toBeGreaterThan(1.3);
});

test('an ordinary series has no unusual month, and its band holds every month', () => {
  const { months } = patternOf(made(FIVE_YEARS));
  expect(months.flatMap(({ signals }) => signals)).toEqual([]);
  for (const { recoveredMass, low, high } of months) {
    expect(recoveredMass).toBeGreaterThanOrEqual(low);
    expect(recoveredMass).toBeLessThanOrEqual(high);
  }
});

test('a month that was made too large or too small is the one that stands out', () => {
  for (const [month, times] of [
    ['2023-03', 2.5],
    ['2024-08', 0.3],
  ] as const) {
    const odd = made(FIVE_YEARS, (m) => (m.month === month ? { recoveredMass: m.recoveredMass * times } : {}));
    expect(outside(odd)).toEqual([month]);
    const found = patternOf(odd).months.find((m) => m.month === month);
    expect(found?.remainderFactor).toBeGreaterThan(times * 0.85);
    expect(found?.remainderFactor).toBeLessThan(times * 1.15);
  }
});

test('July is not unusual for being July', () => {
  expect(outside(made(FIVE_YEARS))).not.toContain('2024-07');
});

test('a month of few recoveries is neither judged nor a part of the limits', () => {
  const few = made(FIVE_YEARS, (m) => (m.month === '2023-03' ? { recoveredMass: 1, recoveries: 4 } : {}));
  expect(outside(few)).toEqual([]);
  expect(patternOf(few).months.find(({ month }) => month === '2023-03')?.counts).toBe(false);
  const early = made(FIVE_YEARS, (m) => (m.month === '2023-02' ? { recoveries: 4 } : {}));
  expect(patternOf(early).baseline).toMatchObject({ from: '2021-12', to: '2023-12', months: 24 });
});

test('the limits are those of the 24 months before the last twelve, or of the first where there are not so many', () => {
  expect(patternOf(made(FIVE_YEARS)).baseline).toMatchObject({ from: '2022-01', to: '2023-12', months: 24 });
  const short = made(everyMonth('2022-06', '2024-12'));
  expect(patternOf(short).baseline).toMatchObject({ from: '2022-06', to: '2024-05', months: 24 });
});

test('a season that was none is called none', () => {
  const level = made(FIVE_YEARS, (m) => ({
    recoveredMass: 100 * (1 + 0.2 * Math.sin(Number(m.month.replace('-', '')) * 7.7)),
  }));
  expect(patternOf(level).steady).toBe(false);
});

describe('says what is missing', () => {
  test.each([
    ['no month at all', [], { needs: 24, has: 0, of: 'full months' }],
    ['23 months', made(everyMonth('2023-01', '2024-11')), { needs: 24, has: 23, of: 'full months' }],
    [
      '30 months of which half have four recoveries',
      made(everyMonth('2022-01', '2024-06'), (m) => ({ recoveries: Number(m.month.slice(5)) % 2 ? 4 : 9 })),
      { needs: 24, has: 15, of: 'months of 5 routine recoveries or more' },
    ],
    ['nothing but zeros', made(FIVE_YEARS, () => ({ recoveredMass: 0 })), { needs: 1, has: 0, of: 'months with mass' }],
  ])('%s', (_what, months, missing) => {
    expect(monthlyPattern(months)).toEqual({ enough: false, ...missing });
  });

  test('and 24 are enough', () => {
    expect(monthlyPattern(made(everyMonth('2023-01', '2024-12'))).enough).toBe(true);
  });
});

test('a constant series has limits on itself and nothing unusual', () => {
  const constant = made(FIVE_YEARS, () => ({ recoveredMass: 50 }));
  const { months } = patternOf(constant);
  expect(months.flatMap(({ signals }) => signals)).toEqual([]);
  expect(months[30]?.expected).toBeCloseTo(50, 6);
});
