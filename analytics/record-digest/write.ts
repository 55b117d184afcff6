import 'server-only';
import { sql } from 'drizzle-orm';
import { type CompanySuspicion, chanceOf } from '@/analytics/leak-suspicion/company';
import type { TechnicianComparison } from '@/analytics/technician-comparison/compare-technicians';
import type { Tx } from '@/db/client';
import { DIGEST_VERSION } from './version';

/** What a company's records come to, and where its history ended in them. */
export type Digest = { revision: number; suspicion: CompanySuspicion; comparison: TechnicianComparison };

/** Names of JSON are those of the columns: the rows are taken in as one value, however many they are. */
const applianceRows = ({ appliances }: CompanySuspicion): string =>
  JSON.stringify(
    [...appliances.values()].map((own) => ({
      appliance_id: own.applianceId,
      visits: own.visits.length,
      short_visits: own.shortVisits,
      expected_short: own.expectedShort,
      chance: chanceOf(own),
      visited_on: own.visits.map(({ visitedOn }) => visitedOn),
      yields: own.visits.map(({ recoveryYield }) => recoveryYield),
      short_chances: own.visits.map(({ evidence }) => evidence?.short ?? 0),
    })),
  );

const siteRows = ({ sites }: CompanySuspicion): string =>
  JSON.stringify(
    [...sites.values()].map(({ siteId, judged, suspected, lowAgain, chance, excess }) => ({
      ...{ site_id: siteId, judged, suspected, low_again: lowAgain, chance },
      ...{ expected: excess.expected, adjusted_p: excess.adjustedP, look: excess.look },
    })),
  );

/** Every chance moves a little with every record: all rows are written anew. */
const writeSuspicions = async (tx: Tx, companyId: string, suspicion: CompanySuspicion): Promise<void> => {
  await tx.execute(sql`delete from appliance_suspicions where company_id = ${companyId}`);
  await tx.execute(sql`
    insert into appliance_suspicions
      (company_id, appliance_id, visits, short_visits, expected_short, chance, visited_on, yields, short_chances)
    select ${companyId}::uuid, own.* from json_to_recordset(${applianceRows(suspicion)}::json) own
      (appliance_id uuid, visits int, short_visits int, expected_short float8, chance float8,
       visited_on date[], yields float8[], short_chances float8[])`);
  await tx.execute(sql`delete from site_suspicions where company_id = ${companyId}`);
  await tx.execute(sql`
    insert into site_suspicions
      (company_id, site_id, judged, suspected, low_again, chance, expected, adjusted_p, look)
    select ${companyId}::uuid, own.* from json_to_recordset(${siteRows(suspicion)}::json) own
      (site_id uuid, judged int, suspected int, low_again int, chance float8,
       expected float8, adjusted_p float8, look boolean)`);
};

/** Writes a digest in place of the one before; one that stands on older records than that is dropped. */
export const writeDigest = async (tx: Tx, companyId: string, digest: Digest): Promise<void> => {
  const { revision, suspicion, comparison } = digest;
  const { rowCount } = await tx.execute(sql`
    insert into record_digests as before (company_id, version, revision, leak_model, comparison)
    values (${companyId}, ${DIGEST_VERSION}, ${revision}, ${suspicion.model && JSON.stringify(suspicion.model)}::jsonb,
            ${JSON.stringify(comparison)}::jsonb)
    on conflict (company_id) do update set version = excluded.version, digests = before.digests + 1,
      revision = excluded.revision, made_at = now(), leak_model = excluded.leak_model, comparison = excluded.comparison
    where before.revision <= excluded.revision`);
  if (rowCount) await writeSuspicions(tx, companyId, suspicion);
};
