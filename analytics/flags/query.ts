import 'server-only';
import { eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { flags } from '@/db/schema/flags';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Flag, FlagsList, FlagsQuery } from './contract';
import { countBorneOut, countOpen, isRenewing } from './counts';
import { writeCursor } from './cursor';
import { flagsInList } from './filters';
import { toFlags } from './items';
import { getFlagRows } from './rows';

/** The scope of a list query, without what it asks besides. */
export const scopeOfQuery = ({
  state: _state,
  rule: _rule,
  recovery: _recovery,
  unit: _unit,
  limit: _limit,
  cursor: _cursor,
  format: _format,
  ...scope
}: FlagsQuery) => scope;

/** One page of the flags in scope, the surest first, with what is open. Throws 400 for a cursor that it did not give. */
export const getFlags = async (tx: Tx, query: FlagsQuery, unit: DisplayUnit): Promise<FlagsList> => {
  const scope = scopeOfQuery(query);
  const rows = await getFlagRows(tx, flagsInList({ ...query, scope }), query.limit + 1);
  const page = rows.slice(0, query.limit);
  const last = page.at(-1);
  return {
    items: await toFlags(tx, page, unit),
    nextCursor: rows.length > query.limit && last ? writeCursor({ certainty: last.place, id: last.id }) : null,
    renewing: await isRenewing(tx),
    open: await countOpen(tx, scope),
    borneOut: await countBorneOut(tx),
  };
};

/** One flag; undefined when the company, or the technician who asks, has none with this id. */
export const getFlag = async (tx: Tx, id: string, unit: DisplayUnit): Promise<Flag | undefined> => {
  const [flag] = await toFlags(tx, await getFlagRows(tx, eq(flags.id, id)), unit);
  return flag;
};
