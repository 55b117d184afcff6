/**
 * A reclaimer's settlement in whole cents. Masses are in hundredths of a pound and rates in hundredths of a cent a pound,
 * so that every product is a whole number and only its end is rounded, halves away from zero.
 */
export type SettlementLine = {
  refrigerant: string;
  /** Hundredths of a pound on the scale, and of the empty cylinder. */
  grossCentipounds: number;
  tareCentipounds: number;
  /** Hundredths of a cent a pound; below 0 for a load that costs, as mixed ones do. */
  rate: number;
  /** Parts of 10,000 of the rate that its purity earns. */
  bandShare?: number;
};

/** One of the lines below the loads: cylinders, freight, an analysis. Below 0 what is taken off. */
export type SettlementCharge = { what: string; count: number; centsEach: number };

export type Settlement = {
  lines: { refrigerant: string; netCentipounds: number; cents: number }[];
  charges: { what: string; cents: number }[];
  totalCents: number;
};

const WHOLE_BAND = 10_000;
/** Hundredths of a pound × hundredths of a cent × parts of 10,000, in one cent. */
const PER_CENT = 100 * 100 * WHOLE_BAND;

const requireWholeNumber = (value: number, name: string): void => {
  if (!Number.isSafeInteger(value)) throw new RangeError(`${name} must be a whole number, not ${value}`);
};

const roundedQuotient = (numerator: bigint, denominator: bigint): number => {
  const half = denominator / 2n;
  return Number((numerator < 0n ? numerator - half : numerator + half) / denominator);
};

/** Gross less tare; throws a RangeError where the cylinder weighs less full than empty. */
export const netCentipounds = ({ grossCentipounds, tareCentipounds }: SettlementLine): number => {
  requireWholeNumber(grossCentipounds, 'A gross weight');
  requireWholeNumber(tareCentipounds, 'A tare weight');
  if (tareCentipounds < 0 || grossCentipounds < tareCentipounds) {
    throw new RangeError(`Gross ${grossCentipounds} is below tare ${tareCentipounds}`);
  }
  return grossCentipounds - tareCentipounds;
};

/** What a load is worth in cents: net × rate × band. Throws a RangeError on what is no whole number. */
export const lineCents = (line: SettlementLine): number => {
  const { rate, bandShare = WHOLE_BAND } = line;
  requireWholeNumber(rate, 'A rate');
  requireWholeNumber(bandShare, 'A band');
  return roundedQuotient(BigInt(netCentipounds(line)) * BigInt(rate) * BigInt(bandShare), BigInt(PER_CENT));
};

/** A whole settlement: each line rounded to the cent as a statement prints it, then added. */
export const settle = (lines: readonly SettlementLine[], charges: readonly SettlementCharge[]): Settlement => {
  const loads = lines.map((line) => ({
    refrigerant: line.refrigerant,
    netCentipounds: netCentipounds(line),
    cents: lineCents(line),
  }));
  const others = charges.map(({ what, count, centsEach }) => {
    requireWholeNumber(count, 'A count');
    requireWholeNumber(centsEach, 'A charge');
    return { what, cents: count * centsEach };
  });
  const totalCents = [...loads, ...others].reduce((sum, { cents }) => sum + cents, 0);
  return { lines: loads, charges: others, totalCents };
};

/** Pays `share` (parts of 10,000) from this purity (parts of 10,000) up. */
export type PurityBand = { fromPurity: number; share: number };

/** What a purity earns of the rate: the share of the highest band that it reaches, nothing below all. */
export const bandShareOf = (bands: readonly PurityBand[], purity: number): number =>
  bands.reduce<PurityBand>(
    (best, band) => (purity >= band.fromPurity && band.fromPurity >= best.fromPurity ? band : best),
    { fromPurity: 0, share: 0 },
  ).share;

/** The rate of a price list that a mass earns: that of the highest step that it reaches, null below all. */
export const rateOf = (
  steps: readonly { fromCentipounds: number; rate: number }[],
  centipounds: number,
): number | null =>
  steps
    .filter(({ fromCentipounds }) => centipounds >= fromCentipounds)
    .reduce<{ fromCentipounds: number; rate: number } | null>(
      (best, step) => (best === null || step.fromCentipounds > best.fromCentipounds ? step : best),
      null,
    )?.rate ?? null;
