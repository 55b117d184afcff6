import type { KnownNames } from '@/analytics/records/known-names-contract';
import type { RecordTexts } from '@/lib/recoveries/fields';
import { massText } from '@/lib/recoveries/unit-text';
import { kgToUnit } from '@/lib/units';
import { MASS_UNITS } from '@/lib/vocabulary';

/** What the form suggests is rounded to what a nameplate says: hundredths of a pound or kilogram. */
const NAMEPLATE_DECIMALS = 2;

const nameplateText = (kg: number, massUnit: string): string => {
  if (massUnit === 'lb' || massUnit === 'kg') return String(Number(kgToUnit(kg, massUnit).toFixed(NAMEPLATE_DECIMALS)));
  const unit = MASS_UNITS.find((known) => known === massUnit);
  return unit === 'g' ? massText(kg.toFixed(3), unit) : '';
};

/** The texts with what is known of a chosen appliance put into fields that are still empty. */
export const withApplianceFilledIn = (texts: RecordTexts, names: KnownNames | undefined): RecordTexts => {
  const appliance = names?.appliances.find(({ name }) => name === texts.appliance);
  if (!appliance) return texts;
  return {
    ...texts,
    refrigerant: texts.refrigerant || (appliance.refrigerant ?? ''),
    category: texts.category || (appliance.category ?? ''),
    nameplateCharge:
      texts.nameplateCharge ||
      (appliance.nameplateCharge === null ? '' : nameplateText(appliance.nameplateCharge, texts.massUnit)),
  };
};
