import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { getSiteHistory } from '@/analytics/visits/query';
import { NotForRole } from '@/components/ui/not-for-role';
import { SiteScreen } from '@/components/visits/site-screen';
import { readCompany } from '@/db/client';
import { viewerFor } from '@/lib/auth/current-viewer';
import { scopeOf } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Site' };

export default async function SitePage({ params }: PageProps<'/sites/[id]'>) {
  const { viewer, allowed } = await viewerFor('sites:read');
  if (!allowed) return <NotForRole screen="Sites" role={viewer.role} />;
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) notFound();
  const history = await readCompany(scopeOf(viewer), (tx) => getSiteHistory(tx, id.data));
  if (!history) notFound();
  return <SiteScreen history={history} />;
}
