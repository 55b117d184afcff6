import { kgToUnit } from '@/lib/units';
import type { DisplayUnit } from '@/lib/vocabulary';

/**
 * What the cells of a column are: text, `YYYY-MM`, `YYYY-MM-DD`, masses in the table's unit, counts, shares, changes,
 * factors, points (hundredths of a share, with their sign).
 */
export type FileColumn = {
  label: string;
  kind: 'text' | 'month' | 'day' | 'mass' | 'count' | 'share' | 'change' | 'factor' | 'points';
};
export type FileCell = string | number | null;

/** A table as it leaves in a file: finished values, in the unit that its heads name. */
export type FileTable = {
  title: string;
  /** The records it was made from, in words. */
  scopeWords: string;
  unit: DisplayUnit;
  columns: readonly FileColumn[];
  rows: readonly (readonly FileCell[])[];
};

/** A mass of the API for a file: in the unit, to its thousandth, finer than any scale of the trade. */
export const massCell = (kg: number, unit: DisplayUnit): number => Math.round(kgToUnit(kg, unit) * 1000) / 1000;

/** When and where a file was made. */
export type FileOrigin = { madeAt: Date; address: string };

const plain = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/[^\w]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .toLowerCase();

/** Name of the file without its ending: `recovered-mass-by-month-2026-12-01`; the day is UTC's. */
export const fileStem = ({ title }: FileTable, { madeAt }: FileOrigin): string =>
  `${plain(title)}-${madeAt.toISOString().slice(0, 10)}`;
