import 'server-only';
import { sql } from 'drizzle-orm';
import { companyIds, withCompanyJob } from '@/db/client';
import { DIGEST_VERSION } from './version';

/** Asks for the digest of every company with records that has none of this version; others are asked for by changes. */
export const requestDueDigests = async (): Promise<void> => {
  for (const companyId of await companyIds())
    await withCompanyJob({ companyId, actor: 'upkeep' }, (tx) =>
      tx.execute(sql`
        select work.enqueue('digest-records', ${JSON.stringify({ companyId })}::json, ${`digest-records:${companyId}`})
        where exists (select from recoveries)
          and not exists (select from record_digests where version = ${DIGEST_VERSION})`),
    );
};
