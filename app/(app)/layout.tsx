import type { ReactNode } from 'react';
import { Shell } from '@/components/shell/shell';
import { ViewerProvider, type ViewerSummary } from '@/components/viewer-context';
import { requireViewer } from '@/lib/auth/current-viewer';
import { PERMISSIONS } from '@/lib/auth/permissions';
import type { Viewer } from '@/lib/auth/viewer';
import { switchToCompany } from './actions';

const summaryOf = (viewer: Viewer): ViewerSummary => ({
  name: viewer.name,
  role: viewer.role,
  companyId: viewer.companyId,
  companyName: viewer.companyName,
  timeZone: viewer.timeZone,
  massUnit: viewer.massUnit,
  memberships:
    viewer.kind === 'person'
      ? viewer.memberships.map(({ companyId, companyName }) => ({ companyId, companyName }))
      : [],
  allowed: PERMISSIONS[viewer.role],
});

export default async function AppLayout({ children }: { children: ReactNode }) {
  const viewer = await requireViewer();
  return (
    <ViewerProvider viewer={summaryOf(viewer)}>
      <Shell companyName={viewer.companyName} switchCompany={switchToCompany}>
        {children}
      </Shell>
    </ViewerProvider>
  );
}
