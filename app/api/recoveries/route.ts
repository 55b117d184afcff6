import { recordListContract } from '@/analytics/records/contract';
import { getRecords } from '@/analytics/records/query';
import { getRecord } from '@/analytics/records/record-query';
import { withCompany } from '@/db/client';
import { keptJson } from '@/lib/api/kept-response';
import { throwBadInput } from '@/lib/api/problem';
import { json, jsonBody, searchInput, withViewer } from '@/lib/api/route';
import { may } from '@/lib/auth/permissions';
import { scopeOf } from '@/lib/auth/viewer';
import { forbidden } from '@/lib/errors';
import { recordBody } from '@/lib/recoveries/body';
import { createRecovery } from '@/lib/recoveries/create';
import { csvResponse } from './csv-response';
import { idempotencyKeyOf } from './idempotency-key';

/** One page of the records in scope, or with `format=csv` all of them as a recovery file. */
export const GET = withViewer(recordListContract.action, async (request, viewer) => {
  const query = recordListContract.query.safeParse(searchInput(request.url));
  if (!query.success) return throwBadInput(query.error);
  if (query.data.flagged && !may(viewer.role, 'flags:read')) throw forbidden();
  if (query.data.likeJobs && !may(viewer.role, 'flags:decide')) throw forbidden();
  if (query.data.format === 'csv') {
    if (!may(viewer.role, 'records:export')) throw forbidden();
    return csvResponse(viewer, query.data);
  }
  const compute = async () =>
    recordListContract.response.parse(await withCompany(scopeOf(viewer), (tx) => getRecords(tx, query.data)));
  return keptJson(request, viewer, `${recordListContract.path} ${JSON.stringify(query.data)}`, compute);
});

/** Writes a new record; the same Idempotency-Key gives the record that it wrote before. */
export const POST = withViewer('records:write', async (request, viewer) => {
  const key = idempotencyKeyOf(request);
  const { id, replayed } = await createRecovery(viewer, await jsonBody(request, recordBody), key);
  const record = await withCompany(scopeOf(viewer), (tx) => getRecord(tx, id, viewer.timeZone));
  const response = json(record, 201);
  response.headers.set('location', `/api/recoveries/${id}`);
  if (replayed) response.headers.set('idempotency-replayed', 'true');
  return response;
});
