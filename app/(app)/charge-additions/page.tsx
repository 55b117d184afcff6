import type { Metadata } from 'next';
import { ChargeAdditionsScreen } from '@/components/charge-additions/charge-additions-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Charge additions' };

export default async function ChargeAdditionsPage() {
  const { viewer, allowed } = await viewerFor('leaks:read');
  return allowed ? <ChargeAdditionsScreen /> : <NotForRole screen="Charge additions" role={viewer.role} />;
}
