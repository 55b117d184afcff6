import { recordHistorySchema } from '@/analytics/records/contract';
import { withCompany } from '@/db/client';
import { json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { notFound } from '@/lib/errors';
import { getHistory } from '@/lib/recoveries/history';
import { getStored } from '@/lib/recoveries/stored';
import { type IdContext, recordIdOf } from '../record-id';

/** Every change of a record, newest first. Who may not see the record sees no history of it. */
export const GET = withViewer('records:read', async (_request, viewer, context: IdContext) => {
  const id = await recordIdOf(context);
  const items = await withCompany(scopeOf(viewer), async (tx) =>
    (await getStored(tx, id, viewer.timeZone)) ? getHistory(tx, id, viewer.timeZone) : null,
  );
  if (!items) throw notFound('This record');
  return json(recordHistorySchema.parse({ items }));
});
