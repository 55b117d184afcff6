import type { RowReason } from '@/lib/imports/rows';
import { contentHash } from './content-hash';
import type { RefusedRow } from './read';
import type { AdditionRow } from './row';

/** An addition that is on record under a ref. */
export type KnownAddition = { id: string; sourceHash: string | null; correctedByHand: boolean };

export type DecidedRow = { row: AdditionRow; applianceId: string; sourceHash: string };
export type Decided = {
  added: DecidedRow[];
  updated: (DecidedRow & { id: string })[];
  unchanged: number;
  refused: RefusedRow[];
};

type Read = { line: number; cells: string[]; row: AdditionRow };

/** What two spellings of one name share, as the database's name_key does. */
export const nameKeyOf = (name: string): string => name.normalize('NFC').replace(/\s+/g, ' ').trim().toLowerCase();

export const applianceKey = (site: string, appliance: string): string =>
  JSON.stringify([nameKeyOf(site), nameKeyOf(appliance)]);

const reason = (column: string, code: string, message: string, value: string): RowReason => ({
  column,
  code,
  message,
  value,
});

const refusal = ({ line, cells, row }: Read, why: RowReason): RefusedRow => ({
  line,
  cells,
  additionRef: row.additionRef,
  reasons: [why],
});

/**
 * What becomes of each row: new, changed, as it was, or refused, because its appliance is not known, its ref stands twice
 * in the file with different words, or the addition was corrected by hand since.
 */
export const decideRows = (
  rows: readonly Read[],
  appliances: ReadonlyMap<string, string>,
  known: ReadonlyMap<string, KnownAddition>,
): Decided => {
  const decided: Decided = { added: [], updated: [], unchanged: 0, refused: [] };
  const inFile = new Map<string, { sourceHash: string; line: number }>();
  for (const read of rows) {
    const { row, line } = read;
    const applianceId = appliances.get(applianceKey(row.site, row.appliance));
    if (!applianceId) {
      const message = `No appliance “${row.appliance}” is on record at a site “${row.site}”.`;
      decided.refused.push(refusal(read, reason('appliance', 'unknown_appliance', message, row.appliance)));
      continue;
    }
    const sourceHash = contentHash({ ...row, applianceId });
    const twin = inFile.get(row.additionRef);
    if (twin && twin.sourceHash !== sourceHash) {
      const message = `Line ${twin.line} has the same ref and says something else.`;
      decided.refused.push(refusal(read, reason('addition_ref', 'doubled_ref', message, row.additionRef)));
      continue;
    }
    const before = known.get(row.additionRef);
    inFile.set(row.additionRef, { sourceHash, line });
    if (twin || before?.sourceHash === sourceHash) decided.unchanged += 1;
    else if (!before) decided.added.push({ row, applianceId, sourceHash });
    else if (before.correctedByHand) {
      const message = 'This addition was corrected by hand since, and the file says something else. Correct it there.';
      decided.refused.push(refusal(read, reason('addition_ref', 'corrected_by_hand', message, row.additionRef)));
    } else decided.updated.push({ row, applianceId, sourceHash, id: before.id });
  }
  return decided;
};
