import { CATALOGUE } from '@/db/catalogue/refrigerants';
import type { Mapping } from '@/lib/imports/contract';
import { profileFile, readRows } from '@/lib/imports/read-file';
import type { FilePlan, OpenFile, ParsedRow, ReadContext, RecoveryRow } from '@/lib/imports/rows';

/** The day on which every test of the reader happens. */
export const TODAY = '2026-12-01';

export const CONTEXT: ReadContext = {
  fileName: 'recoveries.csv',
  timeZone: 'America/New_York',
  refrigerants: new Set(CATALOGUE.map(({ designation }) => designation)),
  today: TODAY,
};

/** A file of these bytes, handed out in pieces of `size`. */
export const openBytes = (bytes: Uint8Array, size = 65_536): OpenFile =>
  async function* () {
    for (let at = 0; at < bytes.length; at += size) yield bytes.subarray(at, at + size);
  };

export type ReadFile = { plan: FilePlan; rows: ParsedRow[] };

/** Profiles and reads a whole file. */
export const readFile = async (
  content: string | Uint8Array | OpenFile,
  told: Mapping = {},
  remembered: Mapping | null = null,
): Promise<ReadFile> => {
  const open =
    typeof content === 'function'
      ? content
      : openBytes(typeof content === 'string' ? new TextEncoder().encode(content) : content);
  const plan = await profileFile(open, told, remembered, CONTEXT);
  const rows: ParsedRow[] = [];
  for await (const batch of readRows(open, plan, CONTEXT)) rows.push(...batch);
  return { plan, rows };
};

/** The records of a file in which no row may be refused. */
export const takenRows = ({ rows }: ReadFile): RecoveryRow[] =>
  rows.map((parsed) => {
    if (!parsed.ok) throw new Error(`line ${parsed.line}: ${parsed.reasons.map((r) => r.message).join(' ')}`);
    return parsed.row;
  });

/** Reasons by line: `[[2, ['missing']]]`. */
export const refusedCodes = ({ rows }: ReadFile): [line: number, codes: string[]][] =>
  rows.flatMap((parsed) => (parsed.ok ? [] : [[parsed.line, parsed.reasons.map((r) => r.code)]]));

const CELLS: Record<string, string> = {
  record_ref: 'T-1',
  recovered_at: '2015-01-13',
  technician: 'Uma Walsh',
  site: 'S1',
  appliance: 'A1',
  refrigerant: 'R-22',
  nameplate_charge: '8.2',
  recovered_mass: '4.4',
  mass_unit: 'lb',
};

/** A CSV file with the needed columns and one row for each set of changed or added cells; null leaves a column out. */
export const csvOf = (changes: Record<string, string>[], without: string[] = [], delimiter = ','): string => {
  const columns = [...new Set([...Object.keys(CELLS), ...changes.flatMap(Object.keys)])].filter(
    (column) => !without.includes(column),
  );
  const quote = (cell: string) =>
    /["\n\r]/.test(cell) || cell.includes(delimiter) ? `"${cell.replaceAll('"', '""')}"` : cell;
  const rows = changes.map((change, i) => {
    const cells = { ...CELLS, record_ref: `T-${i + 1}`, ...change };
    return columns.map((column) => quote(Object.entries(cells).find(([name]) => name === column)?.[1] ?? ''));
  });
  return [columns.map(quote), ...rows].map((cells) => `${cells.join(delimiter)}\r\n`).join('');
};
