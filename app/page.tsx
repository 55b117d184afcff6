import { redirect } from 'next/navigation';
import { startPath } from '@/components/shell/screens';
import { requireViewer } from '@/lib/auth/current-viewer';
import { PERMISSIONS } from '@/lib/auth/permissions';

/** Leads to where the viewer's role begins. */
export default async function Home() {
  const viewer = await requireViewer();
  redirect(startPath(PERMISSIONS[viewer.role]));
}
