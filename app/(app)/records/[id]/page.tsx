import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { getRecord } from '@/analytics/records/record-query';
import { RecordScreen } from '@/components/records/record-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { withCompany } from '@/db/client';
import { viewerFor } from '@/lib/auth/current-viewer';
import { scopeOf } from '@/lib/auth/viewer';
import { getHistory } from '@/lib/recoveries/history';

export const metadata: Metadata = { title: 'Record' };

export default async function RecordPage({ params }: PageProps<'/records/[id]'>) {
  const { viewer, allowed } = await viewerFor('records:read');
  if (!allowed) return <NotForRole screen="Records" role={viewer.role} />;
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) notFound();
  const found = await withCompany(scopeOf(viewer), async (tx) => {
    const record = await getRecord(tx, id.data, viewer.timeZone);
    return record && { record, history: await getHistory(tx, id.data, viewer.timeZone) };
  });
  if (!found) notFound();
  return <RecordScreen {...found} />;
}
