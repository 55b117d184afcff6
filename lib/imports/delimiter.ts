import { splitText } from './csv';
import type { Evidenced } from './encoding';
import { findHeader } from './headers';
import { DELIMITERS, type Delimiter } from './layout';
import { countText } from './text';

const NAMES: Record<Delimiter, string> = { ',': 'commas', ';': 'semicolons', '\t': 'tabs' };

type Trial = { delimiter: Delimiter; known: number; fitting: number; rows: number; width: number };

const attempt = (sample: string, delimiter: Delimiter): Trial => {
  const rows = splitText(sample, delimiter);
  const { position, known } = findHeader(rows);
  const width = rows[position]?.cells.length ?? 0;
  const body = rows.slice(position);
  const fitting = width > 1 ? body.filter(({ cells }) => cells.length === width).length : 0;
  return { delimiter, known, fitting, rows: body.length, width };
};

/**
 * What separates the cells, and why: the mark with which most columns have known names, then the one with which most
 * rows are as wide as the header, then the one that gives more columns. Null when no mark gives two columns.
 */
export const detectDelimiter = (sample: string): Evidenced<Delimiter> | null => {
  const trials = DELIMITERS.map((delimiter) => attempt(sample, delimiter)).filter(({ width }) => width > 1);
  const [best] = trials.sort(
    (a, b) => b.known - a.known || b.fitting / b.rows - a.fitting / a.rows || b.width - a.width,
  );
  if (!best) return null;
  const share = best.fitting === best.rows ? 'All' : `${countText(best.fitting)} of`;
  return {
    value: best.delimiter,
    evidence: `${share} ${countText(best.rows)} rows looked at have ${best.width} cells when split at ${NAMES[best.delimiter]}.`,
  };
};
