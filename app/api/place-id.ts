import { z } from 'zod';
import { notFound } from '@/lib/errors';

/** The id in the address of a site or an appliance; throws 404 for what is no id, as for what is not there. */
export const placeIdOf = async (params: Promise<{ id: string }>, what: string): Promise<string> => {
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) throw notFound(what);
  return id.data;
};
