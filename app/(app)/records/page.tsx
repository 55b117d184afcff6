import type { Metadata } from 'next';
import { RecordsScreen } from '@/components/records/records-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Records' };

export default async function RecordsPage() {
  const { viewer, allowed } = await viewerFor('records:read');
  return allowed ? <RecordsScreen /> : <NotForRole screen="Records" role={viewer.role} />;
}
