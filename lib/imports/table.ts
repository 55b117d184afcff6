import { unreadable } from '@/lib/errors';
import { controlShare, firstBytes, foreignKind, isZip } from './bytes';
import type { Mapping } from './contract';
import { csvRows, type RawRow } from './csv';
import { decodeText } from './decode';
import { detectDelimiter } from './delimiter';
import { detectEncoding, type Evidenced, utf16ByZeros } from './encoding';
import type { Delimiter, Encoding, FileLayout } from './layout';
import type { OpenFile } from './rows';
import { readXlsx } from './xlsx';

const HEAD_BYTES = 64 * 1024;
const SAMPLE_CHARACTERS = 256 * 1024;
const MOST_CONTROLS = 0.01;

/** A file that is open for reading as rows of cells, and how that was made out. */
export type Table = {
  format: 'csv' | 'xlsx';
  encoding: Evidenced<Encoding> | null;
  delimiter: Evidenced<Delimiter> | null;
  /** Columns whose numbers come typed, so that no decimal mark is in question. */
  numberColumns: ReadonlySet<number>;
  rows: () => AsyncIterable<RawRow[]>;
};

/** Throws 422 when the first bytes are none, a foreign file's, or no text. */
export const refuseForeign = (bytes: Uint8Array, fileName: string): void => {
  if (bytes.length === 0) throw unreadable(`“${fileName}” is empty.`);
  const kind = foreignKind(bytes);
  if (kind) throw unreadable(`“${fileName}” is ${kind}. Send a CSV file or an Excel file (.xlsx).`);
  const marked = (bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff);
  if (isZip(bytes) || marked || utf16ByZeros(bytes)) return;
  if (controlShare(bytes) > MOST_CONTROLS || bytes.includes(0))
    throw unreadable(`“${fileName}” is not a text file. Send a CSV file or an Excel file (.xlsx).`);
};

async function* inBatches(rows: RawRow[]): AsyncGenerator<RawRow[], void, void> {
  yield rows;
}

const sampleOf = async (open: OpenFile, encoding: Encoding): Promise<string> => {
  let sample = '';
  for await (const piece of decodeText(open, encoding)) {
    sample += piece;
    if (sample.length >= SAMPLE_CHARACTERS) break;
  }
  // A row cut off at the end would count as too narrow.
  const lastLine = sample.length < SAMPLE_CHARACTERS ? 0 : sample.lastIndexOf('\n') + 1;
  return lastLine > 0 ? sample.slice(0, lastLine) : sample;
};

const told = <Value>(value: Value): Evidenced<Value> => ({ value, evidence: 'You said so.' });

/** Opens a file as a table; what the person told goes before the evidence. Throws 422 for what is no table. */
export const openTable = async (open: OpenFile, mapping: Mapping, fileName: string): Promise<Table> => {
  const head = await firstBytes(open, HEAD_BYTES);
  refuseForeign(head, fileName);
  if (isZip(head)) {
    const { rows, numberColumns } = await readXlsx(open);
    return { format: 'xlsx', encoding: null, delimiter: null, numberColumns, rows: () => inBatches(rows) };
  }
  const encoding = mapping.encoding ? told(mapping.encoding) : await detectEncoding(open);
  const sample = await sampleOf(open, encoding.value);
  if (sample.trim() === '') throw unreadable(`“${fileName}” is empty.`);
  const delimiter = mapping.delimiter ? told(mapping.delimiter) : detectDelimiter(sample);
  if (!delimiter)
    throw unreadable(
      `“${fileName}” has no columns: its lines are not divided by commas, semicolons or tabs. The first row must name the columns.`,
    );
  const rows = () => csvRows(decodeText(open, encoding.value), delimiter.value);
  return { format: 'csv', encoding, delimiter, numberColumns: new Set(), rows };
};

/** The rows again, the way the layout says. */
export async function* reopenRows(open: OpenFile, layout: FileLayout): AsyncGenerator<RawRow[], void, void> {
  if (layout.format === 'xlsx') yield (await readXlsx(open)).rows;
  else yield* csvRows(decodeText(open, layout.encoding), layout.delimiter);
}
