import type { MassUnit, VacuumUnit } from '@/lib/vocabulary';
import type { ColumnProfile } from './column-profile';
import type { Mapping, Question } from './contract';
import { isMassField, isPressureField } from './field-kinds';
import type { RecoveryField } from './fields';
import { listWords } from './text';
import { MASS_UNIT_NAMES, VACUUM_UNIT_NAMES } from './unit-names';

const choicesOf = (names: Record<string, string>) => Object.entries(names).map(([value, label]) => ({ value, label }));

/** Questions for units that no column, header, cell or person names. */
export const askUnits = (
  profiles: readonly ColumnProfile[],
  massUnit: MassUnit | null,
  vacuumUnit: VacuumUnit | null,
): Question[] => {
  const has = (field: RecoveryField) => profiles.some(({ column }) => column.field === field);
  const open = profiles.filter(({ withoutUnit }) => withoutUnit > 0);
  const masses = open.filter(({ column }) => isMassField(column.field) && !column.meaning?.massUnit);
  const pressures = open.filter(({ column }) => isPressureField(column.field) && !column.meaning?.vacuumUnit);
  const named = (columns: readonly ColumnProfile[]) =>
    listWords(
      columns.map(({ column }) => `“${column.header}”`),
      'and',
    );
  const questions: Question[] = [];
  if (masses.length && !massUnit && !has('mass_unit'))
    questions.push({
      about: 'massUnit',
      header: null,
      field: null,
      sentence: `The file does not say in which unit ${named(masses)} ${masses.length > 1 ? 'are' : 'is'} written.`,
      choices: choicesOf(MASS_UNIT_NAMES),
    });
  if (pressures.length && !vacuumUnit && !has('vacuum_unit'))
    questions.push({
      about: 'vacuumUnit',
      header: null,
      field: null,
      sentence: `The file does not say in which unit ${named(pressures)} ${pressures.length > 1 ? 'are' : 'is'} written.`,
      choices: choicesOf(VACUUM_UNIT_NAMES),
    });
  return questions;
};

/** The unit for rows that name none: as told now, else as told before for the same headers. */
export const toldUnits = (said: Mapping, before: Mapping | null) => ({
  massUnit: said.massUnit ?? before?.massUnit ?? null,
  vacuumUnit: said.vacuumUnit ?? before?.vacuumUnit ?? null,
});
