import { expect, test } from 'vitest';
import {
  allBut,
  defaultFrom,
  EVERY_RECORD,
  keptScope,
  monthOf,
  monthsBefore,
  onlyOf,
  type ScopeSelection,
  scopeQuery,
  scopeSearch,
} from '@/analytics/scope-address';

const everything: ScopeSelection = { ...EVERY_RECORD, unit: 'lb' };

test('a scope asks the routes for what narrows it, and for nothing else', () => {
  expect(scopeQuery(everything)).toEqual({});
  expect(scopeQuery({ ...everything, from: '2025-01', refrigerant: ['R-22', 'R-410A'] })).toEqual({
    from: '2025-01',
    refrigerant: ['R-22', 'R-410A'],
  });
});

test('a link repeats the key for each value and names the unit', () => {
  const scope = { ...everything, from: '2025-01', to: '2026-11', refrigerant: ['R-22', 'R-410A'], site: ['Mill & Co'] };
  expect(scopeSearch(scope)).toBe(
    '?from=2025-01&to=2026-11&refrigerant=R-22&refrigerant=R-410A&site=Mill+%26+Co&unit=lb',
  );
  expect(scopeSearch(everything, { sort: 'yield' })).toBe('?unit=lb&sort=yield');
});

test('a link to another screen carries the scope along and leaves the rest', () => {
  expect(keptScope(new URLSearchParams('refrigerant=R-22&page=3&refrigerant=R-32&unit=kg'))).toBe(
    '?refrigerant=R-22&refrigerant=R-32&unit=kg',
  );
  expect(keptScope(new URLSearchParams('page=3'))).toBe('');
});

test('months are counted back over the turn of the year', () => {
  expect(monthsBefore('2026-01', 1)).toBe('2025-12');
  expect(monthsBefore('2026-12', 12)).toBe('2025-12');
  expect(defaultFrom('2026-12')).toBe('2024-12');
});

test('the running month is the one of the company', () => {
  // Half past three on the first of December in UTC is still November in New York (UTC-5, IANA tzdata).
  const instant = new Date('2026-12-01T03:30:00Z');
  expect(monthOf(instant, 'America/New_York')).toBe('2026-11');
  expect(monthOf(instant, 'Europe/Berlin')).toBe('2026-12');
});

test('a part is narrowed to names, or to all others', () => {
  const page = { ...everything, site: ['A'], except: ['site' as const] };
  expect(onlyOf(page, 'site', ['B'])).toEqual({ ...everything, site: ['B'] });
  expect(allBut(everything, 'site', ['B', 'C'])).toEqual({ ...everything, site: ['B', 'C'], except: ['site'] });
  // What the scope leaves out already stays out; what it names already is named less.
  expect(allBut(page, 'site', ['B'])).toEqual({ ...everything, site: ['A', 'B'], except: ['site'] });
  expect(allBut({ ...everything, site: ['A', 'B', 'C'] }, 'site', ['B'])).toEqual({ ...everything, site: ['A', 'C'] });
  expect(scopeQuery(allBut(everything, 'site', ['B']))).toEqual({ site: ['B'], except: ['site'] });
});
