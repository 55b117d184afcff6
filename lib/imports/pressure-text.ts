import type { VacuumUnit } from '@/lib/vocabulary';
import type { DecimalMark } from './fields';
import { parseDecimal, splitNumberAndUnit } from './numbers';
import { cleanText } from './text';
import { vacuumUnitOf } from './units';

/** A pressure as written: plain decimal text and the unit the cell itself names, if it does. */
export type PressureText = { amount: string; unit: VacuumUnit | null };

/** Reads one vacuum cell with the given decimal mark: `10.5` or `500 microns`. Null for what is no pressure. */
export const parsePressureText = (text: string, mark: DecimalMark): PressureText | null => {
  const [number, word] = splitNumberAndUnit(cleanText(text));
  const unit = word ? vacuumUnitOf(word) : null;
  const amount = parseDecimal(number, mark);
  return amount === null || (word && !unit) ? null : { amount, unit };
};
