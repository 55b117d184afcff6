import 'server-only';
import type { PoolClient } from 'pg';
import type { KeptContent } from './judging';

/** What is usual at the company as the last renewal of everything found it. */
export type KeptBaselines = {
  id: string;
  judging: string;
  content: KeptContent;
  judgedSingly: number;
  records: number;
};

/** Gives it; null before the first renewal. */
export const keptBaselines = async (client: PoolClient, companyId: string): Promise<KeptBaselines | null> => {
  const { rows } = await client.query<KeptBaselines>(
    `select b.id, r.judging, b.content, b.judged_singly as "judgedSingly", r.records
     from flag_renewals r join flag_baselines b on b.company_id = r.company_id and b.id = r.baseline_id
     where r.company_id = $1`,
    [companyId],
  );
  return rows[0] ?? null;
};

/** Keeps new baselines and gives their id; the same ones again keep the id they have. */
export const keepBaselines = async (
  client: PoolClient,
  companyId: string,
  judging: string,
  content: KeptContent,
): Promise<string> => {
  const { rows } = await client.query<{ id: string }>(
    `with same as (
       update flag_baselines b set judged_singly = 0 from flag_renewals r
       where r.company_id = $1 and b.company_id = $1 and b.id = r.baseline_id and b.judging = $2
         and b.content -> 'usual' = $3::jsonb -> 'usual'
       returning b.id
     ), other as (
       insert into flag_baselines (company_id, judging, content)
       select $1, $2, $3::jsonb where not exists (select from same) returning id
     )
     select id from same union all select id from other`,
    [companyId, judging, JSON.stringify(content)],
  );
  const [kept] = rows;
  if (!kept) throw new Error('Baselines that were kept have no id');
  return kept.id;
};

/** Counts records that were judged by kept baselines. */
export const countJudgedSingly = async (
  client: PoolClient,
  companyId: string,
  id: string,
  records: number,
): Promise<void> => {
  await client.query('update flag_baselines set judged_singly = judged_singly + $3 where company_id = $1 and id = $2', [
    companyId,
    id,
    records,
  ]);
};

/** Takes away baselines that no flag points to any more. */
export const dropOldBaselines = async (client: PoolClient, companyId: string, currentId: string): Promise<void> => {
  await client.query(
    `delete from flag_baselines b where b.company_id = $1 and b.id <> $2
     and not exists (select from flags f where f.company_id = $1 and f.baseline_id = b.id)`,
    [companyId, currentId],
  );
};
