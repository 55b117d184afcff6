import { readFileSync } from 'node:fs';
import Papa from 'papaparse';

/** 400 rows of an invented company in the product's file format, masses in pounds (tests/fixtures/sample-company). */
export const RECOVERY_FILE = 'tests/fixtures/sample-company/nasty/plain.csv';

/**
 * The rows that must be refused. T-000081 says 0.82 lb recovered, and 32.8 - 24.6 = 8.2 lb on the scale; T-000317 ends
 * lighter than it began, 33.46 to 33.04 lb.
 */
export const REFUSED = ['T-000081', 'T-000317'];

export type FileRow = {
  record_ref: string;
  recovered_at: string;
  technician: string;
  site: string;
  refrigerant: string;
  recovered_mass: string;
};

const parsed = Papa.parse<FileRow>(readFileSync(RECOVERY_FILE, 'utf8'), { header: true, skipEmptyLines: true });

/** The rows that are to be taken. */
export const TAKEN = parsed.data.filter((row) => !REFUSED.includes(row.record_ref));

/** What a part of the file adds up to, in pounds, and how many rows it is. */
export const sumOf = (part: (row: FileRow) => boolean): { massLb: number; recoveries: number } => {
  const rows = TAKEN.filter(part);
  return { massLb: rows.reduce((sum, row) => sum + Number(row.recovered_mass), 0), recoveries: rows.length };
};
