import { json, jsonBody, withViewer } from '@/lib/api/route';
import { readAgainSchema } from '@/lib/imports/contract';
import { readAgain } from '@/lib/imports/store';

/** Reads the kept file again with what the person told about it; changes no record. */
export const POST = withViewer(
  'imports:manage',
  async (request, viewer, { params }: RouteContext<'/api/imports/[id]/preview'>) => {
    const { mapping } = await jsonBody(request, readAgainSchema);
    return json({ id: await readAgain(viewer, (await params).id, { dryRun: true, mapping }) }, 202);
  },
);
