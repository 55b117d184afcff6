import fc from 'fast-check';
import { expect, test } from 'vitest';
import { everyMonth } from '@/analytics/monthly-trends/series';
import { spreadLabels } from '@/components/charts/end-labels';
import { tickedMonths, tickName, tickYear } from '@/components/charts/month-ticks';
import { placeNotes } from '@/components/charts/note-lanes';
import { layerColours } from '@/components/trends/layer-colours';

const ids = (labels: { id: string }[]) => labels.map(({ id }) => id);

test('labels that do not touch stay where they belong', () => {
  const wishes = [
    { id: 'low', y: 200 },
    { id: 'high', y: 40 },
  ];
  expect(spreadLabels(wishes, 18, 0, 300)).toEqual([
    { id: 'high', y: 40 },
    { id: 'low', y: 200 },
  ]);
});

test('labels never touch, keep their order and stay inside while there is room', () => {
  const wish = fc.integer({ min: 0, max: 300 });
  fc.assert(
    fc.property(fc.array(wish, { minLength: 1, maxLength: 9 }), (heights) => {
      const wishes = heights.map((y, index) => ({ id: String(index), y }));
      const placed = spreadLabels(wishes, 18, 0, 300);
      placed.slice(1).forEach((label, index) => {
        expect(label.y - (placed[index]?.y ?? 0)).toBeGreaterThanOrEqual(18);
      });
      expect(placed[0]?.y).toBeGreaterThanOrEqual(0);
      expect(placed.at(-1)?.y).toBeLessThanOrEqual(300);
      expect(ids(placed).map((id) => wishes[Number(id)]?.y)).toEqual([...heights].sort((a, b) => a - b));
    }),
  );
});

test('ticks thin out from months to quarters to years', () => {
  const twoYears = everyMonth('2024-12', '2026-11');
  expect(tickedMonths(twoYears, 31, false)).toEqual(twoYears);
  expect(tickedMonths(twoYears, 15, false)[0]).toBe('2025-01');
  expect(tickedMonths(twoYears, 6, false)).toEqual(['2025-01', '2026-01']);
  expect(tickName('2026-11', false, false)).toBe('Nov');
  expect(tickName('2026-11', false, true)).toBe('N');
  expect(tickName('2026-01', true, false)).toBe('');
});

test('a year stands under January, and under the first month when no January follows soon', () => {
  const months = everyMonth('2026-03', '2026-11');
  expect(tickYear('2026-03', months)).toBe('2026');
  expect(tickYear('2026-04', months)).toBe('');
  const overNewYear = everyMonth('2025-12', '2026-11');
  expect(tickYear('2025-12', overNewYear)).toBe('');
  expect(tickYear('2026-01', overNewYear)).toBe('2026');
});

test('no two layers of a picture share a colour', () => {
  const layers = ['R-410A', 'R-22', 'R-401A', 'R-402A', 'R-408A', 'R-409A', 'R-502'].map((key, index) => ({
    id: `layer-${index}`,
    key,
    keys: 1,
  }));
  const colours = Object.values(layerColours('refrigerant', layers));
  expect(new Set(colours).size).toBe(layers.length);
  expect(colours.slice(0, 2)).toEqual(['var(--refrigerant-r-410a)', 'var(--refrigerant-r-22)']);
  expect(new Set(Object.values(layerColours('site', layers))).size).toBe(layers.length);
});

test('notes stand over the months that they touch, each in a lane where it meets no other', () => {
  const months = everyMonth('2026-01', '2026-06');
  const note = (no: number, first: string, last = first) => ({ id: `n${no}`, no, first, last });
  const placed = placeNotes(
    [
      note(1, '2025-11', '2026-02'),
      note(2, '2026-02'),
      note(3, '2026-03', '2026-09'),
      note(4, '2026-07'),
      note(5, '2025-12'),
    ],
    months,
  );
  // The first is cut to the picture, the third too; the fourth and fifth are not in it.
  expect(placed.map(({ no, first, last, lane }) => [no, first, last, lane])).toEqual([
    [1, '2026-01', '2026-02', 0],
    [2, '2026-02', '2026-02', 1],
    [3, '2026-03', '2026-06', 0],
  ]);
  expect(placeNotes([note(1, '2026-01')], [])).toEqual([]);
});
