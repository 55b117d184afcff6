import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { PersonScreen } from '@/components/technicians/person/person-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Technician' };

export default async function TechnicianPage({ params }: PageProps<'/technicians/[id]'>) {
  const { viewer, allowed } = await viewerFor('technician:read');
  if (!allowed) return <NotForRole screen="Technicians" role={viewer.role} />;
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) notFound();
  if (viewer.role === 'technician' && viewer.technicianId !== id.data) notFound();
  const today = new Date().toLocaleDateString('sv-SE', { timeZone: viewer.timeZone });
  return <PersonScreen technicianId={id.data} today={today} />;
}
