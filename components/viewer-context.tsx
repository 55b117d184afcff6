'use client';

import { createContext, type ReactNode, useContext } from 'react';
import type { Action } from '@/lib/auth/permissions';
import type { DisplayUnit, Role } from '@/lib/vocabulary';

/** What the browser may know about who is looking. The server decides what is allowed; this only hides what would be refused. */
export type ViewerSummary = {
  name: string;
  role: Role;
  companyId: string;
  companyName: string;
  timeZone: string;
  massUnit: DisplayUnit;
  memberships: { companyId: string; companyName: string }[];
  allowed: readonly Action[];
};

const ViewerContext = createContext<ViewerSummary | null>(null);

export const ViewerProvider = ({ viewer, children }: { viewer: ViewerSummary; children: ReactNode }) => (
  <ViewerContext value={viewer}>{children}</ViewerContext>
);

/** Who is looking; throws outside of the signed-in pages. */
export const useViewer = (): ViewerSummary => {
  const viewer = useContext(ViewerContext);
  if (!viewer) throw new Error('useViewer stands outside of the signed-in pages.');
  return viewer;
};

/** Whether the viewer's role includes an action. */
export const useMay = (action: Action): boolean => useViewer().allowed.includes(action);
