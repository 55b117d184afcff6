import { type Neighbours, otherVisits } from '../neighbours/neighbours';
import type { JudgedRecord } from '../record';

/** What a ticket may have meant: another mass, or another nameplate. */
export type Meaning =
  | 'as_written'
  | 'mass_tenth'
  | 'mass_tenfold'
  | 'mass_hundredth'
  | 'kg_as_lb'
  | 'lb_as_kg'
  | 'oz_as_lb'
  | 'lb_as_oz'
  | 'mass_missing'
  | 'mass_wrong'
  | 'plate_tenfold'
  | 'plate_tenth'
  | 'plate_digits'
  | 'plate_kg_as_lb'
  | 'plate_lb_as_kg'
  | 'plate_oz_as_lb'
  | 'plate_of_other_visits';

/** A meaning with the mass and charge it gives; null for a mass that the ticket doesn't tell. */
export type Hypothesis = {
  meaning: Meaning;
  prior: number;
  recoveredMassKg: number | null;
  nameplateChargeKg: number;
  /** Written figure over the meant one: rounding of what is written hides so much of what was meant. */
  factor: number;
};

const LB_PER_KG = 1 / 0.45359237;

/** Shares of records with each slip that an import takes in: common practice, about one slip in a hundred rows. */
const MASS_SLIPS: readonly { meaning: Meaning; factor: number; prior: number }[] = [
  { meaning: 'mass_tenth', factor: 0.1, prior: 0.0012 },
  { meaning: 'mass_tenfold', factor: 10, prior: 0.0004 },
  { meaning: 'mass_hundredth', factor: 0.01, prior: 0.00005 },
  { meaning: 'kg_as_lb', factor: 1 / LB_PER_KG, prior: 0.0009 },
  { meaning: 'lb_as_kg', factor: LB_PER_KG, prior: 0.0002 },
  { meaning: 'oz_as_lb', factor: 16, prior: 0.0005 },
  { meaning: 'lb_as_oz', factor: 1 / 16, prior: 0.0002 },
];

const PLATE_SLIPS: readonly { meaning: Meaning; factor: number; prior: number }[] = [
  { meaning: 'plate_tenfold', factor: 10, prior: 0.0018 },
  { meaning: 'plate_tenth', factor: 0.1, prior: 0.0003 },
  { meaning: 'plate_kg_as_lb', factor: 1 / LB_PER_KG, prior: 0.0003 },
  { meaning: 'plate_lb_as_kg', factor: LB_PER_KG, prior: 0.0003 },
  { meaning: 'plate_oz_as_lb', factor: 16, prior: 0.0002 },
];

const DIGITS_PRIOR = 0.0008;
const OTHER_VISITS_PRIOR = 0.001;
const MISSING_PRIOR = 0.0008;
const WRONG_PRIOR = 0.0004;

/** The first two digits of a figure changed over; null where that is no other figure. */
export const digitsSwapped = (value: number): number | null => {
  const text = String(value);
  const swapped = Number(text.replace(/^(\d)(\d)/, '$2$1'));
  return /^[1-9][1-9]/.test(text) && swapped !== value ? swapped : null;
};

const kgPerUnit = (record: JudgedRecord): number =>
  record.massUnit === 'kg' ? 1 : record.massUnit === 'g' ? 0.001 : 0.45359237;

/** What a written nameplate becomes with its first digits changed over, kg. */
const swappedPlateKg = (record: JudgedRecord): number | null => {
  const unit = kgPerUnit(record);
  const swapped = digitsSwapped(Number((record.nameplateChargeKg / unit).toFixed(4)));
  return swapped === null ? null : swapped * unit;
};

const median = (values: readonly number[]): number =>
  [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;

/** A record that means what it says. */
export const asWritten = ({ recoveredMassKg, nameplateChargeKg }: JudgedRecord): Hypothesis => ({
  meaning: 'as_written',
  prior: 1,
  recoveredMassKg,
  nameplateChargeKg,
  factor: 1,
});

/** All that a record may have meant, as written first. */
export const hypothesesOf = (record: JudgedRecord, neighbours: Neighbours): Hypothesis[] => {
  const { recoveredMassKg, nameplateChargeKg, massUnit } = record;
  const written = asWritten(record);
  const as = (meaning: Meaning, prior: number, change: Partial<Hypothesis>): Hypothesis => ({
    ...written,
    meaning,
    prior,
    ...change,
  });
  const isMetric = massUnit === 'kg' || massUnit === 'g';
  const other = isMetric ? 'kg_as_lb' : 'lb_as_kg';
  const list = [written];
  if (recoveredMassKg > 0)
    for (const { meaning, factor, prior } of MASS_SLIPS)
      if (meaning !== other) list.push(as(meaning, prior, { recoveredMassKg: recoveredMassKg / factor, factor }));
  if (recoveredMassKg === 0) list.push(as('mass_missing', MISSING_PRIOR, { recoveredMassKg: null }));
  else list.push(as('mass_wrong', WRONG_PRIOR, { recoveredMassKg: null }));
  for (const { meaning, factor, prior } of PLATE_SLIPS)
    list.push(as(meaning, prior, { nameplateChargeKg: nameplateChargeKg / factor }));
  const swapped = swappedPlateKg(record);
  if (swapped !== null) list.push(as('plate_digits', DIGITS_PRIOR, { nameplateChargeKg: swapped }));
  const plates = otherVisits(neighbours, record).map((visit) => visit.nameplateChargeKg);
  const usual = plates.length ? median(plates) : null;
  if (usual !== null && !list.some((known) => Math.abs(known.nameplateChargeKg / usual - 1) < 0.01))
    list.push(as('plate_of_other_visits', OTHER_VISITS_PRIOR, { nameplateChargeKg: usual }));
  return list;
};
