import { APPLIANCE_CATEGORIES, CERTIFICATION_TYPES, DISPOSITIONS, JOB_TYPES } from '@/lib/vocabulary';
import type { RawRow } from './csv';
import type { FileLayout } from './layout';
import { localTime, type ToLocalTime } from './local-time';
import { refrigerantOf, refrigerantSentence } from './refrigerant';
import { fieldColumns, RowCells } from './row-cells';
import { readManufacturedOn, readRecoveredAt } from './row-dates';
import { readMasses } from './row-masses';
import { readPressures } from './row-pressures';
import { rowShapeFault } from './row-shape';
import type { ParsedRow, ReadContext, RecoveryRow } from './rows';
import { categoryOf, certificationOf, dispositionOf, jobTypeOf } from './words';

const LONGEST_NOTE = 10_000;

const readRefrigerant = (cells: RowCells, catalogue: ReadonlySet<string>): string | null => {
  const text = cells.value('refrigerant');
  if (text === '') return cells.refuse('refrigerant', 'missing', 'The refrigerant is missing.');
  return (
    refrigerantOf(text, catalogue) ??
    cells.refuse('refrigerant', 'unknown_refrigerant', refrigerantSentence(text, catalogue))
  );
};

/** Cells by field and by unmapped header, as typed; filled ones only. */
const asTyped = (cells: readonly string[], layout: FileLayout) => {
  const entered: Record<string, string> = {};
  const extra: Record<string, string> = {};
  for (const { index, field, header } of layout.columns) {
    const text = (cells[index] ?? '').trim();
    if (text) (field ? entered : extra)[field ?? header] = text;
  }
  return { entered, extra };
};

type RowContext = ReadContext & { toLocalTime: ToLocalTime };

/** Reads every field before it decides, so that all reasons of a row come out at once. */
const readRecovery = (cells: RowCells, layout: FileLayout, context: RowContext): RecoveryRow | null => {
  const recordRef = cells.neededName('record_ref', 'ticket number');
  const day = readRecoveredAt(cells, context.today, context.toLocalTime);
  const technician = cells.neededName('technician', 'technician');
  const site = cells.neededName('site', 'site');
  const appliance = cells.neededName('appliance', 'appliance');
  const refrigerant = readRefrigerant(cells, context.refrigerants);
  const masses = readMasses(cells, layout.massUnit);
  const pressures = readPressures(cells, layout.vacuumUnit);
  const branch = cells.name('branch');
  const jobType = cells.word('job_type', jobTypeOf, JOB_TYPES);
  const category = cells.word('appliance_category', categoryOf, APPLIANCE_CATEGORIES);
  const cylinder = cells.name('cylinder');
  const disposition = cells.word('disposition', dispositionOf, DISPOSITIONS);
  const manufacturedOn = readManufacturedOn(cells, context.today);
  const technicianCertification = cells.word('technician_certification', certificationOf, CERTIFICATION_TYPES);
  const notes = cells.name('notes', LONGEST_NOTE);
  if (cells.reasons.length || !recordRef || !day || !technician || !site || !appliance || !refrigerant || !masses)
    return null;
  const { entered, extra } = asTyped(cells.cells, layout);
  // Written out: spreading the parts takes longer than reading them.
  return {
    recordRef,
    recoveredOn: day.recoveredOn,
    recoveredAt: day.recoveredAt,
    technician,
    site,
    appliance,
    branch,
    jobType,
    category,
    refrigerant,
    nameplateChargeKg: masses.nameplateChargeKg,
    addedChargeKg: masses.addedChargeKg,
    startWeightKg: masses.startWeightKg,
    endWeightKg: masses.endWeightKg,
    recoveredMassKg: masses.recoveredMassKg,
    massUnit: masses.massUnit,
    finalVacuumKpaAbs: pressures.finalVacuumKpaAbs,
    vacuumUnit: pressures.vacuumUnit,
    holdMinutes: pressures.holdMinutes,
    holdRiseKpa: pressures.holdRiseKpa,
    cylinder,
    disposition,
    manufacturedOn,
    technicianCertification,
    notes,
    entered,
    extra,
  };
};

/** Makes the reader of rows for one file: each row becomes a record, or is refused with all of its reasons. */
export const rowReader = (layout: FileLayout, context: ReadContext): ((raw: RawRow) => ParsedRow) => {
  const columns = fieldColumns(layout);
  const rowContext = { ...context, toLocalTime: localTime(context.timeZone) };
  const shape = { width: layout.width, columns: layout.columns.length };
  return (raw) => {
    const { line, cells } = raw;
    const fault = rowShapeFault(raw, shape);
    if (fault) return { line, cells, recordRef: null, ok: false, reasons: [fault] };
    const reading = new RowCells(columns, cells);
    const row = readRecovery(reading, layout, rowContext);
    if (row) return { line, cells, recordRef: row.recordRef, ok: true, row };
    return { line, cells, recordRef: reading.raw('record_ref').trim() || null, ok: false, reasons: reading.reasons };
  };
};
