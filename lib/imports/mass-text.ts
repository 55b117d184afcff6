import type { MassUnit } from '@/lib/vocabulary';
import type { DecimalMark } from './fields';
import { parseDecimal, splitNumberAndUnit } from './numbers';
import { cleanText } from './text';
import { massUnitOf } from './units';

/** A mass as written: canonical text for `massToMicrograms` and the unit the cell itself names, if it does. */
export type MassText = { amount: string; unit: MassUnit | null };

const POUNDS_DASH_OUNCES = /^(\d+)\s*[-–]\s*([\d.,]+)$/;
const POUNDS_WORD_OUNCES = /^(\d+)\s*(?:lbs?|pounds?)\.?[\s,]+([\d.,]+)\s*(?:oz|ounces?)\.?$/i;
const poundsOunces = (pounds: string, ounces: string, mark: DecimalMark): MassText | null => {
  const decimal = parseDecimal(ounces, mark);
  return decimal === null || Number(decimal) >= 16 ? null : { amount: `${pounds}-${decimal}`, unit: 'lb-oz' };
};

/**
 * Reads one mass cell with the given decimal mark: `8.2`, `8.2 lb`, `1-5.5` and `1 lb 5.5 oz` (pounds and ounces, under
 * 16 ounces). Null for what is no mass.
 */
export const parseMassText = (text: string, mark: DecimalMark): MassText | null => {
  const clean = cleanText(text);
  const dashed = POUNDS_DASH_OUNCES.exec(clean) ?? POUNDS_WORD_OUNCES.exec(clean);
  if (dashed) return poundsOunces(dashed[1] ?? '', dashed[2] ?? '', mark);
  const [number, word] = splitNumberAndUnit(clean);
  const unit = word ? massUnitOf(word) : null;
  const amount = parseDecimal(number, mark);
  return amount === null || (word && !unit) ? null : { amount, unit };
};
