import type { SortKey } from '@/analytics/records/constants';
import type { TermId } from '@/lib/glossary/terms';

/** Columns of the table of records; each is a key to sort by. */
export const COLUMN_IDS = [
  'recordRef',
  'recoveredOn',
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
] as const satisfies readonly SortKey[];
export type ColumnId = (typeof COLUMN_IDS)[number];

export const COLUMN_NAMES: Record<ColumnId, string> = {
  recordRef: 'Record',
  recoveredOn: 'Date',
  technician: 'Technician',
  site: 'Site',
  appliance: 'Appliance',
  branch: 'Branch',
  category: 'Category',
  jobType: 'Job type',
  refrigerant: 'Refrigerant',
  recoveredMass: 'Recovered',
  fullCharge: 'Full charge',
  yield: 'Yield',
  cylinder: 'Cylinder',
};

/** Headings whose word is explained in the glossary. */
export const COLUMN_TERMS: Partial<Record<ColumnId, TermId>> = {
  category: 'appliance-category',
  jobType: 'job-type',
  recoveredMass: 'recovered-mass',
  fullCharge: 'full-charge',
  yield: 'yield',
};

/** What stands in the table before anybody chooses. The ref leads to the record and always stands. */
export const USUAL_COLUMNS: readonly ColumnId[] = [
  'recordRef',
  'recoveredOn',
  'technician',
  'site',
  'appliance',
  'refrigerant',
  'recoveredMass',
  'fullCharge',
  'yield',
];
