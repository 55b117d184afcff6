import type { RecoveryField } from './fields';

/** What the product calls each field in sentences and lists. The browser reads this too. */
export const FIELD_NAMES: Record<RecoveryField, string> = {
  record_ref: 'ticket number',
  recovered_at: 'date of the recovery',
  technician: 'technician',
  site: 'site',
  appliance: 'appliance',
  branch: 'branch',
  job_type: 'job type',
  appliance_category: 'appliance category',
  refrigerant: 'refrigerant',
  nameplate_charge: 'nameplate charge',
  added_charge: 'added charge',
  start_weight: 'start weight',
  end_weight: 'end weight',
  recovered_mass: 'recovered mass',
  mass_unit: 'mass unit',
  final_vacuum: 'final vacuum',
  vacuum_unit: 'vacuum unit',
  hold_minutes: 'hold minutes',
  hold_rise: 'hold rise',
  cylinder: 'cylinder',
  disposition: 'disposition',
  manufactured_on: 'date of manufacture',
  technician_certification: 'technician certification',
  notes: 'notes',
};
