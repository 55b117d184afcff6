import type { RecoveryField } from '@/lib/imports/fields';
import type { Disposition, JobType } from '@/lib/vocabulary';
import type { Appliance } from './appliances';
import type { Cylinder } from './cylinders';
import type { Pull } from './pull';
import type { Random } from './random';
import { plateText, scaleFor } from './scales';
import type { Technician } from './technicians';

/** A row of the recovery file: the fields as they are written. */
export type Ticket = Partial<Record<RecoveryField, string>> & { record_ref: string };

/** What the ticket is about. */
export type Job = {
  recordRef: string;
  day: string;
  /** Local time of day, `HH:MM`. */
  time: string;
  type: JobType;
  unit: Appliance;
  technician: Technician;
  cylinder: Cylinder;
  disposition: Disposition;
  /** What the scale shows of a true pound; below 1 it reads low. */
  scaleFactor: number;
};

const REMARKS = {
  short: [
    'low on charge when we came',
    'oil at the flare nut',
    'customer says it was topped up last year',
    'found no charge to speak of',
  ],
  plain: [
    'no access to roof until noon',
    'replaced contactor as well',
    'two hoses, low-loss fittings',
    'filter full, changed',
  ],
};

/** Writes the ticket as the technician would, scale steps and gaps included. */
export const writeTicket = (job: Job, pull: Pull, random: Random): Ticket => {
  const { unit, technician, cylinder } = job;
  const scale = scaleFor(technician, unit, cylinder);
  const reading = (lb: number) => Math.max(0, Math.round((lb * job.scaleFactor) / scale.stepLb));
  const start = reading(cylinder.tareLb + cylinder.contentLb);
  const net = reading(pull.recoveredLb);
  const both = random.between(0, 1);
  const says = (share: number, text: string) => (random.chance(share) ? text : '');
  return {
    record_ref: job.recordRef,
    recovered_at: random.chance(0.93) ? `${job.day}T${job.time}` : job.day,
    technician: technician.name,
    site: unit.site.name,
    appliance: unit.name,
    branch: unit.site.branch,
    job_type: job.type,
    appliance_category: unit.equipment.category,
    refrigerant: unit.refrigerant,
    nameplate_charge: plateText(unit.nameplateOz, scale.unit),
    added_charge: unit.addedOz ? plateText(unit.addedOz, scale.unit) : '',
    // Some write down only what came out, some only the two weights.
    start_weight: both < 0.9 ? scale.write(start) : '',
    end_weight: both < 0.9 ? scale.write(start + net) : '',
    recovered_mass: both < 0.82 || both >= 0.9 ? scale.write(net) : '',
    mass_unit: scale.unit,
    ...pressures(pull, technician, random),
    cylinder: cylinder.serial,
    disposition: job.disposition,
    manufactured_on: says(0.92, unit.manufacturedOn),
    technician_certification: says(0.95, technician.certification),
    notes: pull.shortOnArrival ? says(0.3, random.pick(REMARKS.short)) : says(0.04, random.pick(REMARKS.plain)),
  };
};

const pressures = (pull: Pull, technician: Technician, random: Random): Partial<Ticket> => {
  if (random.chance(0.03)) return { final_vacuum: '', vacuum_unit: '', hold_minutes: '', hold_rise: '' };
  const metric = technician.unit === 'kg' && pull.vacuumUnit === 'inhg';
  // 1 inHg = 3.386389 kPa, standard atmosphere 101.325 kPa (NIST SP 811, appendix B.8).
  const shown = metric ? 101.325 - 3.386389 * pull.finalVacuum : pull.finalVacuum;
  const held = !random.chance(pull.stoppedEarly ? 0.25 : 0.05);
  return {
    final_vacuum: shown.toFixed(1),
    vacuum_unit: metric ? 'kpa_abs' : pull.vacuumUnit,
    hold_minutes: held ? String(pull.holdMinutes) : '',
    hold_rise: held && pull.holdMinutes > 0 ? ((metric ? 3.386389 : 1) * pull.holdRise).toFixed(1) : '',
  };
};
