import Papa from 'papaparse';
import { unreadable } from '@/lib/errors';
import { fromFormulaSafe } from '@/lib/formula-safe';
import type { Delimiter } from './layout';
import { countText } from './text';

/** A row as it stands in the file: the line on which it begins and its cells; `quoteFault` when its quotes do not close. */
export type RawRow = { line: number; cells: string[]; quoteFault: boolean };

/** Text is parsed in portions of at least this many characters. */
const PORTION = 64 * 1024;
/** No row is longer: an opening quote without its end would swallow the file. */
const LONGEST_ROW = 256 * 1024;
const MOST_QUOTE_FAULTS = 1_000;

type Parsed = { data: string[][]; errors: { type: string; code: string; row?: number }[]; meta: { cursor: number } };

const lineBreaks = (text: string): number => {
  let count = 0;
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) count += 1;
  return count;
};

const linesOf = (cells: readonly string[]): number => cells.reduce((sum, cell) => sum + lineBreaks(cell), 1);

const afterLines = (text: string, lines: number): number => {
  let at = 0;
  for (let i = 0; i < lines && at < text.length; i += 1) {
    const end = text.indexOf('\n', at);
    at = end < 0 ? text.length : end + 1;
  }
  return at;
};

/**
 * Splits text with `\n` line ends into rows (RFC 4180: quoted cells, doubled quotes, line breaks inside quotes). A
 * quote that does not close spoils only the line it stands on: that line comes out with `quoteFault`, and reading goes on
 * with the next. Throws 422 when a thousand lines are like that.
 */
export class CsvSplitter {
  private readonly parser: Papa.Parser;
  private rest = '';
  private line = 1;
  private faults = 0;

  constructor(delimiter: Delimiter) {
    this.parser = new Papa.Parser({ delimiter, newline: '\n', header: false });
  }

  /** Takes the next text and gives the rows that are complete by now. */
  push(text: string): RawRow[] {
    this.rest += text;
    return this.rest.length < PORTION ? [] : this.split(false);
  }

  /** The last rows. */
  end(): RawRow[] {
    return this.split(true);
  }

  private split(last: boolean): RawRow[] {
    const rows: RawRow[] = [];
    while (this.rest) {
      // Papa's own declaration of `parse` is `any`; this is what its Parser returns.
      const { data, errors, meta } = this.parser.parse(this.rest, 0, !last) as Parsed;
      const faulty = this.firstFault(data, errors);
      let lines = 0;
      for (const cells of faulty === null ? data : data.slice(0, faulty)) {
        // Files that this product wrote carry guards against formulas.
        rows.push({ line: this.line + lines, cells: cells.map(fromFormulaSafe), quoteFault: false });
        lines += linesOf(cells);
      }
      this.line += lines;
      if (faulty !== null) this.rest = this.rest.slice(afterLines(this.rest, lines));
      else this.rest = last ? '' : this.rest.slice(meta.cursor);
      if (faulty !== null || this.rest.length > LONGEST_ROW) rows.push(this.faultyLine());
      else break;
    }
    return rows;
  }

  /** The first row whose quote never closes, or whose wrong quotes reach over lines and may have swallowed others. */
  private firstFault(data: string[][], errors: Parsed['errors']): number | null {
    const found = errors.find(({ type, code, row }) => {
      const cells = row === undefined ? undefined : data[row];
      return type === 'Quotes' && cells !== undefined && (code === 'MissingQuotes' || linesOf(cells) > 1);
    });
    return found?.row ?? null;
  }

  private faultyLine(): RawRow {
    this.faults += 1;
    if (this.faults > MOST_QUOTE_FAULTS)
      throw unreadable(
        `In more than ${countText(MOST_QUOTE_FAULTS)} lines a quotation mark opens and does not close; the last is line ${countText(this.line)}.`,
      );
    const end = afterLines(this.rest, 1);
    const row = { line: this.line, cells: [this.rest.slice(0, end).trimEnd()], quoteFault: true };
    this.rest = this.rest.slice(end);
    this.line += 1;
    return row;
  }
}

const isFilled = ({ cells }: RawRow) => cells.some((cell) => cell.trim() !== '');

/** Rows of a text that is at hand as a whole, empty ones left out. */
export const splitText = (text: string, delimiter: Delimiter): RawRow[] => {
  const splitter = new CsvSplitter(delimiter);
  return [...splitter.push(text), ...splitter.end()].filter(isFilled);
};

/** Rows of a text that comes in pieces, empty ones left out; memory stays flat. */
export async function* csvRows(
  text: AsyncIterable<string>,
  delimiter: Delimiter,
): AsyncGenerator<RawRow[], void, void> {
  const splitter = new CsvSplitter(delimiter);
  for await (const piece of text) {
    const rows = splitter.push(piece).filter(isFilled);
    if (rows.length) yield rows;
  }
  const rows = splitter.end().filter(isFilled);
  if (rows.length) yield rows;
}
