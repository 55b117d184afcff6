import type { Metadata } from 'next';
import { TrendsScreen } from '@/components/trends/trends-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Trends' };

export default async function TrendsPage() {
  const { viewer, allowed } = await viewerFor('trends:read');
  return allowed ? <TrendsScreen /> : <NotForRole screen="Trends" role={viewer.role} />;
}
