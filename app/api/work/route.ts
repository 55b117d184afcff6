import { sql } from 'drizzle-orm';
import { withCompany } from '@/db/client';
import { json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

/** How much background work of the company is still waiting or under way. */
export const GET = withViewer('records:read', async (_request, viewer) => {
  const pending = await withCompany(scopeOf(viewer), (tx) =>
    tx.execute<{ pending: string }>(sql`select work.pending() as pending`),
  );
  return json({ pending: Number(pending.rows[0]?.pending ?? 0) });
});
