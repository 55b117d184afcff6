import { idOf } from '@/lib/api/id-of';
import { json, withViewer } from '@/lib/api/route';
import { additionUndoSchema } from '@/lib/charge-additions/file/contract';
import { undoAdditionImport } from '@/lib/charge-additions/file/undo';

type Context = RouteContext<'/api/charge-additions/imports/[id]/undo'>;

/** Takes back what a file of additions added or changed. */
export const POST = withViewer('leaks:write', async (_request, viewer, context: Context) => {
  const id = await idOf(context, 'This import');
  return json(additionUndoSchema.parse(await undoAdditionImport(viewer, id)));
});
