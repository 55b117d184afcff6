import { z } from 'zod';
import { badInput } from '@/lib/errors';
import type { LowOrder } from './orders';

/** What a row is ordered by, as PostgreSQL writes it: nothing it could not read back may reach the query. */
const VALUES = {
  extreme: z.string().regex(/^(Infinity|-?\d{1,20}(\.\d{1,20})?(e[-+]\d{1,2})?)$/),
  newest: z.iso.date(),
} satisfies Record<LowOrder, z.ZodType<string>>;

/** The last row of a page: its place in the order and its id. */
export type LowCursor = { value: string; id: string };

/** An opaque word for the place after a row. */
export const writeCursor = (order: LowOrder, { value, id }: LowCursor): string =>
  Buffer.from(JSON.stringify([order, value, id])).toString('base64url');

const decoded = (cursor: string): unknown => {
  try {
    return JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
  } catch {
    return null;
  }
};

/** The place a cursor means; throws 400 for what is no cursor of this order. */
export const readCursor = (order: LowOrder, cursor: string): LowCursor => {
  const known = z.tuple([z.literal(order), VALUES[order], z.uuid()]).safeParse(decoded(cursor));
  if (!known.success)
    throw badInput([{ path: 'cursor', message: 'Expected a nextCursor of this list in the same order' }]);
  const [, value, id] = known.data;
  return { value, id };
};
