import Papa from 'papaparse';
import type { Mapping } from '@/lib/imports/contract';
import { RECOVERY_FIELDS, type RecoveryField } from '@/lib/imports/fields';
import type { Ticket } from './ticket';

/** The company's own layout: its headers in its own order, over what the product calls the fields. */
const LAYOUT: Record<RecoveryField, string> = {
  record_ref: 'Ticket',
  recovered_at: 'When',
  branch: 'Shop',
  technician: 'Done by',
  site: 'Customer place',
  appliance: 'Unit tag',
  appliance_category: 'Kind of unit',
  manufactured_on: 'Unit made',
  job_type: 'Work order type',
  refrigerant: 'Gas',
  nameplate_charge: 'Plate',
  added_charge: 'Line set extra',
  cylinder: 'Bottle',
  start_weight: 'Scale before',
  end_weight: 'Scale after',
  recovered_mass: 'Net out',
  mass_unit: 'Weighed in',
  final_vacuum: 'Pulled to',
  vacuum_unit: 'Gauge',
  hold_minutes: 'Wait (min)',
  hold_rise: 'Came back',
  disposition: 'Where it went',
  technician_certification: '608 card',
  notes: 'Remarks',
};
/** A column that the product has no field for; it is kept with the record. */
const VAN = 'Van';

const FIELDS = Object.keys(LAYOUT) as RecoveryField[];

/** What a person would tell about the columns of this file. */
export const recoveryFileMapping: Mapping = {
  columns: Object.fromEntries(RECOVERY_FIELDS.map((field) => [field, LAYOUT[field]])),
};

/** The tickets as the CSV file that the company's old spreadsheet would export. */
export const recoveryFile = (tickets: readonly Ticket[]): string => {
  const vans = new Map([...new Set(tickets.map(({ technician = '' }) => technician))].map((name, i) => [name, i + 1]));
  return Papa.unparse({
    fields: [...FIELDS.map((field) => LAYOUT[field]), VAN],
    data: tickets.map((ticket) => [
      ...FIELDS.map((field) => ticket[field] ?? ''),
      `Van ${vans.get(ticket.technician ?? '')}`,
    ]),
  });
};
