/** Columns of the recovery file, in the order of its template. The browser reads this too. */
export const RECOVERY_FIELDS = [
  'record_ref',
  'recovered_at',
  'technician',
  'site',
  'appliance',
  'branch',
  'job_type',
  'appliance_category',
  'refrigerant',
  'nameplate_charge',
  'added_charge',
  'start_weight',
  'end_weight',
  'recovered_mass',
  'mass_unit',
  'final_vacuum',
  'vacuum_unit',
  'hold_minutes',
  'hold_rise',
  'cylinder',
  'disposition',
  'manufactured_on',
  'technician_certification',
  'notes',
] as const;
export type RecoveryField = (typeof RECOVERY_FIELDS)[number];

/** Without these a row says nothing useful; the recovered mass may come from the two weights instead. */
export const NEEDED_FIELDS = [
  'record_ref',
  'recovered_at',
  'technician',
  'site',
  'appliance',
  'refrigerant',
  'nameplate_charge',
] as const satisfies readonly RecoveryField[];

export const DATE_ORDERS = ['ymd', 'dmy', 'mdy'] as const;
export type DateOrder = (typeof DATE_ORDERS)[number];

export const DECIMAL_MARKS = ['point', 'comma'] as const;
export type DecimalMark = (typeof DECIMAL_MARKS)[number];
