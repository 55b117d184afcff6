import { riseToKpa, vacuumToKpaAbs } from '@/lib/units';
import { VACUUM_UNITS, type VacuumUnit } from '@/lib/vocabulary';
import { parseDecimal } from './numbers';
import { parsePressureText } from './pressure-text';
import type { RowCells } from './row-cells';
import { resolveUnit, rowUnit } from './row-units';
import { vacuumUnitOf } from './units';

export type RowPressures = {
  finalVacuumKpaAbs: string | null;
  vacuumUnit: VacuumUnit | null;
  holdMinutes: string | null;
  holdRiseKpa: string | null;
};

/** A perfect vacuum at the standard atmosphere, in inches of mercury. */
const FULL_VACUUM_INHG = 29.92;
const HIGHEST_KPA = 10_000;
const LONGEST_HOLD_MINUTES = 100_000;

type Reading = { value: number; unit: VacuumUnit };
type Units = { inRow: VacuumUnit | null | 'unknown'; told: VacuumUnit | null };

const readPressure = (cells: RowCells, field: 'final_vacuum' | 'hold_rise', { inRow, told }: Units): Reading | null => {
  const text = cells.value(field);
  const column = cells.column(field);
  if (text === '' || !column) return null;
  if (!column.decimalMark)
    return cells.refuse(field, 'not_decided', 'It is not decided yet how the numbers of this column are written.');
  const pressure = parsePressureText(text, column.decimalMark);
  if (!pressure) return cells.refuse(field, 'not_a_pressure', `“${text}” is no pressure.`);
  if (inRow === 'unknown') return null;
  const unit = resolveUnit(cells, { field, inCell: pressure.unit, inHeader: column.vacuumUnit, inRow, told });
  return unit && { value: Number(pressure.amount), unit };
};

const vacuumKpa = (cells: RowCells, { value, unit }: Reading): string | null => {
  if (unit === 'inhg' && (value < 0 || value > FULL_VACUUM_INHG))
    return cells.refuse(
      'final_vacuum',
      'impossible_vacuum',
      `A vacuum in inHg lies between 0 and ${FULL_VACUUM_INHG}; this says ${value}.`,
    );
  const kpa = vacuumToKpaAbs(value, unit);
  if (kpa < 0 || kpa > HIGHEST_KPA)
    return cells.refuse('final_vacuum', 'impossible_vacuum', `${value} ${unit} is no pressure a machine reaches.`);
  return kpa.toFixed(6);
};

const riseKpa = (cells: RowCells, { value, unit }: Reading): string | null => {
  const kpa = riseToKpa(value, unit);
  if (kpa < 0 || kpa > HIGHEST_KPA)
    return cells.refuse('hold_rise', 'impossible_rise', `A rise of ${value} ${unit} during the hold is impossible.`);
  return kpa.toFixed(6);
};

const readMinutes = (cells: RowCells): string | null => {
  const text = cells.value('hold_minutes');
  if (text === '') return null;
  const minutes = parseDecimal(text, cells.column('hold_minutes')?.decimalMark ?? 'point');
  if (minutes === null) return cells.refuse('hold_minutes', 'not_a_number', `“${text}” is no number of minutes.`);
  if (Number(minutes) < 0 || Number(minutes) > LONGEST_HOLD_MINUTES)
    return cells.refuse('hold_minutes', 'impossible_hold', `A hold of ${text} minutes is impossible.`);
  return minutes;
};

/** Reads vacuum, hold and rise; refuses figures without unit and those that no gauge can show. */
export const readPressures = (cells: RowCells, told: VacuumUnit | null): RowPressures => {
  const units: Units = { inRow: rowUnit(cells, 'vacuum_unit', vacuumUnitOf, VACUUM_UNITS), told };
  const vacuum = readPressure(cells, 'final_vacuum', units);
  const rise = readPressure(cells, 'hold_rise', units);
  return {
    finalVacuumKpaAbs: vacuum && vacuumKpa(cells, vacuum),
    vacuumUnit: vacuum?.unit ?? rise?.unit ?? null,
    holdMinutes: readMinutes(cells),
    holdRiseKpa: rise && riseKpa(cells, rise),
  };
};
