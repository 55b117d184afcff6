import type { Metadata } from 'next';
import { TechniciansScreen } from '@/components/technicians/technicians-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Technicians' };

export default async function TechniciansPage() {
  const { viewer, allowed } = await viewerFor('technicians:read');
  return allowed ? <TechniciansScreen /> : <NotForRole screen="Technicians" role={viewer.role} />;
}
