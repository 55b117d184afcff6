import type { Metadata } from 'next';
import { StartScreen } from '@/components/start/start-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Today' };

export default async function StartPage() {
  const { viewer, allowed } = await viewerFor('records:read');
  return allowed ? <StartScreen /> : <NotForRole screen="Today" role={viewer.role} />;
}
