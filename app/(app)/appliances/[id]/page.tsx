import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { getApplianceHistory } from '@/analytics/visits/query';
import { NotForRole } from '@/components/ui/not-for-role';
import { ApplianceScreen } from '@/components/visits/appliance-screen';
import { readCompany } from '@/db/client';
import { viewerFor } from '@/lib/auth/current-viewer';
import { scopeOf } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Appliance' };

export default async function AppliancePage({ params }: PageProps<'/appliances/[id]'>) {
  const { viewer, allowed } = await viewerFor('appliances:read');
  if (!allowed) return <NotForRole screen="Appliances" role={viewer.role} />;
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) notFound();
  const history = await readCompany(scopeOf(viewer), (tx) => getApplianceHistory(tx, id.data));
  if (!history) notFound();
  return <ApplianceScreen history={history} />;
}
