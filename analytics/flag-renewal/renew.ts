import 'server-only';
import type { PoolClient } from 'pg';
import { z } from 'zod';
import { judgeRecords, judgeTouched } from '@/analytics/judging/judge-records';
import { defaultSettings } from '@/analytics/judging/settings';
import { REQUEST_DIGEST } from '@/analytics/record-digest/request';
import { withCompanyConnection } from '@/db/pool-client';
import { countJudgedSingly, dropOldBaselines, type KeptBaselines, keepBaselines, keptBaselines } from './baselines';
import { type Due, readDue, settleDue } from './due';
import { JUDGING } from './judging';
import { noteRenewal } from './note-renewal';
import { readJudgedCylinders, readJudgedRecords } from './read-records';
import { writeFlags } from './write-flags';

/** Whom the triggers know by this name: what he does to flags is not the history's business (see the migration). */
const ACTOR = 'renewal of flags';

/** Once so many records, and this share of all, were judged singly, what is usual may have moved. */
const MANY_SINGLY = { records: 50, share: 0.01 };

/** Judging so many records keeps a processor busy for longer than people should wait for a page. */
const MANY_RECORDS = 2_000;

export const renewalPayload = z.object({ companyId: z.uuid() });
export type RenewalPayload = z.output<typeof renewalPayload>;

/** What a renewal has to do, and by what. */
type Task = { due: Due; kept: KeptBaselines | null; everything: boolean };

const usualMayHaveMoved = ({ judgedSingly, records }: KeptBaselines, due: Due): boolean =>
  judgedSingly + due.ids.length > Math.max(MANY_SINGLY.records, MANY_SINGLY.share * records);

const readTask = async (client: PoolClient, companyId: string): Promise<Task> => {
  const due = await readDue(client, companyId);
  const kept = await keptBaselines(client, companyId);
  const sound = kept !== null && kept.judging === JUDGING;
  return { due, kept, everything: !sound || due.everything || usualMayHaveMoved(kept, due) };
};

const todayOf = async (client: PoolClient, companyId: string): Promise<string> => {
  const { rows } = await client.query<{ today: string }>(
    "select to_char(now() at time zone time_zone, 'YYYY-MM-DD') as today from companies where id = $1",
    [companyId],
  );
  if (!rows[0]) throw new Error('A company whose flags are renewed is not there');
  return rows[0].today;
};

const renewAll = async (client: PoolClient, companyId: string): Promise<void> => {
  const settings = defaultSettings(await todayOf(client, companyId));
  const records = await readJudgedRecords(client, companyId);
  const { flags, baselines } = judgeRecords(records, await readJudgedCylinders(client, companyId), settings);
  const baselineId = await keepBaselines(client, companyId, JUDGING, { settings, usual: baselines });
  const changes = await writeFlags(client, companyId, { flags, baselineId, judged: null });
  await noteRenewal(client, companyId, baselineId, records.length, changes);
  await dropOldBaselines(client, companyId, baselineId);
};

const renewSome = async (client: PoolClient, companyId: string, due: Due, kept: KeptBaselines): Promise<void> => {
  const settings = { ...kept.content.settings, today: await todayOf(client, companyId) };
  const records = await readJudgedRecords(client, companyId, due.ids);
  const cylinders = await readJudgedCylinders(client, companyId);
  const flags = judgeTouched(new Set(due.ids), records, cylinders, kept.content.usual, settings);
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
    const { due, kept, everything } = await readTask(client, companyId);
    if (everything || kept === null) await renewAll(client, companyId);
    else if (due.ids.length > 0) await renewSome(client, companyId, due, kept);
    else return;
    await settleDue(client, companyId, due);
    // What is suspected and compared stands on flags too, so it follows them.
    await client.query(REQUEST_DIGEST, [companyId]);
  });

/** Whether a renewal would judge many records. */
export const isLongRenewal = ({ companyId }: RenewalPayload): Promise<boolean> =>
  withCompanyConnection({ companyId, actor: ACTOR }, async (client) => {
    const { everything } = await readTask(client, companyId);
    if (!everything) return false;
    const { rows } = await client.query<{ many: boolean }>(
      'select count(*) >= $2 as many from (select from recoveries where company_id = $1 limit $2) some_of_them',
      [companyId, MANY_RECORDS],
    );
    return rows[0]?.many ?? false;
  });
