import type { FieldError } from '@/lib/errors';
import { kgText, massToMicrograms } from '@/lib/units';
import type { MassUnit } from '@/lib/vocabulary';
import { LARGEST_ADDITION_KG } from './limits';

/** What must hold of an addition however it came: by form, by API or in a file. */
export type AdditionFacts = {
  addedOn: string;
  enteredMass: string;
  massUnit: MassUnit;
  leaksVerifiedOn: string | null;
};

const LARGEST = BigInt(LARGEST_ADDITION_KG) * 1_000_000_000n;

const massFault = (micrograms: bigint | null, massUnit: MassUnit): string | null => {
  if (micrograms === null)
    return massUnit === 'lb-oz'
      ? 'This is no mass in pounds and ounces; they are written 1-5.5'
      : `This is no mass in ${massUnit}; write a plain number such as 12.5`;
  if (micrograms <= 0n) return 'An addition is more than nothing';
  return micrograms > LARGEST ? `More than ${LARGEST_ADDITION_KG / 1000} tonnes` : null;
};

/**
 * The added mass in exact decimal kilograms, or every fault by field: a mass that is none or not above zero, a day after
 * `today`, leaks found repaired before the addition.
 */
export const checkAddition = (
  { addedOn, enteredMass, massUnit, leaksVerifiedOn }: AdditionFacts,
  today: string,
): { ok: true; addedChargeKg: string } | { ok: false; errors: FieldError[] } => {
  const errors: FieldError[] = [];
  const micrograms = massToMicrograms(enteredMass, massUnit);
  const fault = massFault(micrograms, massUnit);
  if (fault) errors.push({ path: 'addedCharge', message: fault });
  if (addedOn > today) errors.push({ path: 'addedOn', message: `This lies after today, ${today}` });
  if (leaksVerifiedOn !== null && leaksVerifiedOn > today)
    errors.push({ path: 'leaksVerifiedOn', message: `This lies after today, ${today}` });
  else if (leaksVerifiedOn !== null && leaksVerifiedOn < addedOn)
    errors.push({ path: 'leaksVerifiedOn', message: 'The follow-up test comes after the addition, or on its day' });
  return errors.length || micrograms === null ? { ok: false, errors } : { ok: true, addedChargeKg: kgText(micrograms) };
};
