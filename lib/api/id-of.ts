import 'server-only';
import { z } from 'zod';
import { notFound } from '@/lib/errors';

/** The id in an address; throws 404 for text that is no id, as for an id that is nobody's. */
export const idOf = async ({ params }: { params: Promise<{ id: string }> }, what: string): Promise<string> => {
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) throw notFound(what);
  return id.data;
};
