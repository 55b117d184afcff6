import { expect, test } from 'vitest';
import { type FunnelPoint, funnelScales, limitPath } from '@/components/charts/funnel';

const box = { width: 800, height: 400, margin: { top: 20, right: 100, bottom: 40, left: 40 } };
const point = (amount: number, value: number): FunnelPoint => ({
  key: `${amount}`,
  name: 'A',
  amount,
  value,
  low: value - 0.02,
  high: value + 0.02,
  isMarked: false,
});
// Spiegelhalter, Statistics in Medicine 24 (2005): limits at z of the normal law, narrowing with the square root.
const limits = [1.96, 3.09].map((z) => ({
  name: `${z}`,
  halfWidth: (amount: number) => (z * 0.24) / Math.sqrt(amount),
}));

test('every point and zero lie inside the picture, the best known at the right', () => {
  const points = [point(6, -0.3), point(60, 0.02), point(420, -0.11)];
  const { x, y } = funnelScales(points, limits, box);
  for (const { amount, value } of points) {
    expect(x(amount)).toBeGreaterThanOrEqual(box.margin.left);
    expect(x(amount)).toBeLessThanOrEqual(box.width - box.margin.right);
    expect(y(value)).toBeGreaterThanOrEqual(box.margin.top);
    expect(y(value)).toBeLessThanOrEqual(box.height - box.margin.bottom);
  }
  expect(y(0)).toBeCloseTo((box.margin.top + box.height - box.margin.bottom) / 2, 6);
});

test('a limit never leaves the picture and closes in on zero', () => {
  const scales = funnelScales([point(20, 0.05), point(400, -0.02)], limits, box);
  for (const limit of limits) {
    const heights = [...limitPath(limit, 1, scales).matchAll(/[ML][\d.]+ ([\d.]+)/g)].map(([, y]) => Number(y));
    expect(heights.length).toBeGreaterThan(10);
    expect(Math.min(...heights)).toBeGreaterThanOrEqual(box.margin.top);
    expect([...heights].sort((a, b) => a - b)).toEqual(heights);
  }
});

test('one point and no point make a picture too', () => {
  for (const points of [[], [point(20, 0)]]) {
    const { x, y } = funnelScales(points, limits, box);
    expect(Number.isFinite(x(1)) && Number.isFinite(y(0.01))).toBe(true);
  }
});
