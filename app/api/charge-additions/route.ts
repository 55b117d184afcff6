import { additionSchema, additionsList } from '@/analytics/charge-additions/contract';
import { getAddition, getAdditions } from '@/analytics/charge-additions/query';
import { readCompany, withCompany } from '@/db/client';
import { getRoute, json, jsonBody, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { additionBody } from '@/lib/charge-additions/body';
import { createAddition } from '@/lib/charge-additions/write';
import { idempotencyKeyOf } from '../recoveries/idempotency-key';

/** Charge additions, the newest first. */
export const GET = getRoute(additionsList, (query, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getAdditions(tx, query)),
);

/** Writes down that refrigerant was added: { applianceId, addedOn, addedCharge, massUnit, reason, … }. */
export const POST = withViewer('leaks:write', async (request, viewer) => {
  const key = idempotencyKeyOf(request);
  const { id, replayed } = await createAddition(viewer, await jsonBody(request, additionBody), key);
  const addition = await withCompany(scopeOf(viewer), (tx) => getAddition(tx, id));
  const response = json(additionSchema.parse(addition), 201);
  if (replayed) response.headers.set('idempotency-replayed', 'true');
  return response;
});
