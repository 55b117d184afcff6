import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { bandShareOf, lineCents, rateOf, settle } from '@/lib/trade/settlement';

// Worked by hand with invented rates: 40.40 lb × $1.25 = 50.50; 45.20 × $6.00 × 0.90 = 244.08; 22.0 × −$1.00 = −22.00.
test('three loads, three cylinders and freight: $222.58', () => {
  const settlement = settle(
    [
      { refrigerant: 'R-410A', grossCentipounds: 6790, tareCentipounds: 2750, rate: 12_500 },
      { refrigerant: 'R-22', grossCentipounds: 4520, tareCentipounds: 0, rate: 60_000, bandShare: 9000 },
      { refrigerant: 'mixed', grossCentipounds: 2200, tareCentipounds: 0, rate: -10_000 },
    ],
    [
      { what: 'cylinder', count: 3, centsEach: -500 },
      { what: 'freight', count: 1, centsEach: -3500 },
    ],
  );
  expect(settlement.lines.map(({ cents }) => cents)).toEqual([5050, 24_408, -2200]);
  expect(settlement.charges.map(({ cents }) => cents)).toEqual([-1500, -3500]);
  expect(settlement.totalCents).toBe(22_258);
});

describe('a line', () => {
  test('halves of a cent go away from zero', () => {
    // 0.50 lb at 1 cent is half a cent.
    const line = { refrigerant: 'R-22', grossCentipounds: 50, tareCentipounds: 0 };
    expect(lineCents({ ...line, rate: 100 })).toBe(1);
    expect(lineCents({ ...line, rate: -100 })).toBe(-1);
  });

  test('a cylinder that weighs less full than empty, and what is no whole number, are refused', () => {
    const line = { refrigerant: 'R-22', grossCentipounds: 100, tareCentipounds: 200, rate: 1 };
    expect(() => lineCents(line)).toThrow(RangeError);
    expect(() => lineCents({ ...line, grossCentipounds: 300.5 })).toThrow(RangeError);
  });

  test('is within half a cent of the exact value, whatever the load', () => {
    fc.assert(
      fc.property(fc.nat(5_000_000), fc.integer({ min: -500_000, max: 500_000 }), fc.nat(10_000), (net, rate, band) => {
        const cents = lineCents({ refrigerant: 'x', grossCentipounds: net, tareCentipounds: 0, rate, bandShare: band });
        const exact = ((net / 100) * (rate / 100) * band) / 10_000;
        expect(Number.isInteger(cents)).toBe(true);
        expect(Math.abs(cents - exact)).toBeLessThanOrEqual(0.5 + 1e-6 * Math.abs(exact) + 1e-9);
      }),
    );
  });
});

describe('steps', () => {
  const bands = [
    { fromPurity: 9950, share: 10_000 },
    { fromPurity: 9500, share: 7000 },
  ];

  test('a purity earns the highest band that it reaches, in whatever order they stand', () => {
    expect(bandShareOf(bands, 9950)).toBe(10_000);
    expect(bandShareOf(bands, 9949)).toBe(7000);
    expect(bandShareOf(bands, 9499)).toBe(0);
  });

  test('a mass earns the highest price step that it reaches', () => {
    const steps = [
      { fromCentipounds: 10_000, rate: 50_000 },
      { fromCentipounds: 0, rate: 40_000 },
    ];
    expect(rateOf(steps, 9_999)).toBe(40_000);
    expect(rateOf(steps, 10_000)).toBe(50_000);
    expect(rateOf([], 1)).toBeNull();
  });
});
