import 'server-only';
import type { PoolClient } from 'pg';
import type { Judgement } from '@/analytics/judging/judgement';

/** What became of the flags in one renewal. */
export type FlagChanges = { added: number; changed: number; gone: number };

const CREATE_FOUND = `
  create temp table found_flags on commit drop as
  select recovery_id, rule, certainty, evidence, expected_mass_kg
  from unnest($2::uuid[], $3::text[], $4::float8[], $5::jsonb[], $6::float8[])
    found (recovery_id, rule, certainty, evidence, expected_mass_kg)
  join recoveries r on r.company_id = $1 and r.id = recovery_id and r.exclusion is null
  for key share of r`;

/** $1 company, $2 the judged records, NULL for all. */
const DELETE_GONE = `
  delete from flags f
  where f.company_id = $1 and f.state = 'open' and ($2::uuid[] is null or f.recovery_id = any ($2))
    and not exists (select from found_flags n where n.recovery_id = f.recovery_id and n.rule = f.rule)`;

/** An open flag keeps its id, its person and its note. $1 company, $2 baseline. */
const UPDATE_CHANGED = `
  with renewed as (
    update flags f set certainty = n.certainty, evidence = n.evidence, expected_mass_kg = n.expected_mass_kg,
      baseline_id = $2
    from found_flags n, flags before
    where f.company_id = $1 and f.recovery_id = n.recovery_id and f.rule = n.rule and f.state = 'open'
      and before.company_id = f.company_id and before.id = f.id
      and (f.certainty, f.evidence, f.baseline_id) is distinct from (n.certainty, n.evidence, $2::uuid)
    returning (before.certainty, before.evidence) is distinct from (n.certainty, n.evidence) as said_otherwise
  )
  select count(*) filter (where said_otherwise)::int as changed from renewed`;

/** A decided flag stays as it was decided. $1 company, $2 baseline. */
const INSERT_ADDED = `
  insert into flags (company_id, recovery_id, rule, certainty, evidence, expected_mass_kg, baseline_id)
  select $1, recovery_id, rule, certainty, evidence, expected_mass_kg, $2 from found_flags
  on conflict (company_id, recovery_id, rule) do nothing`;

/** Finer differences are noise of the baselines: a flag is changed by what a reader could see. */
const rounded = (certainty: number): number => Math.round(Math.min(Math.max(certainty, 0), 1) * 1000) / 1000;

/** Writes what judging found for the judged records (null: for all), set by set, and gives what became of the flags. */
export const writeFlags = async (
  client: PoolClient,
  companyId: string,
  { flags, baselineId, judged }: { flags: readonly Judgement[]; baselineId: string; judged: readonly string[] | null },
): Promise<FlagChanges> => {
  await client.query(CREATE_FOUND, [
    companyId,
    flags.map(({ recordId }) => recordId),
    flags.map(({ rule }) => rule),
    flags.map(({ certainty }) => rounded(certainty)),
    flags.map(({ evidence }) => JSON.stringify(evidence)),
    flags.map(({ expectedMassKg }) => expectedMassKg),
  ]);
  await client.query('analyze found_flags');
  const gone = await client.query(DELETE_GONE, [companyId, judged]);
  const renewed = await client.query<{ changed: number }>(UPDATE_CHANGED, [companyId, baselineId]);
  const added = await client.query(INSERT_ADDED, [companyId, baselineId]);
  return { added: added.rowCount ?? 0, changed: renewed.rows[0]?.changed ?? 0, gone: gone.rowCount ?? 0 };
};
