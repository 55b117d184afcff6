import { kgText, massToMicrograms } from '@/lib/units';
import type { MassUnit } from '@/lib/vocabulary';
import { massText } from './unit-text';

const decimals = (text: string): number => /\.(\d*)\s*$/.exec(text)?.[1]?.length ?? 0;

/**
 * The step of the scale as its readings tell it, in micrograms: one unit in the last decimal of the reading that shows
 * most of them (spreadsheets drop the zero of 17.0). Pounds and ounces count in ounces.
 */
export const scaleStep = (readings: readonly string[], unit: MassUnit): bigint => {
  const most = Math.max(0, ...readings.map(decimals));
  const one = most === 0 ? '1' : `0.${'1'.padStart(most, '0')}`;
  return massToMicrograms(one, unit === 'lb-oz' ? 'oz' : unit) ?? 0n;
};

/** What the recovered mass is, or why it can't be told. `texts` are decimal texts in `unit`, '' where not stated. */
export type RecoveredMass =
  | { ok: true; kg: string }
  | { ok: false; field: 'recoveredMass' | 'startWeight' | 'endWeight'; message: string };

const fault = (field: 'recoveredMass' | 'startWeight' | 'endWeight', message: string): RecoveredMass => ({
  ok: false,
  field,
  message,
});

/**
 * The recovered mass as stated, or end weight less start weight. Where all three are stated they must agree within one
 * step of the scale: each weight is read to half a step. Texts that are no masses are for the caller to refuse first.
 */
export const recoveredMass = (
  texts: { startWeight: string; endWeight: string; recoveredMass: string },
  unit: MassUnit,
): RecoveredMass => {
  const start = massToMicrograms(texts.startWeight, unit);
  const end = massToMicrograms(texts.endWeight, unit);
  const stated = massToMicrograms(texts.recoveredMass, unit);
  if (start !== null && end !== null) {
    const gained = end - start;
    if (gained < 0n)
      return fault(
        'endWeight',
        `The end weight ${texts.endWeight} ${unit} is less than the start weight ${texts.startWeight} ${unit}: the cylinder can’t have become lighter`,
      );
    if (stated === null) return { ok: true, kg: kgText(gained) };
    const difference = stated > gained ? stated - gained : gained - stated;
    if (difference > scaleStep([texts.startWeight, texts.endWeight], unit))
      return fault(
        'recoveredMass',
        `The recovered mass is ${texts.recoveredMass} ${unit}, but the weights give ${massText(kgText(gained), unit)} ${unit} (${texts.endWeight} less ${texts.startWeight})`,
      );
  }
  if (stated !== null) return { ok: true, kg: kgText(stated) };
  if (start === null && end === null)
    return fault('recoveredMass', 'State the recovered mass, or the weights of the cylinder before and after');
  return fault(start === null ? 'startWeight' : 'endWeight', 'State both weights, or the recovered mass');
};
