import 'server-only';
import type { PoolClient } from 'pg';
import { z } from 'zod';
import { withCompanyConnection } from '@/db/pool-client';
import { countJudgedSingly, dropOldBaselines, type KeptBaselines, keepBaselines, keptBaselines } from './baselines';
import { type Due, readDue, settleDue } from './due';
import { JUDGING, judgeAll, judgeSome } from './judging';
import { readJudgedCylinders, readJudgedRecords } from './read-records';
import { type FlagChanges, writeFlags } from './write-flags';

/** Whom the triggers know by this name: what he does to flags is not the history's business (see the migration). */
const ACTOR = 'renewal of flags';

/** Once so many records, and this share of all, were judged singly, what is usual may have moved. */
const MANY_SINGLY = { records: 50, share: 0.01 };

export const renewalPayload = z.object({ companyId: z.uuid() });
type RenewalPayload = z.output<typeof renewalPayload>;

const usualMayHaveMoved = ({ judgedSingly, records }: KeptBaselines, due: Due): boolean =>
  judgedSingly + due.ids.length > Math.max(MANY_SINGLY.records, MANY_SINGLY.share * records);

const noteRenewal = async (
  client: PoolClient,
  companyId: string,
  baselineId: string,
  records: number,
  { added, changed, gone }: FlagChanges,
): Promise<void> => {
  await client.query(
    `insert into flag_renewals as r (company_id, judging, baseline_id, records, added, changed, gone)
     values ($1, $2, $3, $4, $5, $6, $7)
     on conflict (company_id) do update set judging = $2, baseline_id = $3, records = $4, added = $5, changed = $6,
       gone = $7, renewed_at = now()
     where $5 + $6 + $7 > 0 or (r.judging, r.baseline_id, r.records) is distinct from ($2, $3::uuid, $4)`,
    [companyId, JUDGING, baselineId, records, added, changed, gone],
  );
};

const renewAll = async (client: PoolClient, companyId: string): Promise<void> => {
  const records = await readJudgedRecords(client, companyId);
  const { flags, baselines } = judgeAll(records, await readJudgedCylinders(client, companyId));
  const baselineId = await keepBaselines(client, companyId, JUDGING, baselines);
  const changes = await writeFlags(client, companyId, { flags, baselineId, judged: null });
  await noteRenewal(client, companyId, baselineId, records.length, changes);
  await dropOldBaselines(client, companyId, baselineId);
};

const renewSome = async (client: PoolClient, companyId: string, due: Due, kept: KeptBaselines): Promise<void> => {
  const records = await readJudgedRecords(client, companyId, due.ids);
  const cylinders = await readJudgedCylinders(client, companyId);
  const flags = judgeSome(new Set(due.ids), records, cylinders, kept.content);
  const changes = await writeFlags(client, companyId, { flags, baselineId: kept.id, judged: due.ids });
  await noteRenewal(client, companyId, kept.id, kept.records, changes);
  await countJudgedSingly(client, companyId, kept.id, due.ids.length);
};

/**
 * Renews what is due of a company's flags: those of single records by what was usual before, or all of them when much
 * changed or the judging is another. Does nothing when nothing is due. Decided flags stay as they were decided.
 */
export const renewFlags = ({ companyId }: RenewalPayload): Promise<void> =>
  withCompanyConnection({ companyId, actor: ACTOR }, async (client) => {
    await client.query("select pg_advisory_xact_lock(hashtextextended('flags of ' || $1, 0))", [companyId]);
    const due = await readDue(client, companyId);
    const kept = await keptBaselines(client, companyId);
    const sound = kept !== null && kept.judging === JUDGING;
    if (!sound || due.everything || usualMayHaveMoved(kept, due)) await renewAll(client, companyId);
    else if (due.ids.length > 0) await renewSome(client, companyId, due, kept);
    else return;
    await settleDue(client, companyId, due);
  });
