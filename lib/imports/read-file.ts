import type { Mapping } from './contract';
import { headerKeyOfTable, profileTable } from './profile';
import { rowReader } from './row';
import type { FilePlan, OpenFile, ParsedRow, ReadContext } from './rows';
import { openTable, refuseForeign, reopenRows } from './table';

const BATCH = 2_000;

/** Quick check of an upload's first bytes; throws 422 for what is empty, a foreign kind of file or no text. */
export const sniffFile = (firstBytes: Uint8Array, fileName: string): void => refuseForeign(firstBytes, fileName);

/** Identifies the header row of a file, so that what was told for such a file before can be looked up. */
export const headerKeyOfFile = async (open: OpenFile, told: Mapping, context: ReadContext): Promise<string> =>
  headerKeyOfTable(await openTable(open, told, context.fileName), context);

/**
 * Reads the whole file once and decides, column by column, how it is to be read. What the person tells goes before all
 * evidence, evidence before what was told for the same headers before. Open questions stand in `plan.reading.questions`.
 * Throws 422 for what can't be read at all, 400 for a told header that is not there.
 */
export const profileFile = async (
  open: OpenFile,
  told: Mapping,
  remembered: Mapping | null,
  context: ReadContext,
): Promise<FilePlan> => profileTable(await openTable(open, told, context.fileName), told, remembered, context);

/**
 * Reads the rows by the plan, in batches of about 2,000. Every row below the header comes out once, taken or refused with
 * all of its reasons; empty lines are passed over.
 */
export async function* readRows(
  open: OpenFile,
  plan: FilePlan,
  context: ReadContext,
): AsyncGenerator<ParsedRow[], void, void> {
  const read = rowReader(plan.layout, context);
  let batch: ParsedRow[] = [];
  for await (const rows of reopenRows(open, plan.layout)) {
    for (const raw of rows) if (raw.line > plan.layout.headerLine) batch.push(read(raw));
    if (batch.length < BATCH) continue;
    yield batch;
    batch = [];
  }
  if (batch.length) yield batch;
}
