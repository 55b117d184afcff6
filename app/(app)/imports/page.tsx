import type { Metadata } from 'next';
import { ImportsScreen } from '@/components/imports/imports-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Imports' };

export default async function ImportsPage() {
  const { viewer, allowed } = await viewerFor('imports:manage');
  return allowed ? <ImportsScreen /> : <NotForRole screen="Imports" role={viewer.role} />;
}
