import { categoryKey } from '../kinds';
import { isOnStep, KG_PER_TICKET_UNIT } from '../readings/ticket-unit';
import type { JudgedRecord } from '../record';

/** Which charges a category has, and which a cylinder of some weight is brought for: counts of records by bin. */
export type NameplateSizes = {
  byCategory: Record<string, Record<number, number>>;
  byCylinder: Record<string, Record<number, number>>;
};

/** Eight bins a decade of charge; cylinders by their lightest weight, five a doubling. */
const chargeBin = (kg: number): number => Math.floor(8 * Math.log10(kg));
const cylinderBin = (kg: number): number => Math.floor(5 * Math.log2(Math.max(kg, 0.1)));
const BINS = 40;

const add = (counts: Record<string, Record<number, number>>, key: string, bin: number) => {
  const own = counts[key] ?? {};
  counts[key] = own;
  own[bin] = (own[bin] ?? 0) + 1;
};

const cylinderKey = (record: JudgedRecord, lightestKg: number): string =>
  `${categoryKey(record)}/${cylinderBin(lightestKg)}`;

/** Counts charges; `lightestOf` gives the least weight that the record's cylinder was ever seen with. */
export const fitNameplateSizes = (
  records: readonly JudgedRecord[],
  lightestOf: (record: JudgedRecord) => number | null,
): NameplateSizes => {
  const sizes: NameplateSizes = { byCategory: {}, byCylinder: {} };
  for (const record of records) {
    const bin = chargeBin(record.nameplateChargeKg);
    add(sizes.byCategory, categoryKey(record), bin);
    const lightest = lightestOf(record);
    if (lightest !== null) add(sizes.byCylinder, cylinderKey(record, lightest), bin);
  }
  return sizes;
};

const totals = new WeakMap<Record<number, number>, number>();
const totalOf = (counts: Record<number, number>): number => {
  const known = totals.get(counts);
  if (known !== undefined) return known;
  const total = Object.values(counts).reduce((sum, count) => sum + count, 0);
  totals.set(counts, total);
  return total;
};

/** Neighbouring bins count too: a charge is not strange because its own bin is empty. */
const smoothed = (counts: Record<number, number>, bin: number, own: number): number => {
  const at = (where: number) => Math.max(0, (counts[where] ?? 0) - (where === own ? 1 : 0));
  return 0.5 * at(bin) + 0.25 * (at(bin - 1) + at(bin + 1));
};

/** Prior records that a cylinder's own counts are drawn towards the category's by. */
const DRAWN_BY = 4;

/** Probability that a record like this has a charge in the bin of `chargeKg`; its own plate is left out of the counts. */
export const sizeProbability = (
  sizes: NameplateSizes,
  record: JudgedRecord,
  chargeKg: number,
  lightestKg: number | null,
): number => {
  const [bin, own] = [chargeBin(chargeKg), chargeBin(record.nameplateChargeKg)];
  const ofCategory = sizes.byCategory[categoryKey(record)] ?? {};
  const wide = (smoothed(ofCategory, bin, own) + 0.5 / BINS) / (Math.max(0, totalOf(ofCategory) - 1) + 0.5);
  const ofCylinder = lightestKg === null ? undefined : sizes.byCylinder[cylinderKey(record, lightestKg)];
  if (!ofCylinder) return wide;
  return (smoothed(ofCylinder, bin, own) + DRAWN_BY * wide) / (Math.max(0, totalOf(ofCylinder) - 1) + DRAWN_BY);
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
