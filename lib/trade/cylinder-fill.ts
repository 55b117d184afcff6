import { LIQUID_PROPERTIES } from './liquid-properties';

/** Share of a cylinder's volume that liquid at 77 °F may take: AHRI Guideline K. */
const FILLED_SHARE = 0.8;
/** Density of water at 77 °F, to which specific gravity refers. */
const WATER_AT_77F_KG_PER_M3 = 997.05;
/** Pounds of water capacity as a volume: 1 lb is 27.737 in³, 49 CFR 173.304a(a)(2), Note 1. */
const WATER_CAPACITY_KG_PER_M3 = 997.94;
/** Pressure at 131 °F may be at most this many times the marked service pressure: 49 CFR 173.301(a)(8). */
const MOST_OVER_SERVICE = 5 / 4;
const ATMOSPHERE_PSI = 14.696;

/** Whichever of its limits decides how much a cylinder may hold. */
export type FillRule = 'eighty per cent at 77 °F' | 'liquid full at 131 °F';

export type FillLimit = {
  /** Most net mass by AHRI Guideline K, and the mass at which liquid fills the cylinder at 131 °F; unit of the inputs. */
  eightyPercent: number;
  /** Null where the density at 131 °F is not known: then the first stands alone and a reader must be told. */
  liquidFull: number | null;
  /** The lesser of both, and which it is. */
  net: number;
  rule: FillRule;
  /** Tare and net: what the scale may show. */
  gross: number;
};

const requireMass = (mass: number, name: string): void => {
  if (!(Number.isFinite(mass) && mass > 0)) throw new RangeError(`${name} must be above 0, not ${mass}`);
};

/** Specific gravity of saturated liquid at 77 °F, or null for a refrigerant without liquid or without figures. */
export const specificGravityAt77F = (refrigerant: string): number | null => {
  const density = LIQUID_PROPERTIES[refrigerant]?.[0];
  return density === undefined ? null : density / WATER_AT_77F_KG_PER_M3;
};

/**
 * 0.8 × water capacity × specific gravity at 77 °F, in the unit of the water capacity: AHRI Guideline K. Without a
 * specific gravity its early form, 0.8 × water capacity, which is too much for a liquid lighter than water.
 */
export const eightyPercentLimit = (waterCapacity: number, specificGravity = 1): number => {
  requireMass(waterCapacity, 'A water capacity');
  requireMass(specificGravity, 'A specific gravity');
  return FILLED_SHARE * waterCapacity * specificGravity;
};

/** The mass of liquid that fills the whole cylinder at 131 °F: 49 CFR 173.304(b) wants less. */
export const liquidFullMass = (waterCapacity: number, kgPerM3At131F: number): number => {
  requireMass(waterCapacity, 'A water capacity');
  return (waterCapacity * kgPerM3At131F) / WATER_CAPACITY_KG_PER_M3;
};

/**
 * The most that a refillable recovery cylinder may hold of a refrigerant: the lesser of the 80 % rule and what would be
 * liquid full at 131 °F. Null for a refrigerant without figures: then only the cylinder's label and the maker's table can
 * tell. Throws a RangeError on a capacity or tare that is not above 0. A limit is no promise: the label wins.
 */
export const fillLimit = (refrigerant: string, waterCapacity: number, tare: number): FillLimit | null => {
  requireMass(tare, 'A tare');
  const specificGravity = specificGravityAt77F(refrigerant);
  if (specificGravity === null) return null;
  const eightyPercent = eightyPercentLimit(waterCapacity, specificGravity);
  const densityAt131F = LIQUID_PROPERTIES[refrigerant]?.[1] ?? null;
  const liquidFull = densityAt131F === null ? null : liquidFullMass(waterCapacity, densityAt131F);
  const isFullFirst = liquidFull !== null && liquidFull < eightyPercent;
  const net = isFullFirst ? liquidFull : eightyPercent;
  return {
    eightyPercent,
    liquidFull,
    net,
    rule: isFullFirst ? 'liquid full at 131 °F' : 'eighty per cent at 77 °F',
    gross: tare + net,
  };
};

/** The least service pressure in psig that a cylinder must be marked with for a refrigerant; null without figures. */
export const leastServicePressurePsig = (refrigerant: string): number | null => {
  const psia = LIQUID_PROPERTIES[refrigerant]?.[2] ?? null;
  return psia === null ? null : (psia - ATMOSPHERE_PSI) / MOST_OVER_SERVICE;
};
