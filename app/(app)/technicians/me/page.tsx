import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { PageHead } from '@/components/ui/page-head';
import { requireViewer } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'My work' };

/** Leads whoever is a technician to his own page. */
export default async function MyWorkPage() {
  const viewer = await requireViewer();
  if (viewer.technicianId) redirect(`/technicians/${viewer.technicianId}`);
  return (
    <PageHead
      title="Your account is not linked to a technician yet."
      sub="Somebody who manages the company’s people can link it to the name under which your recoveries are recorded."
    />
  );
}
