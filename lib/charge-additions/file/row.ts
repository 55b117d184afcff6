import { parseDateText } from '@/lib/imports/date-text';
import { parseMassText } from '@/lib/imports/mass-text';
import type { FieldColumns } from '@/lib/imports/row-cells';
import { RowCells } from '@/lib/imports/row-cells';
import { resolveUnit, rowUnit } from '@/lib/imports/row-units';
import type { RowReason } from '@/lib/imports/rows';
import { massUnitOf } from '@/lib/imports/units';
import { yearSpanOf } from '@/lib/imports/year-span';
import { ADDITION_REASONS, type AdditionReason, MASS_UNITS, type MassUnit } from '@/lib/vocabulary';
import { checkAddition } from '../checked';
import { ADDITION_NOTE_LENGTH, ADDITION_REF_LENGTH } from '../limits';
import { type AdditionField, READ_AS, reasonOf } from './fields';

/** One row of a file of additions in the product's own words; names are not looked up yet. */
export type AdditionRow = {
  additionRef: string;
  addedOn: string;
  site: string;
  appliance: string;
  addedChargeKg: string;
  enteredMass: string;
  massUnit: MassUnit;
  reason: AdditionReason;
  leaksVerifiedOn: string | null;
  notes: string | null;
};

type Context = { today: string; massUnit: MassUnit | null };

const readDay = (cells: RowCells, field: 'added_on' | 'leaks_verified_on', today: string): string | null => {
  const as = READ_AS[field];
  const text = cells.value(as);
  const order = cells.column(as)?.dateOrder;
  if (text === '' || !order)
    return field === 'added_on' ? cells.refuse(as, 'missing', 'The day of the addition is missing.') : null;
  const day = parseDateText(text, order, yearSpanOf('recovered_at', today));
  return day ? day.date : cells.refuse(as, 'not_a_date', `“${text}” is no date of this column.`);
};

const readMass = (cells: RowCells, told: MassUnit | null): { enteredMass: string; massUnit: MassUnit } | null => {
  const as = READ_AS.added_charge;
  const text = cells.value(as);
  const column = cells.column(as);
  if (text === '' || !column?.decimalMark) return cells.refuse(as, 'missing', 'The added mass is missing.');
  const mass = parseMassText(text, column.decimalMark);
  if (!mass) return cells.refuse(as, 'not_a_mass', `“${text}” is no mass.`);
  const inRow = rowUnit(cells, 'mass_unit', massUnitOf, MASS_UNITS);
  if (inRow === 'unknown') return null;
  const massUnit = resolveUnit(cells, { field: as, inCell: mass.unit, inHeader: column.massUnit, inRow, told });
  return massUnit && { enteredMass: mass.amount, massUnit };
};

const readReason = (cells: RowCells): AdditionReason => {
  const text = cells.value(READ_AS.reason);
  const reason = text === '' ? 'unknown' : reasonOf(text);
  if (reason) return reason;
  const choices = ADDITION_REASONS.map((choice) => `“${choice}”`).join(', ');
  cells.refuse(READ_AS.reason, 'unknown_word', `“${text}” is none of ${choices}.`);
  return 'unknown';
};

const FAULTY: Record<string, AdditionField> = {
  addedCharge: 'added_charge',
  addedOn: 'added_on',
  leaksVerifiedOn: 'leaks_verified_on',
};

/** Reads one row of a file of additions, or gives every reason against it. */
export const readAdditionRow = (
  columns: FieldColumns,
  cellTexts: readonly string[],
  { today, massUnit: told }: Context,
): { ok: true; row: AdditionRow } | { ok: false; additionRef: string | null; reasons: RowReason[] } => {
  const cells = new RowCells(columns, cellTexts);
  const additionRef = cells.neededName(READ_AS.addition_ref, 'number of the addition');
  if (additionRef && additionRef.length > ADDITION_REF_LENGTH)
    cells.refuse(READ_AS.addition_ref, 'too_long', `This is longer than ${ADDITION_REF_LENGTH} characters.`);
  const addedOn = readDay(cells, 'added_on', today);
  const site = cells.neededName('site', 'site');
  const appliance = cells.neededName('appliance', 'appliance');
  const mass = readMass(cells, told);
  const reason = readReason(cells);
  const leaksVerifiedOn = readDay(cells, 'leaks_verified_on', today);
  const notes = cells.name('notes', ADDITION_NOTE_LENGTH);
  const refused = () => ({ ok: false as const, additionRef, reasons: cells.reasons });
  if (!additionRef || !addedOn || !site || !appliance || !mass) return refused();
  const checked = checkAddition({ addedOn, ...mass, leaksVerifiedOn }, today);
  if (!checked.ok)
    for (const { path, message } of checked.errors)
      cells.refuse(READ_AS[FAULTY[path] ?? 'added_charge'], 'not_possible', `${message}.`);
  if (!checked.ok || cells.reasons.length) return refused();
  const { addedChargeKg } = checked;
  return {
    ok: true,
    row: { additionRef, addedOn, site, appliance, addedChargeKg, ...mass, reason, leaksVerifiedOn, notes },
  };
};
