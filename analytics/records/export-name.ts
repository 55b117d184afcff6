import type { Scope } from '@/analytics/scope';

const LONGEST = 120;

const plain = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/[^\w.-]+/g, '-')
    .replace(/^-+|-+$/g, '');

/** Name of an export that tells its scope and the day it was made: `recoveries_2026-01_to_2026-03_R-22_on_2026-12-01.csv`. */
export const exportName = (scope: Scope, today: string): string => {
  const { from, to, ...dimensions } = scope;
  const dates = [from && `from_${from}`, to && `to_${to}`].filter(Boolean);
  const { branch, refrigerant, technician, site, category, jobType } = dimensions;
  const narrowed = [branch, refrigerant, technician, site, category, jobType]
    .flat()
    .filter((name) => name !== undefined);
  const stem = ['recoveries', ...dates, ...narrowed.map(plain)].filter(Boolean).join('_').slice(0, LONGEST);
  return `${stem}_on_${today}.csv`;
};
