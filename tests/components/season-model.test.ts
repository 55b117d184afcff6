import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import type { ShownPattern } from '@/analytics/monthly-pattern/contract';
import { EVERY_RECORD } from '@/analytics/scope-address';
import { modelFile } from '@/components/charts/model-file';
import { ModelTable } from '@/components/charts/model-table';
import { seasonModel, seasonPicture } from '@/components/trends/season-model';

const month = (no: number, change: Partial<ShownPattern['months'][number]> = {}): ShownPattern['months'][number] => ({
  month: `2026-0${no}`,
  recoveredMass: 10,
  recoveries: 20,
  trend: 9,
  seasonFactor: 1.1,
  remainderFactor: 1.01,
  expected: 9.9,
  low: 8,
  high: 12,
  counts: true,
  signals: [],
  ...change,
});
const pattern: ShownPattern = {
  months: [
    month(1),
    month(2, { recoveredMass: 20, signals: ['beyondLimits'] }),
    month(3, { counts: false, signals: [] }),
  ],
  seasonStrength: 0.8,
  steady: true,
  baseline: { from: '2024-01', to: '2025-12', months: 24, form: 'mean', lower: 0.8, upper: 1.2 },
};
const scope = { ...EVERY_RECORD, from: '2026-01', refrigerant: ['R-22'], unit: 'kg' as const };
const model = seasonModel(pattern, scope);

test('picture, file and table of the season say the same', () => {
  expect(
    seasonPicture(model).map(({ observed, low, high, counts, unusual }) => [observed, low, high, counts, unusual]),
  ).toEqual([
    [10, 8, 12, true, false],
    [20, 8, 12, true, true],
    [10, 8, 12, false, false],
  ]);
  const file = modelFile(model);
  expect(file.scopeWords).toBe('January 2026 to today, R-22; routine jobs');
  expect(file.columns.map(({ label }) => label)).toEqual([
    'Month',
    'Month is',
    'Recovered, kg',
    'Trend, kg',
    'Season, times',
    'Usual from, kg',
    'Usual to, kg',
  ]);
  expect(file.rows).toEqual([
    ['2026-01', 'usual', 10, 9, 1.1, 8, 12],
    ['2026-02', 'unusually high', 20, 9, 1.1, 8, 12],
    ['2026-03', 'too few to judge', 10, 9, 1.1, 8, 12],
  ]);
  const drawn = renderToStaticMarkup(createElement(ModelTable, { model, label: 'season' }));
  expect(drawn).toContain('unusually high');
  expect(drawn).toContain('1.10');
});

test('only what was recovered opens, and its words tell the band and the verdict', () => {
  expect(model.open('2026-02', 'recoveredMass')).toEqual({
    measure: 'routineMass',
    scope: { ...scope, from: '2026-02', to: '2026-02' },
  });
  expect(model.open('2026-02', 'trend')).toBeNull();
  expect(model.months[1]?.words.replaceAll('\u00a0', ' ')).toBe(
    'February 2026: 20 kg, usual is 8 to 12 kg; trend 9 kg, season × 1.10; unusually high.',
  );
});
