import { z } from 'zod';
import { badInput } from '@/lib/errors';

/** The last flag of a page: its certainty, as PostgreSQL writes it, and its id. */
export type FlagCursor = { certainty: string; id: string };

const cursorSchema = z.tuple([
  z.literal('flags'),
  z.string().regex(/^[01](\.\d{1,20})?(e-\d{1,3})?$|^\d\.\d{1,20}e-\d{1,3}$/),
  z.uuid(),
]);

/** An opaque word for the place after a flag. */
export const writeCursor = ({ certainty, id }: FlagCursor): string =>
  Buffer.from(JSON.stringify(['flags', certainty, id])).toString('base64url');

const decoded = (cursor: string): unknown => {
  try {
    return JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
  } catch {
    return null;
  }
};

/** The place a cursor means; throws 400 for what is no cursor of this list. */
export const readCursor = (cursor: string): FlagCursor => {
  const known = cursorSchema.safeParse(decoded(cursor));
  if (!known.success) throw badInput([{ path: 'cursor', message: 'Expected a nextCursor of this list' }]);
  const [, certainty, id] = known.data;
  return { certainty, id };
};
