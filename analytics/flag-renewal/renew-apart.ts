import 'server-only';
import { inProcessOfItsOwn } from '@/lib/jobs/own-process';
import { isLongRenewal, type RenewalPayload, renewFlags } from './renew';

const PROCESS = 'analytics/flag-renewal/renewal-process.ts';

/**
 * Renews what is due of a company's flags; a long renewal in a process of its own, because it would keep this one from
 * answering. Throws what went wrong, also there.
 */
export const renewApart = async (payload: RenewalPayload): Promise<void> =>
  (await isLongRenewal(payload)) ? inProcessOfItsOwn(PROCESS, payload.companyId) : renewFlags(payload);
