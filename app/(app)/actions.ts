'use server';

import { currentSessionToken, requireViewer } from '@/lib/auth/current-viewer';
import { switchCompany } from '@/lib/auth/sessions';

/** Moves this session to another of the person's companies; false when he does not belong to it. */
export const switchToCompany = async (companyId: string): Promise<boolean> => {
  const viewer = await requireViewer();
  const token = await currentSessionToken();
  const known = viewer.kind === 'person' && viewer.memberships.some((membership) => membership.companyId === companyId);
  return known && token !== null && switchCompany(token, viewer.actor, companyId);
};
