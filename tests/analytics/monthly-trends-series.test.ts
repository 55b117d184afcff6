import { expect, test } from 'vitest';
import { everyMonth, lastWholeMonth, MOST_KEYS, toStacks } from '@/analytics/monthly-trends/series';
import { trendsOf } from '../support/trends';

test('every month between the first and the last stands there, zeros included', () => {
  const { months } = toStacks(
    trendsOf([
      ['2025-11', 'R-22', 2],
      ['2026-02', 'R-410A', 3],
    ]),
  );
  expect(months.map(({ month, recoveredMass, layers }) => [month, recoveredMass, Object.values(layers)])).toEqual([
    ['2025-11', 2, [0, 2]],
    ['2025-12', 0, [0, 0]],
    ['2026-01', 0, [0, 0]],
    ['2026-02', 3, [3, 0]],
  ]);
  expect(months[1]?.medianYield).toBeNull();
});

test('the largest layer comes first, small ones become one, and nothing is lost', () => {
  const rows = Array.from(
    { length: MOST_KEYS + 3 },
    (_, i) => ['2026-01', `key ${i}`, i + 0.001] as [string, string, number],
  );
  const { layers, months } = toStacks(trendsOf(rows));
  expect(layers).toHaveLength(MOST_KEYS + 1);
  expect(layers[0]?.key).toBe(`key ${MOST_KEYS + 2}`);
  expect(layers.at(-1)).toEqual({ id: 'rest', key: null, members: ['key 2', 'key 1', 'key 0'] });
  expect(months[0]?.layers.rest).toBe(3.003);
});

test('one name too many keeps its own layer', () => {
  const rows = Array.from({ length: MOST_KEYS + 1 }, (_, i) => ['2026-01', `key ${i}`, i] as [string, string, number]);
  expect(toStacks(trendsOf(rows)).layers.every((layer) => layer.key !== null)).toBe(true);
});

test('a key that is called like the rest is not the rest', () => {
  const { layers } = toStacks(trendsOf([['2026-01', 'rest', 1]]));
  expect(layers).toEqual([{ id: 'layer-0', key: 'rest', members: ['rest'] }]);
});

test('running and cut months are marked, and the last whole month is neither', () => {
  const { months } = toStacks(
    trendsOf(
      [
        ['2026-09', 'R-22', 1],
        ['2026-10', 'R-22', 1],
        ['2026-11', 'R-22', 1],
        ['2026-12', 'R-22', 1],
      ],
      { partialMonth: '2026-12', cutMonths: ['2026-09', '2026-11'] },
    ),
  );
  expect(months.map(({ state }) => state)).toEqual(['cut', 'whole', 'cut', 'running']);
  expect(lastWholeMonth(months)?.month).toBe('2026-10');
});

test('nothing gives nothing; a year turns', () => {
  expect(toStacks(trendsOf([]))).toEqual({ layers: [], months: [] });
  expect(everyMonth('2025-12', '2026-01')).toEqual(['2025-12', '2026-01']);
  expect(everyMonth('2026-01', '2025-12')).toEqual([]);
});
