import { groupBy } from '../../statistics/group-by';
import { categoryKey } from '../kinds';
import { isOnStep, KG_PER_TICKET_UNIT } from '../readings/ticket-unit';
import type { JudgedRecord } from '../record';

/** Which charges the appliances of a category have: counts of records by bin. */
export type NameplateSizes = Record<string, { records: number; bins: Record<number, number> }>;

/** Eight bins a decade of charge. */
const chargeBin = (kg: number): number => Math.floor(8 * Math.log10(kg));
const BINS = 40;

/** Counts the charges written on nameplates. */
export const fitNameplateSizes = (records: readonly JudgedRecord[]): NameplateSizes => {
  const sizes: NameplateSizes = {};
  for (const [category, group] of groupBy(records, categoryKey)) {
    const bins: Record<number, number> = {};
    for (const { nameplateChargeKg } of group) {
      const bin = chargeBin(nameplateChargeKg);
      bins[bin] = (bins[bin] ?? 0) + 1;
    }
    sizes[category] = { records: group.length, bins };
  }
  return sizes;
};

/**
 * Probability that a record of this category has a charge in the bin of `chargeKg`. Its own plate is left out of the
 * counts, and neighbouring bins count too: a charge is not strange because its own bin is empty.
 */
export const sizeProbability = (sizes: NameplateSizes, record: JudgedRecord, chargeKg: number): number => {
  const { records, bins } = sizes[categoryKey(record)] ?? { records: 0, bins: {} };
  const own = chargeBin(record.nameplateChargeKg);
  const at = (bin: number) => Math.max(0, (bins[bin] ?? 0) - (bin === own ? 1 : 0));
  const bin = chargeBin(chargeKg);
  const counted = 0.5 * at(bin) + 0.25 * (at(bin - 1) + at(bin + 1));
  return (counted + 0.5 / BINS) / (Math.max(0, records - 1) + 0.5);
};

/** A plate between the steps in which plates of its size are written. */
const OFF_STEP = 0.03;
/** Charges converted to ticket units and divided are right to this share. */
const HAIR = 1e-4;

/**
 * Share of the charge that one step of a plate of this size makes, in the steps plates are written in (hundredths below
 * 2, tenths below 100, whole units above: common practice); hardly anything for a charge between the steps.
 */
export const plateStepShare = (record: JudgedRecord, chargeKg: number): number => {
  const charge = chargeKg / KG_PER_TICKET_UNIT[record.massUnit];
  const step = charge < 2 ? 0.01 : charge < 100 ? 0.1 : 1;
  return (isOnStep(charge, step, HAIR * charge) ? step : step * OFF_STEP) / charge;
};
