import { rowsAs } from './as-role';

type Row = Record<string, unknown>;
export type HistoryEntry = {
  entry_no: string;
  row_id: string;
  action: string;
  actor: string;
  reason: string | null;
  before: Row | null;
  after: Row | null;
};

/** Entries of one table and kind, in order, as the server role reads them. */
export const entriesOf = (companyId: string, table: string, action: string): Promise<HistoryEntry[]> =>
  rowsAs<HistoryEntry>(
    'server',
    { company_id: companyId },
    'select * from history where table_name = $1 and action = $2 order by entry_no',
    [table, action],
  );

/** Number of the first entry at which the chain is broken, or null when it is whole. */
export const firstBroken = async (companyId: string): Promise<number | null> => {
  const [row] = await rowsAs<{ entry: string | null }>(
    'server',
    { company_id: companyId },
    'select history_break() as entry',
  );
  return row?.entry == null ? null : Number(row.entry);
};
