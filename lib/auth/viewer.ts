import type { DisplayUnit, Role } from '@/lib/vocabulary';

/** One company somebody belongs to, and as what. */
export type Membership = {
  companyId: string;
  companyName: string;
  role: Role;
  /** Set for a technician: transactions opened for this viewer show only his records. */
  technicianId: string | null;
  timeZone: string;
  massUnit: DisplayUnit;
};

/** Who is asking: a person with a session, or a program with an access token. `actor` stands in the history. */
export type Viewer = Membership &
  (
    | { kind: 'person'; actor: string; name: string; email: string; memberships: Membership[] }
    | { kind: 'program'; actor: string; name: string }
  );

/**
 * A viewer as he was found when he asked, with the last number of his company's history at that moment: it grows with
 * every change that an analytic answer could show.
 */
export type AskingViewer = Viewer & { revision: number };

/** The scope with which a viewer's transactions are opened; a technician without a record of his own sees none. */
export const scopeOf = (viewer: Viewer, reason?: string) => ({
  companyId: viewer.companyId,
  actor: viewer.actor,
  technicianId: viewer.role === 'technician' ? (viewer.technicianId ?? NOBODY) : null,
  ...(reason ? { reason } : {}),
});

/** An id no row has: a technician's account that is not linked yet. */
const NOBODY = '00000000-0000-0000-0000-000000000000';
