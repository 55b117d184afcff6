import { kgText, massToMicrograms } from '@/lib/units';
import { MASS_UNITS, type MassUnit } from '@/lib/vocabulary';
import type { MassField } from './field-kinds';
import { FIELD_NAMES } from './field-names';
import { parseMassText } from './mass-text';
import type { RowCells } from './row-cells';
import { resolveUnit, rowUnit } from './row-units';
import { massUnitOf } from './units';
import { disagreement } from './weights-agree';

/** One mass of a row: whole micrograms and the unit it was written in. */
export type RowMass = { micrograms: bigint; unit: MassUnit };

export type RowMasses = {
  nameplateChargeKg: string;
  addedChargeKg: string;
  startWeightKg: string | null;
  endWeightKg: string | null;
  recoveredMassKg: string;
  massUnit: MassUnit;
};

const LARGEST_KG = 100_000;
const LARGEST = BigInt(LARGEST_KG) * 1_000_000_000n;

// What spreadsheets make of `1-5`: `5-Jan`, `Jan-05`, `2015-01-05`, `1/5/2015`.
const DATE_LIKE = /^(?:\d{1,2}-[a-z]{3}|[a-z]{3}-\d{1,2}|\d{1,4}[-/]\d{1,2}[-/]\d{1,4}(?:[ T].*)?)$/i;

const unreadable = (cells: RowCells, field: MassField, text: string): null =>
  DATE_LIKE.test(text)
    ? cells.refuse(
        field,
        'date_in_mass',
        `“${text}” is a date. A spreadsheet makes one of pounds and ounces such as 1-5; format the column as text and type them again.`,
      )
    : cells.refuse(field, 'not_a_mass', `“${text}” is no mass.`);

// Pounds and ounces below zero: `-1-9.28`.
const NEGATIVE = /^[-−]\d+\s*[-–]\s*[\d.,]+$/;

const refuseNegative = (cells: RowCells, field: MassField): null =>
  cells.refuse(field, 'negative_mass', `The ${FIELD_NAMES[field]} can’t be below zero.`);

type Units = { inRow: MassUnit | null | 'unknown'; told: MassUnit | null };

const readMass = (cells: RowCells, field: MassField, { inRow, told }: Units): RowMass | null => {
  const text = cells.value(field);
  const column = cells.column(field);
  if (text === '' || !column) return null;
  if (!column.decimalMark)
    return cells.refuse(field, 'not_decided', 'It is not decided yet how the numbers of this column are written.');
  const mass = parseMassText(text, column.decimalMark);
  if (!mass) return NEGATIVE.test(text) ? refuseNegative(cells, field) : unreadable(cells, field, text);
  if (inRow === 'unknown') return null;
  const unit = resolveUnit(cells, { field, inCell: mass.unit, inHeader: column.massUnit, inRow, told });
  if (!unit) return null;
  const micrograms = massToMicrograms(mass.amount, unit);
  if (micrograms === null)
    return cells.refuse(field, 'not_a_mass', `“${text}” is no mass in ${unit}; pounds and ounces are written 1-5.5.`);
  if (micrograms < 0n) return refuseNegative(cells, field);
  if (micrograms > LARGEST)
    return cells.refuse(field, 'mass_too_large', `The ${FIELD_NAMES[field]} is more than ${LARGEST_KG / 1000} tonnes.`);
  return { micrograms, unit };
};

/** The recovered mass as written, or else end less start; refuses what is missing, negative or disagrees. */
const recoveredOf = (
  cells: RowCells,
  start: RowMass | null,
  end: RowMass | null,
  written: RowMass | null,
): bigint | null => {
  if (start && end && end.micrograms < start.micrograms)
    return cells.refuse('end_weight', 'end_below_start', 'The end weight is below the start weight.');
  if (start && end && written) {
    const sentence = disagreement(cells, { start, end, written });
    if (sentence) return cells.refuse('recovered_mass', 'weights_disagree', sentence);
  }
  if (written) return written.micrograms;
  if (start && end) return end.micrograms - start.micrograms;
  const isBlank = (['recovered_mass', 'start_weight', 'end_weight'] as const).some(
    (field) => cells.value(field) === '',
  );
  if (isBlank && cells.value('recovered_mass') === '')
    cells.refuse('recovered_mass', 'missing', 'Neither the recovered mass nor both weights are filled in.');
  return null;
};

/** Reads the masses of a row; null when one was refused. */
export const readMasses = (cells: RowCells, told: MassUnit | null): RowMasses | null => {
  const units: Units = { inRow: rowUnit(cells, 'mass_unit', massUnitOf, MASS_UNITS), told };
  const read = (field: MassField) => readMass(cells, field, units);
  const [nameplate, added] = [read('nameplate_charge'), read('added_charge')];
  const [start, end, written] = [read('start_weight'), read('end_weight'), read('recovered_mass')];
  if (cells.value('nameplate_charge') === '')
    cells.refuse('nameplate_charge', 'missing', 'The nameplate charge is missing.');
  if (nameplate?.micrograms === 0n)
    cells.refuse('nameplate_charge', 'nameplate_not_positive', 'The nameplate charge must be above zero.');
  const recovered = recoveredOf(cells, start, end, written);
  if (!nameplate || recovered === null) return null;
  const kgOf = (mass: RowMass | null) => (mass ? kgText(mass.micrograms) : null);
  return {
    nameplateChargeKg: kgText(nameplate.micrograms),
    addedChargeKg: kgOf(added) ?? '0',
    startWeightKg: kgOf(start),
    endWeightKg: kgOf(end),
    recoveredMassKg: kgText(recovered),
    massUnit: (written ?? end ?? nameplate).unit,
  };
};
