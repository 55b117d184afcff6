/** Closed word lists of the trade and of the product, shared by tables, contracts and forms. No imports: the browser reads this too. */

export const APPLIANCE_CATEGORIES = [
  'comfort_cooling',
  'commercial_refrigeration',
  'industrial_process',
  'small_appliance',
  'other',
] as const;
export type ApplianceCategory = (typeof APPLIANCE_CATEGORIES)[number];

export const JOB_TYPES = ['service', 'repair', 'conversion', 'disposal'] as const;
export type JobType = (typeof JOB_TYPES)[number];

export const MASS_UNITS = ['lb', 'oz', 'lb-oz', 'kg', 'g'] as const;
export type MassUnit = (typeof MASS_UNITS)[number];

export const VACUUM_UNITS = ['inhg', 'psig', 'mmhg_abs', 'kpa_abs', 'micron'] as const;
export type VacuumUnit = (typeof VACUUM_UNITS)[number];

export const DISPOSITIONS = ['in_cylinder', 'returned_to_system', 'to_reclaimer', 'destroyed'] as const;
export type Disposition = (typeof DISPOSITIONS)[number];

export const CERTIFICATION_TYPES = ['I', 'II', 'III', 'universal'] as const;
export type CertificationType = (typeof CERTIFICATION_TYPES)[number];

export const ROLES = ['owner', 'operations', 'trainer', 'technician', 'office', 'auditor'] as const;
export type Role = (typeof ROLES)[number];

export const IMPORT_STATUSES = ['queued', 'running', 'done', 'failed', 'undone'] as const;
export type ImportStatus = (typeof IMPORT_STATUSES)[number];

export const IMPORT_OUTCOMES = ['added', 'updated', 'unchanged', 'rejected'] as const;
export type ImportOutcome = (typeof IMPORT_OUTCOMES)[number];

export const FLAG_RULES = [
  'stopped_early',
  'short_on_arrival',
  'low_unexplained',
  'unit_slip',
  'weights_disagree',
  'cylinder_chain',
  'over_full_charge',
  'nameplate_doubtful',
  'duplicate',
  'level_not_reached',
  'hold_missing',
  'cylinder_overfilled',
  'wrong_cylinder',
  'date_doubtful',
] as const;
export type FlagRule = (typeof FLAG_RULES)[number];

export const FLAG_DECISIONS = [
  'leaked_before',
  'known_low_charge',
  'incomplete_recovery',
  'wrong_nameplate',
  'entry_error',
  'confirmed_correct',
] as const;
export type FlagDecision = (typeof FLAG_DECISIONS)[number];

/** Units in which a person may read masses; the API speaks kilograms whatever is chosen. */
export const DISPLAY_UNITS = ['lb', 'kg'] as const;
export type DisplayUnit = (typeof DISPLAY_UNITS)[number];

/** Why refrigerant was put into an appliance. Only the first and the last count as leaked (40 CFR 82.157). */
export const ADDITION_REASONS = ['leak_top_up', 'initial_charge', 'retrofit', 'seasonal_variance', 'unknown'] as const;
export type AdditionReason = (typeof ADDITION_REASONS)[number];

/** The two ways of 40 CFR 82.152 to compute a leak rate; a facility keeps to one. */
export const LEAK_RATE_METHODS = ['annualizing', 'rolling_average'] as const;
export type LeakRateMethod = (typeof LEAK_RATE_METHODS)[number];
