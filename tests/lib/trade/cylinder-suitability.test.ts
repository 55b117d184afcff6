import { describe, expect, test } from 'vitest';
import { type CylinderMarks, fillCautions } from '@/lib/trade/cylinder-suitability';
import { requalificationDue, requalificationState } from '@/lib/trade/requalification';

const TODAY = '2026-12-01';
const GOOD: CylinderMarks = {
  servicePressurePsig: 400,
  isDisposable: false,
  isMarkedFlammable: false,
  requalificationDueOn: '2029-03-01',
  holds: null,
};
const R410A = { designation: 'R-410A', safetyClass: 'A1' };
const kinds = (marks: Partial<CylinderMarks>, gas = R410A) =>
  fillCautions({ ...GOOD, ...marks }, gas, TODAY).map(({ kind }) => kind);

describe('what speaks against a fill', () => {
  test('nothing, with a sound cylinder', () => {
    expect(kinds({})).toEqual([]);
    expect(kinds({ holds: 'R-410A' })).toEqual([]);
  });

  // 49 CFR 173.301(a)(8), worked: R-410A needs 387 psig.
  test('400 psig carries R-410A and 350 does not', () => {
    expect(kinds({ servicePressurePsig: 350 })).toEqual(['rating too low']);
    expect(kinds({ servicePressurePsig: null })).toEqual(['rating unknown']);
  });

  // 49 CFR 173.304a(a)(2) names 240 for R-22.
  test('240 psig carries R-22', () => {
    expect(kinds({ servicePressurePsig: 240 }, { designation: 'R-22', safetyClass: 'A1' })).toEqual([]);
  });

  test('a flammable gas wants a cylinder marked for it', () => {
    const r454b = { designation: 'R-454B', safetyClass: 'A2L' };
    expect(kinds({}, r454b)).toEqual(['not marked for flammable gas']);
    expect(kinds({ isMarkedFlammable: true }, r454b)).toEqual([]);
    expect(kinds({}, { designation: 'R-290', safetyClass: 'A3' })).toEqual(['not marked for flammable gas']);
    expect(kinds({}, { designation: 'R-123', safetyClass: 'B1' })).toEqual([]);
  });

  test('a disposable one is never filled, and another refrigerant is never added', () => {
    expect(kinds({ isDisposable: true })).toEqual(['disposable']);
    expect(kinds({ holds: 'R-22' })).toEqual(['holds another refrigerant']);
  });

  test('what stops comes before what warns', () => {
    expect(kinds({ servicePressurePsig: null, isDisposable: true, requalificationDueOn: null })).toEqual([
      'disposable',
      'rating unknown',
      'test date unknown',
    ]);
  });
});

describe('the test date', () => {
  test('five years on, and the leap day falls to the 28th', () => {
    expect(requalificationDue('2021-06-15')).toBe('2026-06-15');
    expect(requalificationDue('2024-02-29')).toBe('2029-02-28');
    expect(requalificationDue('2016-02-29', 12)).toBe('2028-02-29');
  });

  // 49 CFR 173.301(a)(6): it may be filled up to its date.
  test('the due day itself is still in time', () => {
    expect(requalificationState(TODAY, TODAY)).toBe('due soon');
    expect(requalificationState('2026-11-30', TODAY)).toBe('overdue');
    expect(requalificationState('2027-06-01', TODAY)).toBe('valid');
    expect(kinds({ requalificationDueOn: '2026-11-30' })).toEqual(['test overdue']);
  });

  test('what is no day is refused', () => {
    expect(() => requalificationDue('2026-13-01')).toThrow(RangeError);
    expect(() => requalificationState('soon', TODAY)).toThrow(RangeError);
  });
});
