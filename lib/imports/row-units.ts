import type { RecoveryField } from './fields';
import type { RowCells } from './row-cells';

/** Where units may be named: in the cell itself, in the header, in the row's unit column, by the person for all rows. */
export type UnitSources<Unit> = {
  field: RecoveryField;
  inCell: Unit | null;
  inHeader: Unit | null;
  inRow: Unit | null;
  told: Unit | null;
};

/**
 * The unit of one cell. What the file names in several places must be one and the same; what the person told counts only
 * where the file names none. Refuses the cell otherwise and gives null.
 */
export const resolveUnit = <Unit extends string>(
  cells: RowCells,
  { field, inCell, inHeader, inRow, told }: UnitSources<Unit>,
): Unit | null => {
  const [unit, ...others] = new Set([inCell, inHeader, inRow].filter((named) => named !== null));
  if (unit === undefined) return told ?? cells.refuse(field, 'unit_missing', 'The unit of this figure is missing.');
  if (others.length === 0) return unit;
  return cells.refuse(field, 'unit_conflict', `The file names two units for this: ${unit} and ${others.join(', ')}.`);
};

/** The unit that the row's own unit column names, null when blank; refuses a word that is no unit. */
export const rowUnit = <Unit extends string>(
  cells: RowCells,
  field: 'mass_unit' | 'vacuum_unit',
  read: (text: string) => Unit | null,
  choices: readonly string[],
): Unit | null | 'unknown' => {
  const text = cells.value(field);
  if (text === '') return null;
  const unit = read(text);
  if (unit) return unit;
  cells.refuse(field, 'unknown_unit', `“${text}” is none of the units ${choices.join(', ')}.`);
  return 'unknown';
};
