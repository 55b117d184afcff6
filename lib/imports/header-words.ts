import type { RecoveryField } from './fields';

/**
 * What offices call the columns, in lower case with `number` for `#`, `no` and `num`. Only names that can mean nothing
 * else: “serial number”, “customer”, “unit” and “weight” are left to the person.
 */
export const HEADER_WORDS: Record<RecoveryField, readonly string[]> = {
  record_ref: [
    ...['record', 'record ref', 'record number', 'record id', 'record reference', 'ref', 'ref number', 'reference'],
    ...['reference number', 'ticket', 'ticket number', 'ticket id', 'ticket ref', 'recovery number', 'recovery id'],
  ],
  recovered_at: [
    ...['date', 'date time', 'datetime', 'recovered on', 'recovered date', 'recovery date'],
    ...['date recovered', 'date of recovery', 'recovery date time', 'recovered date time'],
  ],
  technician: ['technician', 'technician name', 'tech', 'tech name', 'recovered by', 'recovering technician'],
  site: [
    'site',
    'site name',
    'site code',
    'site id',
    'site number',
    'job site',
    'jobsite',
    'location',
    'location name',
  ],
  appliance: [
    ...[
      'appliance',
      'appliance id',
      'appliance number',
      'appliance tag',
      'appliance name',
      'equipment',
      'equipment id',
    ],
    ...['equipment tag', 'equipment number', 'unit id', 'unit tag', 'unit number', 'asset', 'asset id', 'asset tag'],
    'asset number',
  ],
  branch: ['branch', 'branch name', 'branch office'],
  job_type: ['job type', 'type of job', 'work type', 'type of work'],
  appliance_category: [
    ...[
      'appliance category',
      'appliance type',
      'category',
      'equipment category',
      'equipment type',
      'type of appliance',
    ],
    'type of equipment',
  ],
  refrigerant: ['refrigerant', 'refrigerant type', 'type of refrigerant', 'refrigerant name', 'gas', 'gas type'],
  nameplate_charge: ['nameplate charge', 'nameplate', 'name plate charge', 'name plate', 'factory charge'],
  added_charge: ['added charge', 'additional charge', 'line set charge', 'lineset charge', 'extra charge'],
  start_weight: [
    ...['start weight', 'starting weight', 'weight start', 'weight before', 'before weight', 'initial weight'],
    ...['cylinder start weight', 'cylinder weight before', 'cylinder weight start', 'tank start weight'],
  ],
  end_weight: [
    ...['end weight', 'ending weight', 'weight end', 'weight after', 'after weight', 'final weight'],
    ...['cylinder end weight', 'cylinder weight after', 'cylinder weight end', 'tank end weight'],
  ],
  recovered_mass: [
    ...['recovered mass', 'mass recovered', 'recovered weight', 'weight recovered', 'recovered amount'],
    ...['amount recovered', 'recovered quantity', 'quantity recovered', 'qty recovered', 'refrigerant recovered'],
    ...['total recovered', 'net recovered'],
  ],
  mass_unit: ['mass unit', 'mass units', 'weight unit', 'weight units', 'unit of mass', 'unit of weight', 'uom'],
  final_vacuum: [
    ...['final vacuum', 'vacuum', 'final vacuum level', 'vacuum level', 'ending vacuum', 'end vacuum'],
    ...['vacuum reached', 'vacuum achieved', 'evacuation level', 'final evacuation level'],
  ],
  vacuum_unit: ['vacuum unit', 'vacuum units', 'unit of vacuum', 'pressure unit', 'pressure units'],
  hold_minutes: ['hold minutes', 'hold min', 'hold mins', 'hold time min', 'hold time minutes', 'minutes held'],
  hold_rise: ['hold rise', 'pressure rise', 'vacuum rise', 'rise during hold', 'pressure rise during hold'],
  cylinder: [
    ...['cylinder', 'cylinder id', 'cylinder number', 'cylinder serial', 'cylinder serial number', 'cyl', 'cyl number'],
    ...['tank', 'tank id', 'tank number', 'tank serial', 'tank serial number', 'recovery cylinder', 'recovery tank'],
  ],
  disposition: ['disposition', 'disposition of refrigerant', 'refrigerant disposition'],
  manufactured_on: [
    ...['manufactured on', 'manufactured', 'manufacture date', 'date manufactured', 'date of manufacture'],
    ...['manufacturing date', 'mfg date', 'mfr date'],
  ],
  technician_certification: [
    ...['technician certification', 'technician certification type', 'tech certification', 'certification'],
    ...['certification type', 'cert type', 'epa certification', 'epa certification type', 'section 608 certification'],
  ],
  notes: ['notes', 'note', 'comments', 'comment', 'remarks', 'remark'],
};
