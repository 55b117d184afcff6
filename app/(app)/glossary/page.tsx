import type { Metadata } from 'next';
import { GlossaryScreen } from '@/components/glossary/glossary-screen';
import { requireViewer } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'Glossary' };

export default async function GlossaryPage() {
  await requireViewer();
  return <GlossaryScreen />;
}
