import { z } from 'zod';
import { json, withViewer } from '@/lib/api/route';
import { additionUndoSchema } from '@/lib/charge-additions/file/contract';
import { undoAdditionImport } from '@/lib/charge-additions/file/undo';
import { notFound } from '@/lib/errors';

type Context = RouteContext<'/api/charge-additions/imports/[id]/undo'>;

/** Takes back what a file of additions added or changed. */
export const POST = withViewer('leaks:write', async (_request, viewer, { params }: Context) => {
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) throw notFound('This import');
  return json(additionUndoSchema.parse(await undoAdditionImport(viewer, id.data)));
});
