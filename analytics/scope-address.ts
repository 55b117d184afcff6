import type { DisplayUnit } from '@/lib/vocabulary';
import { SCOPE_PARTS, type ScopePart } from './dimensions';

/** A scope as it stands in the address, nothing left out: empty lists do not narrow. The browser reads this file too. */
export type ScopeSelection = Record<ScopePart, string[]> & {
  /** Parts whose values are left out rather than kept. */
  except: ScopePart[];
  /** First and last month or day, inclusive; null is open. */
  from: string | null;
  to: string | null;
  /** Unit to read masses in; the API speaks kilograms whatever is chosen. */
  unit: DisplayUnit;
};

/** What narrows nothing: every record of every time. */
export const EVERY_RECORD: Omit<ScopeSelection, 'unit'> = {
  from: null,
  to: null,
  refrigerant: [],
  technician: [],
  site: [],
  branch: [],
  category: [],
  jobType: [],
  appliance: [],
  except: [],
};

type Narrowing = Pick<ScopeSelection, ScopePart | 'except'>;

/** A scope with one part narrowed to these values, whatever it was narrowed to before. */
export const onlyOf = <Scope extends Narrowing>(scope: Scope, part: ScopePart, values: readonly string[]): Scope => ({
  ...scope,
  [part]: [...values],
  except: scope.except.filter((other) => other !== part),
});

/** What a scope holds besides these values of one part; they must not be all that it holds. */
export const allBut = <Scope extends Narrowing>(scope: Scope, part: ScopePart, values: readonly string[]): Scope => {
  const kept = scope[part].filter((value) => !values.includes(value));
  if (scope[part].length && !scope.except.includes(part)) return { ...scope, [part]: kept };
  const left = [...new Set([...(scope.except.includes(part) ? scope[part] : []), ...values])];
  return { ...scope, [part]: left, except: [...new Set([...scope.except, part])] };
};

/** Search parameters of the analytic routes. */
export type ScopeQuery = Partial<Record<ScopePart | 'except' | 'from' | 'to', string | string[]>>;

/** The keys that a scope has in the address. */
const SCOPE_KEYS = new Set<string>(['from', 'to', 'unit', 'except', ...SCOPE_PARTS]);

/** What an analytic route is asked for this scope. */
export const scopeQuery = (scope: Omit<ScopeSelection, 'unit'>): ScopeQuery => {
  const query: ScopeQuery = {};
  if (scope.from) query.from = scope.from;
  if (scope.to) query.to = scope.to;
  for (const part of SCOPE_PARTS) if (scope[part].length) query[part] = scope[part];
  const except = scope.except.filter((part) => scope[part].length);
  if (except.length) query.except = except;
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
