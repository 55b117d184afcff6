/** What the table of records can be sorted by, shared with the browser. The first is the default, newest first. */
export const SORT_KEYS = [
  'recoveredOn',
  'recordRef',
  'technician',
  'site',
  'appliance',
  'branch',
  'category',
  'jobType',
  'refrigerant',
  'recoveredMass',
  'fullCharge',
  'yield',
  'cylinder',
] as const;
export type SortKey = (typeof SORT_KEYS)[number];

/** A sort as the address writes it: `-` before the key turns the order round. */
export type Sort = SortKey | `-${SortKey}`;
export const DEFAULT_SORT: Sort = '-recoveredOn';

export const SORTS = SORT_KEYS.flatMap((key): Sort[] => [key, `-${key}`]);

/** A sort taken apart. */
export const readSort = (sort: Sort): { key: SortKey; descending: boolean } => {
  const key = SORT_KEYS.find((one) => sort === one || sort === `-${one}`);
  if (!key) throw new RangeError(`There is no sort ${sort}.`);
  return { key, descending: sort.startsWith('-') };
};

/** Whether a list holds only the records that count in figures, or only the entry errors left out of them. */
export const EXCLUSIONS = ['none', 'entry_error'] as const;
export type Exclusion = (typeof EXCLUSIONS)[number];

export const PAGE_SIZES = [50, 100] as const;
export type PageSize = (typeof PAGE_SIZES)[number];
export const MOST_ROWS_A_PAGE = 500;
