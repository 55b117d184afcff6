import { z } from 'zod';
import { notFound } from '@/lib/errors';

export type IdContext = { params: Promise<{ id: string }> };

/** The id in the address; throws 404 for text that is no id, as for an id that is nobody's. */
export const recordIdOf = async ({ params }: IdContext): Promise<string> => {
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) throw notFound('This record');
  return id.data;
};
