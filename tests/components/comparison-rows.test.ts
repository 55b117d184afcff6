import { expect, test } from 'vitest';
import type { Comparison, PeriodFigures } from '@/analytics/trends-comparison/contract';
import { type ComparisonLook, comparisonRows } from '@/components/trends/comparison-rows';

const side = (figures: Partial<PeriodFigures>): PeriodFigures => ({
  from: '2026-01-01',
  to: '2026-06-30',
  recoveredMass: 45.359237,
  massStandardError: 0,
  recoveries: 100,
  totalYield: 0.85,
  medianYield: 0.9,
  holdStated: 80,
  held: 60,
  heldShare: 0.75,
  vacuumStated: 0,
  downToLevel: 0,
  downToLevelShare: null,
  flagged: 3,
  flaggedShare: 0.03,
  co2e: 90_000,
  massWithoutGwp: 0,
  excluded: 0,
  ...figures,
});

const comparison: Comparison = {
  now: side({ recoveredMass: 54.4310844, heldShare: 0.8, massWithoutGwp: 4.5359237 }),
  before: side({ recoveries: 0, co2e: 0 }),
  sameDays: false,
  shortened: null,
  difference: { mass: 9, low: -1, high: 19 },
  ratio: { value: 1.2, low: 0.9, high: 1.6 },
  clear: false,
  movers: [],
  otherKeys: { keys: 0, difference: 0 },
};

const look: ComparisonLook = { unit: 'lb', gwp: 'ar4', co2eLabel: 'CO2e', mayLook: true };

test('figures are in the viewer’s unit, shares change by points, and what cannot be said is not', () => {
  const rows = comparisonRows(comparison, look).map((row) =>
    [row.label, row.figure(comparison.now), row.figure(comparison.before), row.change].map((text) =>
      String(text).replaceAll('\u00a0', ' '),
    ),
  );
  // 1 lb = 0.45359237 kg: 120 and 100 lb.
  expect(rows).toEqual([
    ['Recovered mass, lb', '120', '100', '+20%'],
    ['Recoveries', '100', '0', '—'],
    ['Total yield', '85.0%', '85.0%', '0.0 points'],
    ['Median yield', '90.0%', '90.0%', '0.0 points'],
    ['Held', '80%', '75%', '+5.0 points'],
    ['Down to level', '—', '—', '—'],
    ['Flagged', '3', '3', '0.0 points'],
    ['CO2e', '90.0', '0.0', '—'],
  ]);
});

test('the range of a change and the mass without a GWP are said in small', () => {
  const rows = comparisonRows(comparison, look);
  expect(rows[0]?.changeSmall).toBe('likely −10% to +60%');
  expect(rows.at(-1)?.small?.(comparison.now)).toBe('without 10 lb of no known GWP');
  expect(rows.at(-1)?.small?.(comparison.before)).toBe('');
});

test('every figure opens what it measures, standing among like jobs only for who may look', () => {
  const opened = (changed: Partial<ComparisonLook>) =>
    comparisonRows(comparison, { ...look, ...changed }).map(({ measure }) => measure);
  expect(opened({})).not.toContain(undefined);
  expect(opened({ mayLook: false }).filter((measure) => measure === undefined)).toHaveLength(1);
  expect(opened({}).at(-1)).toBe('co2e');
  expect(opened({ gwp: 'ar6' }).at(-1)).toBe('co2eAr6');
});
