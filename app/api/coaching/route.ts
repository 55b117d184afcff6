import { coachingList, coachingSchema } from '@/analytics/coaching/contract';
import { getCoaching, getCoachings } from '@/analytics/coaching/query';
import { readCompany, withCompany } from '@/db/client';
import { getRoute, json, jsonBody, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { coachingBody } from '@/lib/coaching/body';
import { createCoaching } from '@/lib/coaching/write';

/** The coachings of a technician. */
export const GET = getRoute(coachingList, (query, viewer) =>
  readCompany(scopeOf(viewer), (tx) => getCoachings(tx, query)),
);

/** Writes down what was agreed: { technicianId, startedOn, plan }. */
export const POST = withViewer('coaching:write', async (request, viewer) => {
  const id = await createCoaching(viewer, await jsonBody(request, coachingBody));
  const coaching = await withCompany(scopeOf(viewer), (tx) => getCoaching(tx, id));
  return json(coachingSchema.parse(coaching), 201);
});
