'use client';

import { parseAsNativeArrayOf, parseAsString, parseAsStringLiteral, useQueryStates } from 'nuqs';
import { useMemo } from 'react';
import { SCOPE_PARTS } from '@/analytics/dimensions';
import { defaultFrom, monthOf, type ScopeSelection, scopeSearch } from '@/analytics/scope-address';
import { useViewer } from '@/components/viewer-context';
import { DISPLAY_UNITS } from '@/lib/vocabulary';

const names = parseAsNativeArrayOf(parseAsString);

const PARSERS = {
  from: parseAsString,
  to: parseAsString,
  branch: names,
  refrigerant: names,
  technician: names,
  site: names,
  category: names,
  jobType: names,
  appliance: names,
  except: parseAsNativeArrayOf(parseAsStringLiteral(SCOPE_PARTS)),
  unit: parseAsStringLiteral(DISPLAY_UNITS),
};

const NOTHING_NARROWED = {
  from: null,
  to: null,
  branch: null,
  refrigerant: null,
  technician: null,
  site: null,
  category: null,
  jobType: null,
  appliance: null,
  except: null,
};

/** Parts of the scope to set; a part set to null goes back to its default. */
export type ScopePatch = { [Part in keyof ScopeSelection]?: ScopeSelection[Part] | null };

/**
 * The scope of this screen, read from the address and written to it; each change is a step that Back undoes. Without a
 * period in the address it is 24 whole months and the running one, in the company's time zone.
 */
export const useScope = () => {
  const { timeZone, massUnit } = useViewer();
  const [address, setAddress] = useQueryStates(PARSERS, { history: 'push' });
  const begin = defaultFrom(monthOf(new Date(), timeZone));
  const scope = useMemo<ScopeSelection>(() => {
    const periodGiven = Boolean(address.from || address.to);
    return {
      ...address,
      from: periodGiven ? address.from : begin,
      unit: address.unit ?? massUnit,
    };
  }, [address, begin, massUnit]);
  return {
    scope,
    /** The same as a search string, for links that show this scope to somebody else. */
    search: scopeSearch(scope),
    setScope: (patch: ScopePatch) => setAddress(patch),
    /** Back to the default period and to everything in it; the unit stays. */
    clear: () => setAddress(NOTHING_NARROWED),
    /** Whether the address says anything that Clear would take back. */
    narrowed: SCOPE_PARTS.some((part) => scope[part].length > 0) || Boolean(address.from || address.to),
  };
};
