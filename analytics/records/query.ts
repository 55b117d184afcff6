import 'server-only';
import { and, inArray, isNotNull, type SQL, sql } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { middleYields } from '@/db/schema/summaries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { RecordList, RecordListQuery } from './contract';
import { writeCursor } from './cursor';
import { recordsInList } from './filters';
import { keysetOf } from './keyset';
import { rowColumns, toRow } from './row';

const count = async (tx: Tx, condition: SQL | undefined): Promise<number> => {
  const [row] = await tx
    .select({ total: sql<number>`count(*)`.mapWith(Number) })
    .from(f)
    .where(condition);
  return row?.total ?? 0;
};

/**
 * How many records the query means, pages aside. How many count in figures stands ready, and only who sees them all sees
 * that; the ones left out are few.
 */
const countRecords = async (tx: Tx, query: RecordListQuery): Promise<number> => {
  const condition = recordsInList(query);
  if (condition) return count(tx, condition);
  const [counted] = await tx.select({ records: middleYields.records }).from(middleYields);
  return counted ? counted.records + (await count(tx, isNotNull(f.exclusion))) : count(tx, undefined);
};

/** Up to so many records a search holds by their ids; more lie so close that a page of them is soon together. */
const FEW = 1_000;

/**
 * Which records the query means, and how many, pages aside. The few that a search finds are found once and then fetched
 * by their ids: a page in its order would look at every record until it had them together.
 */
const recordsMeant = async (
  tx: Tx,
  query: RecordListQuery,
): Promise<{ where: SQL | undefined; total: () => Promise<number> }> => {
  const where = recordsInList(query);
  const many = { where, total: () => countRecords(tx, query) };
  if (!query.q) return many;
  const found = await tx
    .select({ id: f.id })
    .from(f)
    .where(where)
    .limit(FEW + 1);
  if (found.length > FEW) return many;
  const ids = found.map(({ id }) => id);
  return { where: ids.length ? inArray(f.id, ids) : sql`false`, total: async () => ids.length };
};

/** One page of the records in scope, with the cursors of its neighbours; throws 400 on a forged cursor. */
export const getRecords = async (tx: Tx, query: RecordListQuery): Promise<RecordList> => {
  const { sort, limit, cursor } = query;
  const keyset = keysetOf(sort, cursor);
  const { where, total } = await recordsMeant(tx, query);
  const fetched = await tx
    .select({ ...rowColumns, sortText: keyset.sortText })
    .from(f)
    .where(and(where, keyset.after))
    .orderBy(keyset.orderBy)
    .limit(limit + 1);
  const page = fetched.slice(0, limit);
  if (keyset.back) page.reverse();
  const more = fetched.length > limit;
  const place = (row: (typeof page)[number] | undefined, back: boolean) =>
    row ? writeCursor({ sort, value: row.sortText, id: row.id, back }) : null;
  return {
    items: page.map(({ sortText: _, ...row }) => toRow(row)),
    nextCursor: more || keyset.back ? place(page.at(-1), false) : null,
    previousCursor: (keyset.back ? more : cursor !== undefined) ? place(page[0], true) : null,
    ...(cursor === undefined ? { total: await total() } : {}),
  };
};
