import 'server-only';
import { z } from 'zod';
import { badInput } from '@/lib/errors';
import { SORTS, type Sort } from './constants';

const cursorSchema = z.strictObject({
  sort: z.enum(SORTS),
  /** The sort value of the row to go on from, as PostgreSQL writes it; null where the record does not state it. */
  value: z.string().max(1000).nullable(),
  id: z.uuid(),
  /** The page before this row instead of the one after it. */
  back: z.boolean(),
});

/** A place in a sorted list: between two rows, whatever is added or taken away around it. */
export type Cursor = z.output<typeof cursorSchema>;

/** The cursor as opaque text for an address. */
export const writeCursor = (cursor: Cursor): string => Buffer.from(JSON.stringify(cursor)).toString('base64url');

const parsed = (text: string): unknown => {
  try {
    return JSON.parse(Buffer.from(text, 'base64url').toString('utf8'));
  } catch {
    return undefined;
  }
};

/** The cursor out of an address; throws 400 when it is not one of ours or belongs to another sort. */
export const readCursor = (text: string, sort: Sort, isValue: (value: string | null) => boolean): Cursor => {
  const cursor = cursorSchema.safeParse(parsed(text));
  if (!cursor.success || !isValue(cursor.data.value))
    throw badInput([{ path: 'cursor', message: 'This is no cursor that the list gave out' }]);
  if (cursor.data.sort !== sort)
    throw badInput([{ path: 'cursor', message: `This cursor belongs to the sort ${cursor.data.sort}` }]);
  return cursor.data;
};
