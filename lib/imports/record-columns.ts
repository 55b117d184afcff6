import type { RecoveryField } from './fields';
import type { RecoveryRow } from './rows';

/** A column of `recoveries` that a row of a file states directly. Staged under the same name. */
export type RecordColumn = {
  column: string;
  type: string;
  /** The file states this column when it has any of these fields; empty: every file does. */
  fields: readonly RecoveryField[];
  /** The field under which a change of it is shown to the person, and the unit its text is in. */
  shownAs: RecoveryField;
  unit?: 'kg' | 'kPa';
  value: (row: RecoveryRow) => string | null;
};

const of = (
  column: string,
  type: string,
  fields: readonly [RecoveryField, ...RecoveryField[]],
  value: RecordColumn['value'],
  unit?: 'kg' | 'kPa',
): RecordColumn => ({ column, type, fields, shownAs: fields[0], value, ...(unit ? { unit } : {}) });

/** In the order of the file's template. Names of people and places follow below. */
export const RECORD_COLUMNS: readonly RecordColumn[] = [
  of('recovered_on', 'date', ['recovered_at'], (row) => row.recoveredOn),
  of('recovered_at', 'timestamptz', ['recovered_at'], (row) => row.recoveredAt),
  of('job_type', 'text', ['job_type'], (row) => row.jobType),
  of('category', 'text', ['appliance_category'], (row) => row.category),
  of('refrigerant', 'text', ['refrigerant'], (row) => row.refrigerant),
  of('nameplate_charge_kg', 'numeric(16,9)', ['nameplate_charge'], (row) => row.nameplateChargeKg, 'kg'),
  of('added_charge_kg', 'numeric(16,9)', ['added_charge'], (row) => row.addedChargeKg, 'kg'),
  of('start_weight_kg', 'numeric(16,9)', ['start_weight'], (row) => row.startWeightKg, 'kg'),
  of('end_weight_kg', 'numeric(16,9)', ['end_weight'], (row) => row.endWeightKg, 'kg'),
  {
    ...of('recovered_mass_kg', 'numeric(16,9)', ['recovered_mass'], (row) => row.recoveredMassKg, 'kg'),
    // From its own column or from the two weights: a row without it is refused.
    fields: [],
  },
  // From its own column or told for the whole file.
  { ...of('mass_unit', 'text', ['mass_unit'], (row) => row.massUnit), fields: [] },
  of('final_vacuum_kpa_abs', 'numeric(12,6)', ['final_vacuum'], (row) => row.finalVacuumKpaAbs, 'kPa'),
  of('vacuum_unit', 'text', ['vacuum_unit', 'final_vacuum', 'hold_rise'], (row) => row.vacuumUnit),
  of('hold_minutes', 'float8', ['hold_minutes'], (row) => row.holdMinutes),
  of('hold_rise_kpa', 'numeric(12,6)', ['hold_rise'], (row) => row.holdRiseKpa, 'kPa'),
  of('disposition', 'text', ['disposition'], (row) => row.disposition),
  of('manufactured_on', 'date', ['manufactured_on'], (row) => row.manufacturedOn),
  of('technician_certification', 'text', ['technician_certification'], (row) => row.technicianCertification),
  of('notes', 'text', ['notes'], (row) => row.notes),
];

/** A name in a row that stands for a row of another table. */
export type RecordName = {
  /** Column of the staged rows that holds the name as spelled. */
  name: 'technician' | 'site' | 'appliance' | 'branch' | 'cylinder';
  /** Column of `recoveries`. */
  column: string;
  table: 'technicians' | 'sites' | 'appliances' | 'branches' | 'cylinders';
  value: (row: RecoveryRow) => string | null;
};

/** Sites before appliances: an appliance is known by its site and its name. */
export const RECORD_NAMES: readonly RecordName[] = [
  { name: 'branch', column: 'branch_id', table: 'branches', value: (row) => row.branch },
  { name: 'technician', column: 'technician_id', table: 'technicians', value: (row) => row.technician },
  { name: 'site', column: 'site_id', table: 'sites', value: (row) => row.site },
  { name: 'appliance', column: 'appliance_id', table: 'appliances', value: (row) => row.appliance },
  { name: 'cylinder', column: 'cylinder_id', table: 'cylinders', value: (row) => row.cylinder },
];

/** The columns and names that a file with these fields states; the others are left as they are in the records. */
export const statedBy = (fields: readonly RecoveryField[]) => ({
  columns: RECORD_COLUMNS.filter((c) => c.fields.length === 0 || c.fields.some((field) => fields.includes(field))),
  names: RECORD_NAMES.filter(({ name }) => fields.includes(name)),
});
export type Stated = ReturnType<typeof statedBy>;
