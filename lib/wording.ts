import type { AdditionReason, ApplianceCategory, DisplayUnit, JobType, LeakRateMethod, Role } from './vocabulary';

/** Words for the closed lists of the vocabulary, as they stand inside a sentence. */
export const CATEGORY_NAMES: Record<ApplianceCategory, string> = {
  comfort_cooling: 'comfort cooling',
  commercial_refrigeration: 'commercial refrigeration',
  industrial_process: 'industrial process refrigeration',
  small_appliance: 'small appliances',
  other: 'other appliances',
};

export const JOB_TYPE_NAMES: Record<JobType, string> = {
  service: 'service',
  repair: 'repair',
  conversion: 'conversion',
  disposal: 'disposal',
};

export const ROLE_NAMES: Record<Role, string> = {
  owner: 'Owner',
  operations: 'Operations manager',
  trainer: 'Trainer',
  technician: 'Technician',
  office: 'Office',
  auditor: 'Auditor',
};

/** What each role is for, for the person who hands it out. */
export const ROLE_PURPOSES: Record<Role, string> = {
  owner: 'Everything, and who may come in',
  operations: 'All figures, records and imports',
  trainer: 'Technicians, flags and trends; reads records',
  technician: 'Own records only, to read and to write',
  office: 'Records, sites, appliances, trends and imports',
  auditor: 'Reads and exports records; changes nothing',
};

export const UNIT_NAMES: Record<DisplayUnit, string> = { lb: 'pounds', kg: 'kilograms' };

/** Why refrigerant was added, as people read it. */
export const ADDITION_REASON_NAMES: Record<AdditionReason, string> = {
  leak_top_up: 'leak or service top-up',
  initial_charge: 'first charge at installation',
  retrofit: 'retrofit',
  seasonal_variance: 'seasonal variance',
  unknown: 'not known',
};

/** The two ways to compute a leak rate, as people read them. */
export const LEAK_RATE_METHOD_NAMES: Record<LeakRateMethod, string> = {
  annualizing: 'annualizing method',
  rolling_average: 'rolling average method',
};
