import type { MassUnit, VacuumUnit } from '@/lib/vocabulary';
import type { Evidenced } from './encoding';
import { isMassField, isPressureField } from './field-kinds';
import type { MappedColumn } from './map-columns';
import { MASS_UNIT_NAMES, VACUUM_UNIT_NAMES } from './unit-names';

/** In which unit a column is read and why, for the person to see; null for columns without unit or with an open one. */
export const unitEvidence = (
  { field, meaning }: MappedColumn,
  columns: readonly MappedColumn[],
  told: { massUnit: MassUnit | null; vacuumUnit: VacuumUnit | null },
): Evidenced<string> | null => {
  const isMass = isMassField(field);
  if (!isMass && !isPressureField(field)) return null;
  const names: Record<string, string> = isMass ? MASS_UNIT_NAMES : VACUUM_UNIT_NAMES;
  const inHeader = isMass ? meaning?.massUnit : meaning?.vacuumUnit;
  if (inHeader) return { value: names[inHeader] ?? inHeader, evidence: 'The name of the column says so.' };
  const unitColumn = columns.find((c) => c.field === (isMass ? 'mass_unit' : 'vacuum_unit'));
  if (unitColumn) return { value: 'row by row', evidence: `“${unitColumn.header}” names the unit of each row.` };
  const unit = isMass ? told.massUnit : told.vacuumUnit;
  return unit && { value: names[unit] ?? unit, evidence: 'You said so.' };
};
