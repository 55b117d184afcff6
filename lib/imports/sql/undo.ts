import { RECORD_COLUMNS, RECORD_NAMES } from '../record-columns';

/** The rows that this import took, with the records as they are now. $1 company, $2 import. */
export const CREATE_TAKEN_ROWS = `
  create temp table taken_rows on commit drop as
  select i.line, i.record_ref, i.recovery_id, i.outcome, i.before, r.version = i.version_after as untouched, r.import_id
  from import_rows i
  join recoveries r on r.company_id = $1 and r.id = i.recovery_id
  where i.company_id = $1 and i.import_id = $2 and i.outcome in ('added', 'updated')
  for no key update of r`;

/** $1 import. */
export const KEPT_RECORDS = `
  select record_ref as "recordRef",
         case when import_id is distinct from $1::uuid then 'A later import changed this record.'
              else 'Somebody changed this record after the import.' end as reason
  from taken_rows where not untouched order by line`;

/** Flags go with their record; all at once here, because the foreign key would look record by record. $1 company. */
export const DELETE_FLAGS = `
  delete from flags f using taken_rows t
  where f.company_id = $1 and f.recovery_id = t.recovery_id and t.outcome = 'added' and t.untouched`;

/** $1 company. */
export const DELETE_ADDED = `
  delete from recoveries r using taken_rows t
  where r.company_id = $1 and r.id = t.recovery_id and t.outcome = 'added' and t.untouched`;

const restored = [
  ...RECORD_COLUMNS.map(({ column }) => column),
  ...RECORD_NAMES.map(({ column }) => column),
  ...['entered', 'extra', 'import_id', 'import_line', 'source_hash'],
];

/** Gives changed records their former values; their version counts on. $1 company. */
export const RESTORE_UPDATED = `
  update recoveries r set ${restored.map((column) => `${column} = b.${column}`).join(', ')}
  from taken_rows t cross join lateral jsonb_populate_record(null::recoveries, t.before) b
  where r.company_id = $1 and r.id = t.recovery_id and t.outcome = 'updated' and t.untouched`;

/**
 * A restored record is again just what an earlier import wrote, if it was so before: that import's ledger learns the new
 * version. $1 company.
 */
export const RENEW_EARLIER_LEDGER = `
  update import_rows earlier set version_after = r.version
  from taken_rows t join recoveries r on r.company_id = $1 and r.id = t.recovery_id
  where t.outcome = 'updated' and t.untouched
    and earlier.company_id = $1 and earlier.recovery_id = r.id and earlier.import_id = (t.before ->> 'import_id')::uuid
    and earlier.version_after = (t.before ->> 'version')::int`;

/** A name goes when this import brought it, nobody has edited it, and none of these refer to it. $1 company, $2 import. */
const deleteNames = (table: string, users: readonly (readonly [table: string, column: string])[]) => `
  delete from ${table} n
  where n.company_id = $1 and n.import_id = $2
    and not exists (select from history h where h.company_id = $1 and h.table_name = '${table}' and h.row_id = n.id
                    and h.action = 'update')
    ${users
      .map(([user, column]) => `and not exists (select from ${user} u where u.company_id = $1 and u.${column} = n.id)`)
      .join('\n    ')}`;

const DELETE_CERTIFICATIONS = `
  delete from technician_certifications c
  where c.company_id = $1 and c.import_id = $2
    and not exists (select from recoveries r where r.company_id = $1 and r.technician_id = c.technician_id
                    and r.technician_certification = c.type)`;

/** In the order in which they refer to one another. */
export const DELETE_NAMES: readonly string[] = [
  DELETE_CERTIFICATIONS,
  deleteNames('appliances', [
    ['recoveries', 'appliance_id'],
    ['charge_additions', 'appliance_id'],
  ]),
  deleteNames('cylinders', [['recoveries', 'cylinder_id']]),
  deleteNames('sites', [
    ['recoveries', 'site_id'],
    ['appliances', 'site_id'],
    ['site_leak_methods', 'site_id'],
  ]),
  deleteNames('technicians', [
    ['recoveries', 'technician_id'],
    ['memberships', 'technician_id'],
    ['access_tokens', 'technician_id'],
  ]),
  deleteNames('branches', [
    ['recoveries', 'branch_id'],
    ['technicians', 'branch_id'],
    ['sites', 'branch_id'],
    ['cylinders', 'branch_id'],
  ]),
];

/** $1 company, $2 import, $3 kept records. */
export const FINISH_UNDO = `
  update imports set status = 'undone', failure = null, undone_at = clock_timestamp(),
         summary = jsonb_set(summary, '{keptByUndo}', $3::jsonb)
  where company_id = $1 and id = $2`;
