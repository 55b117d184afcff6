import 'server-only';
import { type SQL, sql } from 'drizzle-orm';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { isDay } from '@/lib/calendar';
import { readSort, type Sort } from './constants';
import { type Cursor, readCursor } from './cursor';
import { SORT_COLUMNS, type SortColumn } from './sort-columns';

/** Order and starting point of one page. `back` reads towards the beginning: its rows come in reverse. */
export type Keyset = { orderBy: SQL; after: SQL | undefined; sortText: SQL.Aliased<string | null>; back: boolean };

const IS_TYPE: Record<SortColumn['type'], (value: string) => boolean> = {
  date: isDay,
  text: (value) => !value.includes('\0'),
  numeric: (value) => /^\d{1,12}(\.\d{1,12})?$/.test(value),
  // Exponents of two digits: PostgreSQL refuses what a float8 can't hold.
  float8: (value) => /^\d{1,12}(\.\d{1,20})?(e[-+]\d{1,2})?$/.test(value),
};

const isValueOf =
  (column: SortColumn) =>
  (value: string | null): boolean =>
    value === null ? column.nullable : IS_TYPE[column.type](value);

// Records that do not state the value stand last in both directions, among themselves by id.
const afterPlace = (column: SortColumn, { value, id }: Cursor, forward: boolean, nullsLast: boolean): SQL => {
  const beyond = sql.raw(forward ? '>' : '<');
  const place = sql`${value}::${sql.raw(column.type)}`;
  if (!column.nullable) return sql`(${column.value}, ${f.id}) ${beyond} (${place}, ${id}::uuid)`;
  // The same as IS NULL, which the planner takes for next to never behind an outer join, and then loops.
  const blank = sql`num_nonnulls(${column.value}) <> 1`;
  const alsoBlank = sql`(${blank} and ${f.id} ${beyond} ${id}::uuid)`;
  if (value === null) return nullsLast ? alsoBlank : sql`(${alsoBlank} or ${column.value} is not null)`;
  const stated = sql`(${column.value}, ${f.id}) ${beyond} (${place}, ${id}::uuid)`;
  return nullsLast ? sql`(${stated} or ${blank})` : stated;
};

/** How to read one page in a sort, from a cursor of the list or from the beginning; throws 400 on a forged cursor. */
export const keysetOf = (sort: Sort, cursorText?: string): Keyset => {
  const { key, descending } = readSort(sort);
  const column = SORT_COLUMNS[key];
  const cursor = cursorText === undefined ? null : readCursor(cursorText, sort, isValueOf(column));
  const back = cursor?.back ?? false;
  const forward = descending === back;
  const direction = sql.raw(forward ? 'asc' : 'desc');
  const nulls = column.nullable ? sql.raw(back ? ' nulls first' : ' nulls last') : sql``;
  return {
    orderBy: sql`${column.value} ${direction}${nulls}, ${f.id} ${direction}`,
    after: cursor ? afterPlace(column, cursor, forward, !back) : undefined,
    sortText: sql<string | null>`${column.value}::text`.as('sort_text'),
    back,
  };
};
