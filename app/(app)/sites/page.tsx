import type { Metadata } from 'next';
import { SitesScreen } from '@/components/sites/sites-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Sites' };

export default async function SitesPage() {
  const { viewer, allowed } = await viewerFor('sites:read');
  return allowed ? <SitesScreen /> : <NotForRole screen="Sites" role={viewer.role} />;
}
