import type { Dimension } from '@/analytics/dimensions';
import { type ScopeSelection, scopeSearch } from '@/analytics/scope-address';

/** More names than this do not fit an address. */
const MOST_NAMES = 40;

/** A month's part of a scope: the month itself, or what the scope's own days leave of it. */
const monthInScope = (scope: ScopeSelection, month: string): Pick<ScopeSelection, 'from' | 'to'> => ({
  from: scope.from?.startsWith(`${month}-`) ? scope.from : month,
  to: scope.to?.startsWith(`${month}-`) ? scope.to : month,
});

/** Where the records of a month are, narrowed to some keys of a dimension; null when they are too many to name. */
export const recordsHref = (
  scope: ScopeSelection,
  month: string,
  narrowed?: { by: Dimension; keys: readonly string[] },
): string | null => {
  if (narrowed && narrowed.keys.length > MOST_NAMES) return null;
  const keys = narrowed ? { [narrowed.by]: [...narrowed.keys] } : {};
  return `/records${scopeSearch({ ...scope, ...monthInScope(scope, month), ...keys })}`;
};

/** The same month on another screen of the same scope. */
export const screenHref = (path: string, scope: ScopeSelection, month: string): string =>
  `${path}${scopeSearch({ ...scope, ...monthInScope(scope, month) })}`;
