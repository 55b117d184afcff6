import type { Metadata } from 'next';
import { LowRecoveriesScreen } from '@/components/low-recoveries/low-recoveries-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Low recoveries' };

export default async function LowRecoveriesPage() {
  const { viewer, allowed } = await viewerFor('flags:read');
  return allowed ? <LowRecoveriesScreen /> : <NotForRole screen="Low recoveries" role={viewer.role} />;
}
