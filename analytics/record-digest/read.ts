import 'server-only';
import { eq, sql } from 'drizzle-orm';
import { getPulledRecords, type PulledAtSite } from '@/analytics/leak-suspicion/query';
import type { ComparedRecovery } from '@/analytics/technician-comparison/recovery';
import { readComparedRecoveries } from '@/analytics/technicians/compared-rows';
import type { Tx } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { recoveries } from '@/db/schema/recoveries';
import { readRevision } from './revision';

/** Working through so many records keeps a processor busy for longer than people should wait for a page. */
const MANY_RECORDS = 2_000;

/** What a digest is made from, all as it stood at one moment. */
export type DigestedRecords = { revision: number; pulled: PulledAtSite[]; compared: ComparedRecovery[] };

/** Reads a company's records for its digest. */
export const readRecords = async (tx: Tx, companyId: string): Promise<DigestedRecords> => {
  const [company] = await tx
    .select({ timeZone: companies.timeZone })
    .from(companies)
    .where(eq(companies.id, companyId));
  if (!company) throw new Error('A company whose records are digested is not there');
  return {
    revision: await readRevision(tx, companyId),
    pulled: await getPulledRecords(tx),
    compared: await readComparedRecoveries(tx, {}, company.timeZone),
  };
};

/** Whether a digest would read many records. */
export const hasManyRecords = async (tx: Tx): Promise<boolean> => {
  const some = tx.select({ one: sql`1` }).from(recoveries).limit(MANY_RECORDS).as('some');
  const [counted] = await tx.select({ records: sql<number>`count(*)`.mapWith(Number) }).from(some);
  return (counted?.records ?? 0) >= MANY_RECORDS;
};
