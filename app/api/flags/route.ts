import { flagsList } from '@/analytics/flags/contract';
import { exportFlags } from '@/analytics/flags/csv';
import { getFlags } from '@/analytics/flags/query';
import { readCompany } from '@/db/client';
import { throwBadInput } from '@/lib/api/problem';
import { json, searchInput, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { todayIn } from '@/lib/recoveries/local-time';

/** One page of the flags of the records in scope, the surest first, or with `format=csv` all of them as a file. */
export const GET = withViewer(flagsList.action, async (request, viewer) => {
  const query = flagsList.query.safeParse(searchInput(request.url));
  if (!query.success) return throwBadInput(query.error);
  const unit = query.data.unit ?? viewer.massUnit;
  if (query.data.format === 'json')
    return json(flagsList.response.parse(await readCompany(scopeOf(viewer), (tx) => getFlags(tx, query.data, unit))));
  const file = await readCompany(scopeOf(viewer), (tx) => exportFlags(tx, query.data, unit));
  return new Response(file, {
    headers: {
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': `attachment; filename="flags ${todayIn(viewer.timeZone)}.csv"`,
      'cache-control': 'private, no-store',
    },
  });
});
