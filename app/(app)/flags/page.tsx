import type { Metadata } from 'next';
import { FlagsScreen } from '@/components/flags/flags-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Flags' };

export default async function FlagsPage() {
  const { viewer, allowed } = await viewerFor('flags:read');
  return allowed ? <FlagsScreen /> : <NotForRole screen="Flags" role={viewer.role} />;
}
