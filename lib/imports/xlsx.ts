import readXlsxFile from 'read-excel-file/node';
import { unreadable } from '@/lib/errors';
import type { RawRow } from './csv';
import { findHeader } from './headers';
import { MOST_XLSX_MB } from './limits';
import type { OpenFile } from './rows';
import { unpackedSize } from './zip-size';

const MOST_UNPACKED_MB = 200;
const MB = 1024 * 1024;

/** The rows of an Excel sheet as canonical text, and the columns in which Excel itself holds numbers. */
export type XlsxSheet = { rows: RawRow[]; numberColumns: ReadonlySet<number> };

/** Plain decimal text of a cell's number: binary noise (0.30000000000000004) and exponents go. */
export const plainNumber = (value: number): string => {
  const rounded = Number(value.toPrecision(15));
  const text = String(rounded);
  if (!text.includes('e')) return text;
  return Number.isInteger(rounded) ? BigInt(rounded).toString() : rounded.toFixed(15).replace(/\.?0+$/, '');
};

/** A cell's date as ISO text; Excel's clock is a wall clock, kept as UTC by the library. */
const isoDate = (value: Date): string => {
  const iso = new Date(Math.round(value.getTime() / 1000) * 1000).toISOString().slice(0, 19);
  return iso.endsWith('T00:00:00') ? iso.slice(0, 10) : iso;
};

const cellText = (value: unknown): string => {
  if (value === null || value === undefined) return '';
  if (typeof value === 'number') return plainNumber(value);
  return value instanceof Date ? isoDate(value) : String(value);
};

const readBytes = async (open: OpenFile): Promise<Buffer> => {
  const pieces: Uint8Array[] = [];
  let size = 0;
  for await (const chunk of open()) {
    size += chunk.length;
    if (size > MOST_XLSX_MB * MB)
      throw unreadable(
        `Excel files may have up to ${MOST_XLSX_MB} MB. Save this one as CSV: those may be much larger.`,
      );
    pieces.push(chunk);
  }
  const bytes = Buffer.concat(pieces);
  const unpacked = unpackedSize(bytes);
  if (unpacked === null) throw unreadable('This Excel file is cut off. Save it again and send the new file.');
  if (unpacked > MOST_UNPACKED_MB * MB)
    throw unreadable(`Unpacked, this Excel file has more than ${MOST_UNPACKED_MB} MB. Save it as CSV instead.`);
  return bytes;
};

const toSheet = (data: readonly (readonly unknown[])[]): XlsxSheet => {
  const numberColumns = new Set<number>();
  const rows = data.map((cells, index) => {
    cells.forEach((cell, column) => {
      if (typeof cell === 'number') numberColumns.add(column);
    });
    return { line: index + 1, cells: cells.map(cellText), quoteFault: false };
  });
  return { rows: rows.filter(({ cells }) => cells.some((cell) => cell.trim() !== '')), numberColumns };
};

/**
 * Reads an .xlsx file: of its sheets the one whose header has most known names, else the first with anything in it.
 * Throws 422 with a sentence for what is too large, no Excel file, or empty.
 */
export const readXlsx = async (open: OpenFile): Promise<XlsxSheet> => {
  const bytes = await readBytes(open);
  const sheets = await readXlsxFile(bytes, { trim: false }).catch((cause: unknown) => {
    throw Object.assign(unreadable('This file is named or packed like an Excel file, but is none that can be read.'), {
      cause,
    });
  });
  const filled = sheets.map(({ data }) => toSheet(data)).filter(({ rows }) => rows.length > 0);
  const [best] = filled.sort((a, b) => findHeader(b.rows).known - findHeader(a.rows).known);
  if (!best) throw unreadable('No sheet of this Excel file has anything in it.');
  return best;
};
