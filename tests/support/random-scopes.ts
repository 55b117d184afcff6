import fc from 'fast-check';
import { SCOPE_PARTS, type ScopePart } from '@/analytics/dimensions';
import type { FigureScope } from '@/analytics/figures/figure';
import { RANDOM_NAMES } from './random-records';

// Also names that no record has.
const some = (names: readonly (string | null)[], unknown: string[]) =>
  fc.oneof(
    { weight: 3, arbitrary: fc.constant<string[]>([]) },
    {
      weight: 2,
      arbitrary: fc.uniqueArray(fc.constantFrom(...names.map((name) => name ?? 'unstated'), ...unknown), {
        minLength: 1,
        maxLength: 3,
      }),
    },
  );

const months = ['2025-10', '2025-12', '2026-02', '2026-05', '2026-09', '2026-11', '2027-02'];
const days = ['2025-10-14', '2026-01-31', '2026-02-01', '2026-06-15', '2026-10-01', '2026-11-29'];
const moment = fc.option(fc.constantFrom(...months, ...days));

const startOf = (text: string) => text.padEnd(10, '-01');
const endOf = (text: string) => text.padEnd(10, '-31');

/** Scopes over the random records: open, whole months, cut months, single days, unstated and unknown names, and none. */
export const randomScopes: fc.Arbitrary<FigureScope> = fc
  .record({
    from: moment,
    to: moment,
    refrigerant: some(RANDOM_NAMES.refrigerant, ['R-999']),
    technician: some(RANDOM_NAMES.technician, ['Nobody']),
    site: some(RANDOM_NAMES.site, ["'; drop table sites; --"]),
    branch: some(RANDOM_NAMES.branch, ['Nowhere']),
    category: some(RANDOM_NAMES.category, ['other']),
    jobType: some(RANDOM_NAMES.jobType, []),
    appliance: some(['RTU-1', 'RTU-2'], ['RTU-9']),
    except: fc.oneof(
      { weight: 3, arbitrary: fc.constant<ScopePart[]>([]) },
      { weight: 1, arbitrary: fc.subarray([...SCOPE_PARTS]) },
    ),
  })
  .filter(({ from, to }) => from === null || to === null || startOf(from) <= endOf(to));
