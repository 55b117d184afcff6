/** A colour as red, green and blue light, each 0 to 1, linear (not gamma-coded). */
export type LinearRgb = readonly [red: number, green: number, blue: number];

const toLinear = (coded: number): number => (coded <= 0.04045 ? coded / 12.92 : ((coded + 0.055) / 1.055) ** 2.4);

/** Linear light of a colour written `#rrggbb` (sRGB, IEC 61966-2-1); throws on anything else. */
export const linearRgb = (hex: string): LinearRgb => {
  const match = /^#([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(hex);
  if (!match) throw new Error(`Not a colour of the form #rrggbb: ${hex}`);
  const [red, green, blue] = match.slice(1).map((pair) => toLinear(Number.parseInt(pair, 16) / 255));
  return [red ?? 0, green ?? 0, blue ?? 0];
};

/** Relative luminance: WCAG 2.2, definition of "relative luminance". */
export const luminance = ([red, green, blue]: LinearRgb): number => 0.2126 * red + 0.7152 * green + 0.0722 * blue;

/** Contrast of two colours, 1 to 21: WCAG 2.2, definition of "contrast ratio". */
export const contrastRatio = (one: string, other: string): number => {
  const [darker = 0, lighter = 0] = [luminance(linearRgb(one)), luminance(linearRgb(other))].sort((a, b) => a - b);
  return (lighter + 0.05) / (darker + 0.05);
};
