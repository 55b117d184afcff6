import { riseToKpa, vacuumToKpaAbs } from '@/lib/units';
import type { VacuumUnit } from '@/lib/vocabulary';
import { FIELD_LABELS, type RecordField, type RecordTexts } from './fields';
import type { Faults } from './read-texts';

const NUMBER = /^-?(\d+(\.\d*)?|\.\d+)$/;
/** A pull ends under vacuum or, for a small part of the trade, a little above the atmosphere; more is a slip. */
const MOST_KPA_ABS = 5000;
const MOST_MINUTES = 7 * 24 * 60;

const readNumber = (texts: RecordTexts, field: RecordField, fault: Faults): number | null => {
  if (texts[field] === '') return null;
  return NUMBER.test(texts[field])
    ? Number(texts[field])
    : fault(field, `${FIELD_LABELS[field]} is a number with a decimal point`);
};

const readFinalVacuum = (reading: number, unit: VacuumUnit, fault: Faults): string | null => {
  if (unit === 'inhg' && reading < 0)
    return fault(
      'finalVacuum',
      'Inches of mercury vacuum are written without a sign; for a pressure above the atmosphere use psig',
    );
  const kpaAbs = vacuumToKpaAbs(reading, unit);
  if (kpaAbs < 0) return fault('finalVacuum', `${reading} ${unit} is below a perfect vacuum`);
  if (kpaAbs > MOST_KPA_ABS) return fault('finalVacuum', `${reading} ${unit} is no pressure at the end of a recovery`);
  return kpaAbs.toFixed(6);
};

/** Final vacuum and hold of a record, pressures in kPa as decimal texts. */
export const readPressures = (texts: RecordTexts, unit: VacuumUnit | null, fault: Faults) => {
  const reading = readNumber(texts, 'finalVacuum', fault);
  const rise = readNumber(texts, 'holdRise', fault);
  const minutes = readNumber(texts, 'holdMinutes', fault);
  if ((reading !== null || rise !== null) && texts.vacuumUnit === '')
    fault('vacuumUnit', 'Choose the unit of the vacuum reading');
  const riseKpa = rise === null || unit === null ? null : riseToKpa(rise, unit);
  if (rise !== null && rise < 0) fault('holdRise', 'The pressure regained is not negative');
  if (riseKpa !== null && riseKpa > MOST_KPA_ABS)
    fault('holdRise', `A rise of ${rise} ${unit} is no hold of a recovery`);
  if (minutes !== null && (minutes < 0 || minutes > MOST_MINUTES))
    fault('holdMinutes', 'The hold is between 0 minutes and a week');
  return {
    finalVacuumKpaAbs: reading === null || unit === null ? null : readFinalVacuum(reading, unit, fault),
    vacuumUnit: unit,
    holdMinutes: minutes === null ? null : String(minutes),
    holdRiseKpa: riseKpa === null ? null : riseKpa.toFixed(6),
  };
};
