import type { Metadata } from 'next';
import { HowWeJudgeScreen } from '@/components/how-we-judge/how-we-judge-screen';
import { NotForRole } from '@/components/ui/not-for-role';
import { viewerFor } from '@/lib/auth/current-viewer';

export const metadata: Metadata = { title: 'How we judge' };

export default async function HowWeJudgePage() {
  const { viewer, allowed } = await viewerFor('records:read');
  return allowed ? <HowWeJudgeScreen /> : <NotForRole screen="How we judge" role={viewer.role} />;
}
