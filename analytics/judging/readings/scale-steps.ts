import { groupBy } from '../../statistics/group-by';
import { isPlant } from '../kinds';
import type { JudgedRecord } from '../record';
import type { JudgingSettings } from '../settings';
import { isOnStep, KG_PER_TICKET_UNIT, SCALE_STEPS } from './ticket-unit';

/** Steps of the scales in use, in the unit of the ticket: by technician and size, and by size for who is new. */
export type ScaleSteps = Record<string, number>;

/** So many of a scale's readings may lie off its steps: slips and borrowed scales. */
const OFF_STEP_SHARE = 0.03;
const OFF_STEP_READINGS = 2;
const LEAST_READINGS = 15;

const sizeKey = (record: JudgedRecord, chargeKg: number, settings: JudgingSettings): string => {
  const size = isPlant(chargeKg, settings) ? 'plant' : record.category === 'small_appliance' ? 'small' : 'routine';
  return `${record.massUnit}/${size}`;
};

const stepOf = (records: readonly JudgedRecord[]): number | null => {
  const unit = records[0]?.massUnit;
  if (!unit || records.length < LEAST_READINGS) return null;
  const readings = records.map(({ recoveredMassKg }) => recoveredMassKg / KG_PER_TICKET_UNIT[unit]);
  const most = Math.max(OFF_STEP_READINGS, OFF_STEP_SHARE * readings.length);
  return SCALE_STEPS[unit].find((step) => readings.filter((r) => !isOnStep(r, step)).length <= most) ?? null;
};

/** Reads off the tickets in what steps each technician's scales weigh. */
export const fitScaleSteps = (records: readonly JudgedRecord[], settings: JudgingSettings): ScaleSteps => {
  const steps: ScaleSteps = {};
  const keep = (groups: Map<string, JudgedRecord[]>) => {
    for (const [key, group] of groups) {
      const step = stepOf(group);
      if (step !== null) steps[key] = step;
    }
  };
  keep(groupBy(records, (record) => sizeKey(record, record.fullChargeKg, settings)));
  keep(groupBy(records, (record) => `${sizeKey(record, record.fullChargeKg, settings)}/${record.technicianId}`));
  return steps;
};

/** The step in ticket units in which this record would be weighed if its unit held `chargeKg`; null where unknown. */
export const scaleStep = (
  steps: ScaleSteps,
  record: JudgedRecord,
  chargeKg: number,
  settings: JudgingSettings,
): number | null => {
  const size = sizeKey(record, chargeKg, settings);
  return steps[`${size}/${record.technicianId}`] ?? steps[size] ?? null;
};
