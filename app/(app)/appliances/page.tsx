import type { Metadata } from 'next';
import { AppliancesScreen } from '@/components/appliances/appliances-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Appliances' };

export default async function AppliancesPage() {
  const { viewer, allowed } = await viewerFor('appliances:read');
  return allowed ? <AppliancesScreen /> : <NotForRole screen="Appliances" role={viewer.role} />;
}
