import type { LikeJobsStanding } from '@/analytics/figures/measures';
import type { SortKey } from '@/analytics/records/constants';
import type { RecordFilters } from '@/analytics/records/hook';
import { formatDesignation } from '@/lib/format';
import type { Disposition, VacuumUnit } from '@/lib/vocabulary';
import { CATEGORY_NAMES, JOB_TYPE_NAMES } from '@/lib/wording';

export const DISPOSITION_NAMES: Record<Disposition, string> = {
  in_cylinder: 'in the cylinder',
  returned_to_system: 'returned to the system',
  to_reclaimer: 'sent to the reclaimer',
  destroyed: 'sent for destruction',
};

export const VACUUM_UNIT_NAMES: Record<VacuumUnit, string> = {
  inhg: 'inHg vacuum',
  psig: 'psig',
  mmhg_abs: 'mm Hg absolute',
  kpa_abs: 'kPa absolute',
  micron: 'microns',
};

/** Units of a difference of pressure: a rise has no zero to count from. */
export const RISE_UNIT_NAMES: Record<VacuumUnit, string> = {
  inhg: 'inHg',
  psig: 'psi',
  mmhg_abs: 'mm Hg',
  kpa_abs: 'kPa',
  micron: 'microns',
};

/** How the order of the table is said: `newest first`. */
export const ORDER_WORDS: Record<SortKey, readonly [ascending: string, descending: string]> = {
  recoveredOn: ['oldest first', 'newest first'],
  recordRef: ['by record ref', 'by record ref from the end'],
  technician: ['by technician', 'by technician from the end'],
  site: ['by site', 'by site from the end'],
  appliance: ['by appliance', 'by appliance from the end'],
  branch: ['by branch', 'by branch from the end'],
  category: ['by category', 'by category from the end'],
  jobType: ['by job type', 'by job type from the end'],
  refrigerant: ['by refrigerant', 'by refrigerant from the end'],
  recoveredMass: ['least recovered first', 'most recovered first'],
  fullCharge: ['smallest charge first', 'largest charge first'],
  yield: ['lowest yield first', 'highest yield first'],
  cylinder: ['by cylinder', 'by cylinder from the end'],
};

const CLOSED_LISTS: Record<string, Record<string, string>> = {
  category: CATEGORY_NAMES,
  jobType: JOB_TYPE_NAMES,
  disposition: DISPOSITION_NAMES,
  vacuumUnit: VACUUM_UNIT_NAMES,
};

/** One value of a field as it is read: words for codes, designations that do not break. */
export const fieldValue = (field: string, value: string): string => {
  if (field === 'refrigerant') return formatDesignation(value);
  if (field === 'exclusion') return 'left out of the figures as an entry error';
  return CLOSED_LISTS[field]?.[value] ?? value;
};

const STANDING_PHRASES: Record<LikeJobsStanding, string> = {
  below: 'far below their like jobs',
};

/** What narrows a list besides scope and search, to stand behind "records"; empty when nothing does. */
export const onlyPhrase = ({
  importId,
  exclusion,
  flagged,
  likeJobs,
  states,
  lacks,
  plant,
}: Pick<RecordFilters, 'importId' | 'exclusion' | 'flagged' | 'likeJobs' | 'states' | 'lacks' | 'plant'>): string =>
  [
    importId ? 'that one import added or changed last' : '',
    flagged ? 'that need a look' : '',
    likeJobs ? STANDING_PHRASES[likeJobs] : '',
    states === 'hold' ? 'that state a hold' : '',
    states === 'vacuum' ? 'that state a final vacuum' : '',
    lacks === 'hold' ? 'that state no hold' : '',
    lacks === 'vacuum' ? 'that state no final vacuum' : '',
    plant === 'routine' ? 'of routine jobs' : '',
    plant === 'large' ? 'of large plant' : '',
    exclusion === 'none' ? 'that count in figures' : '',
    exclusion === 'entry_error' ? 'left out of figures as entry errors' : '',
  ]
    .filter(Boolean)
    .join(' and ');
