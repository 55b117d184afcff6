import 'server-only';
import { z } from 'zod';
import { companySuspicion } from '@/analytics/leak-suspicion/company';
import { compareTechnicians } from '@/analytics/technician-comparison/compare-technicians';
import { readCompanyJob, withCompanyJob } from '@/db/client';
import { inProcessOfItsOwn } from '@/lib/jobs/own-process';
import { hasManyRecords, readRecords } from './read';
import { writeDigest } from './write';

const ACTOR = 'digest of records';
const PROCESS = 'analytics/record-digest/digest-process.ts';

export const digestPayload = z.object({ companyId: z.uuid() });
export type DigestPayload = z.output<typeof digestPayload>;

/**
 * Works out what follows from all of a company's records: which units are suspected to leak, and how technicians compare.
 * Read at one moment and written at another, so that no lock is held while it computes.
 */
export const digestRecords = async ({ companyId }: DigestPayload): Promise<void> => {
  const scope = { companyId, actor: ACTOR };
  const { revision, pulled, compared } = await readCompanyJob(scope, (tx) => readRecords(tx, companyId));
  const digest = { revision, suspicion: companySuspicion(pulled), comparison: compareTechnicians(compared) };
  await withCompanyJob(scope, (tx) => writeDigest(tx, companyId, digest));
};

/** The same; of many records in a process of its own, because it would keep this one from answering. */
export const digestApart = async (payload: DigestPayload): Promise<void> => {
  const { companyId } = payload;
  const isLong = await readCompanyJob({ companyId, actor: ACTOR }, hasManyRecords);
  await (isLong ? inProcessOfItsOwn(PROCESS, companyId) : digestRecords(payload));
};
