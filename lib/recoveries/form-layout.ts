import { MASS_FIELDS as MASS_COLUMNS } from '@/lib/imports/field-kinds';
import { RECOVERY_FIELDS, type RecoveryField } from '@/lib/imports/fields';
import type { ColumnLayout, FileLayout } from '@/lib/imports/layout';
import type { MassUnit } from '@/lib/vocabulary';
import type { RecordTexts } from './fields';

/**
 * Decimals that a recovery scale shows at least, by unit: none is coarser than a tenth of a pound or kilogram or an
 * ounce. A person types 17 for 17.0, so the figures of one record alone do not tell.
 */
const LEAST_DECIMALS: Record<MassUnit, number> = { lb: 1, kg: 1, oz: 0, 'lb-oz': 0, g: 0 };

const decimalsOf = (text: string): number => /\.(\d+)\s*$/.exec(text)?.[1]?.length ?? 0;

/** Steps of the scale: as fine as the finest reading of the record. */
const scaleDecimals = (texts: RecordTexts): ColumnLayout['decimals'] => {
  const shown = [texts.startWeight, texts.endWeight, texts.recoveredMass].map(decimalsOf);
  const entries = Object.entries(LEAST_DECIMALS).map(([unit, least]) => [unit, Math.max(least, ...shown)]);
  return Object.fromEntries(entries) as Record<MassUnit, number>;
};

const isMassColumn = (field: RecoveryField): boolean => MASS_COLUMNS.some((column) => column === field);

/**
 * The form and the API as a file of one row: the columns of the template, ISO dates, decimal points. `weightsKept` says
 * that the weights were taken before and do not change: they are not held against the recovered mass more strictly.
 */
export const formLayout = (texts: RecordTexts, weightsKept: boolean): FileLayout => ({
  format: 'csv',
  encoding: 'utf-8',
  delimiter: ',',
  headerLine: 1,
  width: RECOVERY_FIELDS.length,
  columns: RECOVERY_FIELDS.map((field, index) => ({
    index,
    field,
    header: field,
    dateOrder: 'ymd',
    decimalMark: 'point',
    massUnit: null,
    vacuumUnit: null,
    decimals: isMassColumn(field) && !weightsKept ? scaleDecimals(texts) : {},
  })),
  massUnit: null,
  vacuumUnit: null,
});
