import { withCompany } from '@/db/client';
import { defineContract } from '@/lib/api/contract';
import { getRoute, json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { importListSchema } from '@/lib/imports/contract';
import { withReceivedForm } from '@/lib/imports/multipart';
import { createImport } from '@/lib/imports/store';
import { importListQuery, listImports } from '@/lib/imports/view';

export const dynamic = 'force-dynamic';

const list = defineContract({
  path: '/api/imports',
  action: 'imports:manage',
  query: importListQuery,
  response: importListSchema,
});

/** The company's imports, newest first. */
export const GET = getRoute(list, (query, viewer) => withCompany(scopeOf(viewer), (tx) => listImports(tx, query)));

/** Takes a file and promises to work on it: once this has answered, no crash loses it. */
export const POST = withViewer('imports:manage', (request, viewer) =>
  withReceivedForm(request, async (form) =>
    json({ id: await createImport(viewer, form, request.headers.get('idempotency-key')) }, 202),
  ),
);
