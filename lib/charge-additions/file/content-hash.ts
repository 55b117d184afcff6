import { createHash } from 'node:crypto';
import type { AdditionReason } from '@/lib/vocabulary';

/** What an addition says, apart from how it was written. */
export type AdditionContent = {
  applianceId: string;
  addedOn: string;
  /** Decimal kilograms with nine decimals, as the database gives them. */
  addedChargeKg: string;
  reason: AdditionReason;
  leaksVerifiedOn: string | null;
  notes: string | null;
};

/**
 * Fingerprint of what an addition says: the same one in another spelling or unit has the same. An addition whose own
 * fingerprint is no longer the one it was imported with was corrected by hand.
 */
export const contentHash = (content: AdditionContent): string => {
  const { applianceId, addedOn, addedChargeKg, reason, leaksVerifiedOn, notes } = content;
  return createHash('sha256')
    .update(JSON.stringify([applianceId, addedOn, addedChargeKg, reason, leaksVerifiedOn, notes]))
    .digest('base64url');
};
