import type { DisplayUnit } from '@/lib/vocabulary';
import { DIMENSIONS, type Dimension } from './dimensions';

/** A scope as it stands in the address, nothing left out: empty lists do not narrow. The browser reads this file too. */
export type ScopeSelection = Record<Dimension, string[]> & {
  /** First and last month or day, inclusive; null is open. */
  from: string | null;
  to: string | null;
  /** Unit to read masses in; the API speaks kilograms whatever is chosen. */
  unit: DisplayUnit;
};

/** Search parameters of the analytic routes. */
export type ScopeQuery = Partial<Record<Dimension | 'from' | 'to', string | string[]>>;

/** The keys that a scope has in the address. */
const SCOPE_KEYS = new Set<string>(['from', 'to', 'unit', ...DIMENSIONS]);

/** What an analytic route is asked for this scope. */
export const scopeQuery = (scope: Omit<ScopeSelection, 'unit'>): ScopeQuery => {
  const query: ScopeQuery = {};
  if (scope.from) query.from = scope.from;
  if (scope.to) query.to = scope.to;
  for (const dimension of DIMENSIONS) if (scope[dimension].length) query[dimension] = scope[dimension];
  return query;
};

/** The scope as a search string for links: `?from=2025-01&refrigerant=R-22&unit=lb`, `extra` behind it. */
export const scopeSearch = (scope: ScopeSelection, extra: Record<string, string> = {}): string => {
  const params = new URLSearchParams();
  for (const [key, value] of Object.entries({ ...scopeQuery(scope), unit: scope.unit, ...extra }))
    for (const one of [value].flat()) params.append(key, one);
  return `?${params}`;
};

/** The part of an address that is scope, as a search string: what a link to another screen carries along. */
export const keptScope = (search: { entries: () => Iterable<[string, string]> }): string => {
  const kept = new URLSearchParams([...search.entries()].filter(([key]) => SCOPE_KEYS.has(key)));
  return kept.size ? `?${kept}` : '';
};

/** Months before the running one that a screen shows when the address names no period. */
const DEFAULT_MONTHS = 24;

/** The month `count` months before a month `YYYY-MM`. */
export const monthsBefore = (month: string, count: number): string => {
  const [year = 0, monthNo = 1] = month.split('-').map(Number);
  return new Date(Date.UTC(year, monthNo - 1 - count, 1)).toISOString().slice(0, 7);
};

/** The month `YYYY-MM` that an instant lies in for the company. */
export const monthOf = (instant: Date, timeZone: string): string =>
  new Intl.DateTimeFormat('en-CA', { year: 'numeric', month: '2-digit', timeZone }).format(instant).slice(0, 7);

/** Where the default period begins: 24 whole months and the running one. */
export const defaultFrom = (runningMonth: string): string => monthsBefore(runningMonth, DEFAULT_MONTHS);
