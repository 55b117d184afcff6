import { RECORD_COLUMNS, RECORD_NAMES, type Stated } from '../record-columns';

const taken = "outcome in ('added', 'updated')";

/** The names that taken rows need and the company does not have. $1 company, $2 import. */
const insertNames = (table: string, column: string): string => `
  insert into ${table} (company_id, id, name, import_id)
  select distinct $1::uuid, n.id, n.name, $2::uuid from staged_${table} n
  where n.is_new and n.id in (select ${column} from decided_rows where ${taken})`;

/** A new appliance is described as the first taken row has it. */
const INSERT_APPLIANCES = `
  insert into appliances (company_id, id, site_id, name, import_id, category, refrigerant, nameplate_charge_kg, manufactured_on)
  select distinct on (n.id) $1, n.id, n.site_id, n.name, $2, s.category, s.refrigerant, s.nameplate_charge_kg, s.manufactured_on
  from staged_appliances n join decided_rows d on d.appliance_id = n.id and d.${taken} join staged_rows s on s.line = d.line
  where n.is_new order by n.id, d.line`;

const INSERT_CYLINDERS = `
  insert into cylinders (company_id, id, name, import_id, refrigerant)
  select distinct on (n.id) $1, n.id, n.name, $2, s.refrigerant
  from staged_cylinders n join decided_rows d on d.cylinder_id = n.id and d.${taken} join staged_rows s on s.line = d.line
  where n.is_new order by n.id, d.line`;

const INSERT_CERTIFICATIONS = `
  insert into technician_certifications (company_id, technician_id, type, import_id)
  select distinct $1::uuid, d.technician_id, s.technician_certification, $2::uuid
  from decided_rows d join staged_rows s using (line)
  where d.${taken} and s.technician_certification is not null
  on conflict do nothing`;

/** In the order in which they refer to one another. Each takes $1 company, $2 import. */
export const INSERT_NAMES: readonly string[] = [
  insertNames('branches', 'branch_id'),
  insertNames('technicians', 'technician_id'),
  insertNames('sites', 'site_id'),
  INSERT_APPLIANCES,
  INSERT_CYLINDERS,
  INSERT_CERTIFICATIONS,
];

const columns = RECORD_COLUMNS.map(({ column }) => column);
const idColumns = RECORD_NAMES.map(({ column }) => column);

/** $1 company, $2 import. */
export const INSERT_RECOVERIES = `
  insert into recoveries (company_id, id, record_ref, ${[...columns, ...idColumns].join(', ')},
                          entered, extra, import_id, import_line, source_hash)
  select $1, d.recovery_id, s.record_ref, ${columns.map((c) => `s.${c}`).join(', ')}, ${idColumns.map((c) => `d.${c}`).join(', ')},
         s.entered, s.extra, $2, s.line, s.source_hash
  from staged_rows s join decided_rows d using (line)
  where d.outcome = 'added' order by s.line`;

/**
 * Writes what the file states and leaves the rest. $1 company, $2 import, $3 the stated fields, whose former text goes
 * with them.
 */
export const updateRecoveries = (stated: Stated): string => `
  update recoveries r set
    ${[
      ...stated.columns.map(({ column }) => `${column} = s.${column}`),
      ...stated.names.map(({ column }) => `${column} = d.${column}`),
    ].join(',\n    ')},
    entered = (r.entered - $3::text[]) || s.entered, extra = r.extra || s.extra,
    import_id = $2, import_line = s.line, source_hash = s.source_hash
  from staged_rows s join decided_rows d using (line)
  where d.outcome = 'updated' and r.company_id = $1 and r.id = d.recovery_id`;
