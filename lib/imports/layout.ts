import type { MassUnit, VacuumUnit } from '@/lib/vocabulary';
import type { DateOrder, DecimalMark, RecoveryField } from './fields';

export const ENCODINGS = ['utf-8', 'utf-16le', 'utf-16be', 'windows-1252'] as const;
export type Encoding = (typeof ENCODINGS)[number];

export const DELIMITERS = [',', ';', '\t'] as const;
export type Delimiter = (typeof DELIMITERS)[number];

/** One column and how its cells are read. */
export type ColumnLayout = {
  index: number;
  header: string;
  field: RecoveryField | null;
  dateOrder: DateOrder | null;
  decimalMark: DecimalMark | null;
  /** Unit that the header itself names, as in “Nameplate (oz)”. */
  massUnit: MassUnit | null;
  vacuumUnit: VacuumUnit | null;
  /** Most decimals written in this column by unit: the finest step its readings have. */
  decimals: Partial<Record<MassUnit, number>>;
};

/** What the second pass works by. */
export type FileLayout = {
  format: 'csv' | 'xlsx';
  encoding: Encoding;
  delimiter: Delimiter;
  /** Line of the header; what stands above it is a title. */
  headerLine: number;
  /** Cells a row must have. */
  width: number;
  columns: ColumnLayout[];
  /** Units for rows that name none, as the person told. */
  massUnit: MassUnit | null;
  vacuumUnit: VacuumUnit | null;
};
