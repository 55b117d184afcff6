import { json, jsonBody, withViewer } from '@/lib/api/route';
import { readAgainSchema } from '@/lib/imports/contract';
import { readAgain } from '@/lib/imports/store';

/** Takes a previewed file in. */
export const POST = withViewer(
  'imports:manage',
  async (request, viewer, { params }: RouteContext<'/api/imports/[id]/apply'>) => {
    const empty = request.headers.get('content-length') === '0' || request.body === null;
    const { mapping } = empty ? {} : await jsonBody(request, readAgainSchema);
    return json({ id: await readAgain(viewer, (await params).id, { dryRun: false, mapping }) }, 202);
  },
);
