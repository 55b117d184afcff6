import { describe, expect, test } from 'vitest';
import { massBalance } from '@/analytics/mass-balance/balance';
import { differencesOverTime, normalisedError } from '@/analytics/mass-balance/settlement';
import { goodForYield, weighed } from '@/analytics/mass-balance/weighing';

describe('one weighing', () => {
  const scale = { resolution: 0.1, repeatability: 0.05, slope: 0.001, holdUp: 0.03 };

  // By hand: u = √(2·0.1²/12 + 2·0.05² + 0.03²) = 0.087; 0.5 lb ± 0.174 is 35 %, 2.2 lb ± 0.174 is 8 %.
  test('half a pound on a 0.1 lb scale is too little to judge a yield by', () => {
    expect(goodForYield(weighed(20, 20.5, scale))).toBe(false);
    expect(goodForYield(weighed(20, 22.2, scale))).toBe(true);
  });

  test('a reading that is no number is refused', () => {
    expect(() => weighed(20, Number.NaN, scale)).toThrow(RangeError);
    expect(() => weighed(20, 21, { ...scale, resolution: -0.1 })).toThrow(RangeError);
  });
});

describe('a balance', () => {
  const flow = {
    recovered: [10],
    recoveredErrors: [0],
    ownSlope: 0,
    shipped: 10,
    shippedError: 0,
    theirSlope: 0,
    opening: 0,
    closing: 0,
    stockError: 0,
  };

  test('is refused where nothing is known of the scales', () => {
    expect(() => massBalance(flow)).toThrow('how well was weighed');
  });

  test('finds too much shipped as serious as too little', () => {
    expect(massBalance({ ...flow, shipped: 12, shippedError: 0.2 }).verdict).toBe('investigate');
    expect(massBalance({ ...flow, shipped: 8, shippedError: 0.2 }).verdict).toBe('investigate');
  });
});

describe('settlements over time', () => {
  // By hand with k 0.5, h 5: each shipment one standard error short adds 0.5, so the eleventh passes 5.
  test('a small difference that keeps to one side signals at the eleventh shipment', () => {
    const chart = differencesOverTime(Array.from({ length: 12 }, () => ({ difference: 0.4, standardError: 0.4 })));
    expect(chart.findIndex(({ signal }) => signal !== null)).toBe(10);
    expect(chart[10]?.signal).toEqual({ side: 'above', runStart: 0 });
  });

  test('differences to either side in turn never signal', () => {
    const chart = differencesOverTime(
      Array.from({ length: 60 }, (_, at) => ({ difference: at % 2 === 0 ? 0.5 : -0.5, standardError: 0.4 })),
    );
    expect(chart.every(({ signal }) => signal === null)).toBe(true);
  });

  test('two masses without any error cannot be compared', () => {
    expect(() => normalisedError({ mass: 1, expanded: 0 }, { mass: 1, expanded: 0 })).toThrow(RangeError);
  });
});
