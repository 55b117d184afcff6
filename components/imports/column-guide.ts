import { NEEDED_FIELDS, RECOVERY_FIELDS, type RecoveryField } from '@/lib/imports/fields';

/** What each column of the recovery file holds, for the person who makes one. */
export const COLUMN_GUIDE: Record<RecoveryField, string> = {
  record_ref: 'Your ticket number. The same number again means the same record.',
  recovered_at: 'Date, or date and time. 2026-03-31 is always clear; other orders are recognized or asked.',
  technician: 'Name or code. New names are shown before they are made.',
  site: 'Name or code of the place.',
  appliance: 'Tag or code of the unit at that site.',
  branch: 'Branch the job belongs to.',
  job_type: 'service, repair, conversion or disposal.',
  appliance_category: 'comfort_cooling, commercial_refrigeration, industrial_process, small_appliance or other.',
  refrigerant: 'R-410A, R410A and 410a are the same.',
  nameplate_charge: 'Full charge by the nameplate.',
  added_charge: 'Charge added to it for long line sets.',
  start_weight: 'Cylinder on the scale before.',
  end_weight: 'Cylinder on the scale after.',
  recovered_mass: 'Needed unless both weights are there. When all three are, they must agree.',
  mass_unit: 'lb, oz, lb-oz (written 1-5.5), kg or g.',
  final_vacuum: 'Vacuum at the end of the pull.',
  vacuum_unit: 'inhg (gauge vacuum), psig, mmhg_abs, kpa_abs or micron.',
  hold_minutes: 'Wait after the pull-down, in minutes.',
  hold_rise: 'Pressure regained during the wait, in the unit of the vacuum.',
  cylinder: 'Serial number of the recovery cylinder.',
  disposition: 'in_cylinder, returned_to_system, to_reclaimer or destroyed.',
  manufactured_on: 'Date of the appliance’s manufacture.',
  technician_certification: 'I, II, III or universal.',
  notes: 'Any text.',
};

const NEEDED: ReadonlySet<RecoveryField> = new Set([...NEEDED_FIELDS, 'mass_unit']);

/** Whether a file is asked for this column. */
export const isNeeded = (field: RecoveryField): boolean => NEEDED.has(field);

const EXAMPLE: Partial<Record<RecoveryField, string>> = {
  record_ref: 'T-000001',
  recovered_at: '2026-03-31T11:06:00',
  technician: 'Morgan Gomez',
  site: 'Harbor Street 12',
  appliance: 'RTU-3',
  job_type: 'repair',
  appliance_category: 'comfort_cooling',
  refrigerant: 'R-410A',
  nameplate_charge: '8.2',
  start_weight: '17.5',
  end_weight: '24.9',
  recovered_mass: '7.4',
  mass_unit: 'lb',
  final_vacuum: '10',
  vacuum_unit: 'inhg',
  cylinder: 'C-0005',
  disposition: 'in_cylinder',
};

/** Address of a CSV file with all columns and one row that shows how they are filled. */
export const templateAddress = (): string => {
  const rows = [RECOVERY_FIELDS, RECOVERY_FIELDS.map((field) => EXAMPLE[field] ?? '')];
  return `data:text/csv;charset=utf-8,${encodeURIComponent(rows.map((cells) => `${cells.join(',')}\r\n`).join(''))}`;
};
