/** Pressure classes of appliances by their refrigerant, 40 CFR 82.152. */
export type PressureClass = 'low' | 'medium' | 'high' | 'very_high';

const LEAST_PSIA = { medium: 45, high: 170, veryHighAbove: 355 } as const;

/**
 * The class of 40 CFR 82.152 by the refrigerant's liquid saturation pressure at 104 °F in psia: low below 45, medium to
 * 170, high to 355, very high above. `null` stands for a critical temperature below 104 °F (no such pressure): very
 * high. Throws RangeError on a pressure that is not positive.
 */
export const pressureClassOf = (psiaAt104F: number | null): PressureClass => {
  if (psiaAt104F === null) return 'very_high';
  if (!(psiaAt104F > 0)) throw new RangeError(`No absolute pressure: ${psiaAt104F} psia`);
  if (psiaAt104F > LEAST_PSIA.veryHighAbove) return 'very_high';
  if (psiaAt104F >= LEAST_PSIA.high) return 'high';
  return psiaAt104F >= LEAST_PSIA.medium ? 'medium' : 'low';
};
