import fc from 'fast-check';
import { expect, test } from 'vitest';
import { SCOPE_PARTS } from '@/analytics/dimensions';
import {
  type FigureScope,
  figureOfAddress,
  figureParams,
  figureRecords,
  isFigureKey,
} from '@/analytics/figures/figure';
import { MEASURES } from '@/analytics/figures/measures';
import { EVERY_RECORD } from '@/analytics/scope-address';

const month = fc.constantFrom('2024-12', '2026-01', '2026-11');
const moment = fc.option(fc.oneof(month, fc.constantFrom('2025-03-15', '2026-11-30')));
// Names are any text that a record can hold: commas, ampersands, plus signs, what looks like an address.
const name = fc.oneof(
  fc.string({ minLength: 1, maxLength: 12 }),
  fc.constantFrom('R-22', 'unstated', 'a&b=c', 'A, B', '100 %+'),
);
const names = fc.uniqueArray(name, { maxLength: 3 });
const scopes: fc.Arbitrary<FigureScope> = fc.record({
  from: moment,
  to: moment,
  refrigerant: names,
  technician: names,
  site: names,
  branch: names,
  category: names,
  jobType: names,
  appliance: names,
  except: fc.subarray([...SCOPE_PARTS]),
});

test('any figure comes back out of the address of any screen as it went in', () => {
  fc.assert(
    fc.property(
      fc.constantFrom(...MEASURES),
      scopes,
      scopes,
      fc.array(fc.constantFrom(...SCOPE_PARTS, 'except' as const)),
      (measure, page, own, narrowed) => {
        const scope = { ...page, from: own.from, to: own.to };
        for (const part of narrowed) Object.assign(scope, { [part]: own[part] });
        const params = figureParams({ measure, scope }, page);
        const address = new URLSearchParams([['from', 'x'], ['by', 'site'], ...params]);
        expect(figureOfAddress(new URLSearchParams(address.toString()), page)).toEqual({ measure, scope });
        expect(params.every(([key]) => isFigureKey(key))).toBe(true);
      },
    ),
    { numRuns: 1000, seed: 7 },
  );
});

test('it reads as what it is', () => {
  const page = { ...EVERY_RECORD, from: '2024-12', branch: ['East'] };
  const scope = { ...page, from: '2026-11', to: '2026-11', refrigerant: ['R-22'] };
  const search = new URLSearchParams(figureParams({ measure: 'recoveredMass', scope }, page)).toString();
  expect(search).toBe('open=recoveredMass&open.month=2026-11&open.refrigerant=R-22');
});

test('an address that names no known measure opens nothing', () => {
  for (const search of ['', 'open=', 'open=__proto__', 'open=mass', 'open.month=2026-11'])
    expect(figureOfAddress(new URLSearchParams(search), EVERY_RECORD)).toBeNull();
});

test('the records of a figure are those that count, and stand as its measure says', () => {
  const scope = { ...EVERY_RECORD, from: '2026-11', to: '2026-11', site: ['North Yard'] };
  const asked = { from: '2026-11', to: '2026-11', site: ['North Yard'], exclusion: 'none' };
  expect(figureRecords({ measure: 'recoveries', scope })).toEqual(asked);
  expect(figureRecords({ measure: 'flagged', scope })).toEqual({ ...asked, flagged: 'yes' });
});
