import { massToKg } from '@/lib/units';
import type { MassUnit } from '@/lib/vocabulary';
import { MASS_FIELDS, type RecordTexts } from './fields';
import type { Faults } from './read-texts';
import { recoveredMass } from './weights';

/** No appliance or cylinder of the trade comes near this; a larger figure is a slip. */
const MOST_KG = 100_000;

/** How a mass is written in a unit, for the sentence that refuses another. */
const EXAMPLES: Record<MassUnit, string> = {
  lb: 'pounds with a decimal point, for example 12.5',
  oz: 'ounces with a decimal point, for example 14.5',
  'lb-oz': 'pounds and ounces as 1-5.5, ounces below 16',
  kg: 'kilograms with a decimal point, for example 5.67',
  g: 'grams, for example 350',
};

/** The masses of a record in kilograms; null after a fault. */
export const readMasses = (texts: RecordTexts, unit: MassUnit, fault: Faults) => {
  let sound = true;
  const kg = Object.fromEntries(
    MASS_FIELDS.map((field) => {
      const read = texts[field] === '' ? null : massToKg(texts[field], unit);
      const refuse = (message: string) => {
        sound = false;
        fault(field, message);
      };
      if (texts[field] !== '' && read === null) refuse(`Write ${EXAMPLES[unit]}`);
      else if (read?.startsWith('-')) refuse('A mass is not negative');
      else if (Number(read) > MOST_KG) refuse(`More than ${MOST_KG.toLocaleString('en-US')} kg`);
      return [field, read];
    }),
  );
  if (texts.nameplateCharge === '') fault('nameplateCharge', 'Nameplate charge is needed');
  else if (sound && Number(kg.nameplateCharge) === 0) fault('nameplateCharge', 'The nameplate charge is above zero');
  if (!sound) return null;
  const recovered = recoveredMass(texts, unit);
  if (!recovered.ok) return fault(recovered.field, recovered.message);
  return {
    nameplateChargeKg: kg.nameplateCharge ?? '0',
    addedChargeKg: kg.addedCharge ?? '0',
    startWeightKg: kg.startWeight ?? null,
    endWeightKg: kg.endWeight ?? null,
    recoveredMassKg: recovered.kg,
  };
};
