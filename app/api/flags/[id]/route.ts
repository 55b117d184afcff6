import { flagQuery } from '@/analytics/flags/contract';
import { throwBadInput } from '@/lib/api/problem';
import { searchInput, withViewer } from '@/lib/api/route';
import { flagAnswer, flagIdOf } from './flag-answer';

/** One flag, with everything that was decided on it and the other reasons of its record. */
export const GET = withViewer('flags:read', async (request, viewer, context: RouteContext<'/api/flags/[id]'>) => {
  const id = await flagIdOf(context);
  const query = flagQuery.safeParse(searchInput(request.url));
  if (!query.success) return throwBadInput(query.error);
  return flagAnswer(viewer, id, query.data.unit);
});
