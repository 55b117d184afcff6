import { withCompany } from '@/db/client';
import { json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { requireImport, toImportView } from '@/lib/imports/view';

export const dynamic = 'force-dynamic';

/** How far an import is, how the file was read and what came of it. */
export const GET = withViewer(
  'imports:manage',
  async (_request, viewer, { params }: RouteContext<'/api/imports/[id]'>) => {
    const { id } = await params;
    return json(toImportView(await withCompany(scopeOf(viewer), (tx) => requireImport(tx, id))));
  },
);
