'use client';

import { parseAsString, parseAsStringLiteral, useQueryStates } from 'nuqs';

const PARSERS = {
  versus: parseAsString,
  gwp: parseAsStringLiteral(['ar4', 'ar6']).withDefault('ar4'),
};

/** With what the period is compared and whose GWP is used, kept in the address: `versus=2024-01..2024-12&gwp=ar6`. */
export const useComparisonAddress = () => {
  const [{ versus, gwp }, setAddress] = useQueryStates(PARSERS, { history: 'push' });
  return {
    versus,
    gwp,
    setVersus: (text: string | null) => setAddress({ versus: text }),
    setGwp: (source: 'ar4' | 'ar6') => setAddress({ gwp: source }),
  };
};
export type ComparisonAddress = ReturnType<typeof useComparisonAddress>;
