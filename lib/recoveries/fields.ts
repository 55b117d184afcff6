import type { RecoveryField } from '@/lib/imports/fields';

/** The fields of a record in the API and the form, each with its column in the recovery file. The browser reads this too. */
export const FILE_COLUMNS = {
  recordRef: 'record_ref',
  recoveredAt: 'recovered_at',
  technician: 'technician',
  site: 'site',
  appliance: 'appliance',
  branch: 'branch',
  jobType: 'job_type',
  category: 'appliance_category',
  refrigerant: 'refrigerant',
  nameplateCharge: 'nameplate_charge',
  addedCharge: 'added_charge',
  startWeight: 'start_weight',
  endWeight: 'end_weight',
  recoveredMass: 'recovered_mass',
  massUnit: 'mass_unit',
  finalVacuum: 'final_vacuum',
  vacuumUnit: 'vacuum_unit',
  holdMinutes: 'hold_minutes',
  holdRise: 'hold_rise',
  cylinder: 'cylinder',
  disposition: 'disposition',
  manufacturedOn: 'manufactured_on',
  technicianCertification: 'technician_certification',
  notes: 'notes',
} as const satisfies Record<string, RecoveryField>;
export type RecordField = keyof typeof FILE_COLUMNS;

export const RECORD_FIELDS = Object.keys(FILE_COLUMNS) as RecordField[];

/** Fields whose text is a mass in the record's unit. */
export const MASS_FIELDS = [
  'nameplateCharge',
  'addedCharge',
  'startWeight',
  'endWeight',
  'recoveredMass',
] as const satisfies readonly RecordField[];

/** What the fields are called where a person reads them. */
export const FIELD_LABELS: Record<RecordField, string> = {
  recordRef: 'Record ref',
  recoveredAt: 'Recovered',
  technician: 'Technician',
  site: 'Site',
  appliance: 'Appliance',
  branch: 'Branch',
  jobType: 'Job type',
  category: 'Appliance category',
  refrigerant: 'Refrigerant',
  nameplateCharge: 'Nameplate charge',
  addedCharge: 'Added charge',
  startWeight: 'Start weight',
  endWeight: 'End weight',
  recoveredMass: 'Recovered mass',
  massUnit: 'Unit of mass',
  finalVacuum: 'Final vacuum',
  vacuumUnit: 'Unit of vacuum',
  holdMinutes: 'Hold, minutes',
  holdRise: 'Rise during hold',
  cylinder: 'Cylinder',
  disposition: 'Disposition',
  manufacturedOn: 'Appliance made on',
  technicianCertification: 'Technician certification',
  notes: 'Notes',
};

/** A record as texts by field, as somebody types it; '' is what is not stated. */
export type RecordTexts = Record<RecordField, string>;

/** Texts of a record of which nothing but `stated` is stated yet. */
export const emptyTexts = (stated: Partial<RecordTexts> = {}): RecordTexts => {
  // Every field of the list is filled in right here.
  const blank = Object.fromEntries(RECORD_FIELDS.map((field) => [field, ''])) as RecordTexts;
  return { ...blank, ...stated };
};
