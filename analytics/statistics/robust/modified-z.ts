import { requireFiniteNumber } from '../checked';
import { type Estimate, enough } from '../estimate';
import { deviations } from './deviations';

/** Beyond this a modified z is worth a look (Iglewicz & Hoaglin 1993). */
export const MODIFIED_Z_LIMIT = 3.5;

const MAD_FACTOR = 0.6745;
const MEAN_DEVIATION_FACTOR = 1.253314;

/** What a value is measured against: a centre, and the distance below and above it that scores 1. */
export type RobustScale = {
  basis: 'median deviation' | 'mean deviation' | 'all equal';
  centre: number;
  /** Null on a side of which over half is tied with the centre: nothing can be said there. */
  unitBelow: number | null;
  unitAbove: number | null;
};

/**
 * Scale of the modified z: median and MAD/0.6745; where over half of the values are tied, 1.253314 times the mean
 * deviation. Needs two values. Iglewicz & Hoaglin, How to Detect and Handle Outliers (ASQC 1993).
 */
export const modifiedScale = (values: readonly number[]): Estimate<RobustScale> => {
  const found = deviations(values);
  if (!found.enough) return found;
  const { median: centre, mad, meanDeviation } = found.value;
  if (meanDeviation === 0) return enough({ basis: 'all equal', centre, unitBelow: null, unitAbove: null });
  const basis = mad > 0 ? 'median deviation' : 'mean deviation';
  const unit = mad > 0 ? mad / MAD_FACTOR : MEAN_DEVIATION_FACTOR * meanDeviation;
  return enough({ basis, centre, unitBelow: unit, unitAbove: unit });
};

/** The same with a MAD for each side, since the low tail of yields is longer. */
export const doubleScale = (values: readonly number[]): Estimate<RobustScale> => {
  const found = deviations(values);
  if (!found.enough) return found;
  const { median: centre, lowerMad, upperMad, meanDeviation } = found.value;
  const unit = (mad: number) => (mad > 0 ? mad / MAD_FACTOR : null);
  return enough({
    basis: meanDeviation > 0 ? 'median deviation' : 'all equal',
    centre,
    unitBelow: unit(lowerMad),
    unitAbove: unit(upperMad),
  });
};

/** How far a value stands from the centre, in units of its side; null where that side has none. */
export const scoreOn = (scale: RobustScale, value: number): number | null => {
  requireFiniteNumber(value, 'A value');
  const distance = value - scale.centre;
  if (distance === 0) return 0;
  const unit = distance < 0 ? scale.unitBelow : scale.unitAbove;
  return unit === null ? null : distance / unit;
};
