import type { Metadata } from 'next';
import { ImportScreen } from '@/components/imports/import-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Import' };

export default async function ImportPage({ params }: PageProps<'/imports/[id]'>) {
  const { viewer, allowed } = await viewerFor('imports:manage');
  if (!allowed) return <NotForRole screen="Imports" role={viewer.role} />;
  return <ImportScreen id={(await params).id} />;
}
