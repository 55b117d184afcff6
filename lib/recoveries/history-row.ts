import { z } from 'zod';
import { MASS_UNITS, VACUUM_UNITS } from '@/lib/vocabulary';
import type { RecordTexts } from './fields';
import { whenText } from './local-time';
import { storedTexts } from './stored-texts';
import { massText } from './unit-text';

const blankAsNull = <Value>(value: Value | null | undefined): Value | null => value ?? null;
const text = z.string().nullish().transform(blankAsNull);
const decimal = z.union([z.number(), z.string()]).transform(String);
const decimalOrNull = decimal.nullish().transform(blankAsNull);

/** A recovery as the history keeps it: as PostgreSQL writes the row, NULLs left out. */
export const historyRowSchema = z.object({
  record_ref: z.string(),
  recovered_on: z.string(),
  recovered_at: text,
  technician_id: z.string(),
  site_id: z.string(),
  appliance_id: z.string(),
  branch_id: text,
  cylinder_id: text,
  job_type: text,
  category: text,
  refrigerant: z.string(),
  nameplate_charge_kg: decimal,
  added_charge_kg: decimal,
  start_weight_kg: decimalOrNull,
  end_weight_kg: decimalOrNull,
  recovered_mass_kg: decimal,
  mass_unit: z.enum(MASS_UNITS),
  final_vacuum_kpa_abs: decimalOrNull,
  vacuum_unit: z.enum(VACUUM_UNITS).nullish().transform(blankAsNull),
  hold_minutes: z.number().nullish().transform(blankAsNull),
  hold_rise_kpa: decimalOrNull,
  disposition: text,
  manufactured_on: text,
  technician_certification: text,
  notes: text,
  exclusion: text,
  entered: z.record(z.string(), z.string()).default({}),
});
export type HistoryRow = z.output<typeof historyRowSchema>;

/** The name that an id stands for; null for null. */
export type NameOf = (id: string | null) => string | null;

/** A row of the history as texts by field, in the units of that time. */
export const historyTexts = (row: HistoryRow, nameOf: NameOf, timeZone: string): RecordTexts => ({
  ...storedTexts({
    recordRef: row.record_ref,
    recoveredWhen: whenText(
      { recoveredOn: row.recovered_on, recoveredAt: row.recovered_at && new Date(row.recovered_at).toISOString() },
      timeZone,
    ),
    technician: nameOf(row.technician_id) ?? '',
    site: nameOf(row.site_id) ?? '',
    appliance: nameOf(row.appliance_id) ?? '',
    branch: nameOf(row.branch_id),
    cylinder: nameOf(row.cylinder_id),
    jobType: row.job_type,
    category: row.category,
    refrigerant: row.refrigerant,
    nameplateChargeKg: row.nameplate_charge_kg,
    addedChargeKg: row.added_charge_kg,
    startWeightKg: row.start_weight_kg,
    endWeightKg: row.end_weight_kg,
    recoveredMassKg: row.recovered_mass_kg,
    massUnit: row.mass_unit,
    finalVacuumKpaAbs: row.final_vacuum_kpa_abs,
    vacuumUnit: row.vacuum_unit,
    holdMinutes: row.hold_minutes,
    holdRiseKpa: row.hold_rise_kpa,
    disposition: row.disposition,
    manufacturedOn: row.manufactured_on,
    technicianCertification: row.technician_certification,
    notes: row.notes,
    entered: row.entered,
  }),
  // Also where nobody typed it: a corrected weight changes it all the same.
  recoveredMass: massText(row.recovered_mass_kg, row.mass_unit),
});
