import { json, withViewer } from '@/lib/api/route';
import { undoAndWait } from '@/lib/imports/undo';
import { toImportView } from '@/lib/imports/view';

/** Takes back what an import added or changed; 202 when it takes longer than a request may wait. */
export const POST = withViewer(
  'imports:manage',
  async (_request, viewer, { params }: RouteContext<'/api/imports/[id]/undo'>) => {
    const record = await undoAndWait(viewer, (await params).id);
    return json(toImportView(record), record.status === 'undone' ? 200 : 202);
  },
);
