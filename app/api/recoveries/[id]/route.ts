import { recordSchema } from '@/analytics/records/contract';
import { getRecord } from '@/analytics/records/record-query';
import { withCompany } from '@/db/client';
import { json, jsonBody, withViewer } from '@/lib/api/route';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { notFound } from '@/lib/errors';
import { correctionBody } from '@/lib/recoveries/body';
import { correctRecovery } from '@/lib/recoveries/correct';
import { type IdContext, recordIdOf } from './record-id';

const answer = async (viewer: Viewer, id: string): Promise<Response> => {
  const record = await withCompany(scopeOf(viewer), (tx) => getRecord(tx, id, viewer.timeZone));
  if (!record) throw notFound('This record');
  return json(recordSchema.parse(record));
};

/** Everything one record says. */
export const GET = withViewer('records:read', async (_request, viewer, context: IdContext) =>
  answer(viewer, await recordIdOf(context)),
);

/** Corrects a record: { version, reason, changes }. */
export const PATCH = withViewer('records:write', async (request, viewer, context: IdContext) => {
  const id = await recordIdOf(context);
  await correctRecovery(viewer, id, await jsonBody(request, correctionBody));
  return answer(viewer, id);
});
