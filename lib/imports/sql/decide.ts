import type { Stated } from '../record-columns';

/** Whether the record says something else than the row in anything the file states. */
const differs = ({ columns, names }: Stated) => {
  const pairs = [
    ...columns.map(({ column }) => [`r.${column}`, `s.${column}`]),
    ...names.map(({ column, table }) => [`r.${column}`, `${table}.id`]),
  ];
  const left = pairs.map(([record]) => record).join(', ');
  const right = pairs.map(([, row]) => row).join(', ');
  return `((${left}) is distinct from (${right}) or not r.extra @> s.extra)`;
};

const ids = `branches.id as branch_id, technicians.id as technician_id, sites.id as site_id,
         appliances.id as appliance_id, cylinders.id as cylinder_id`;

/**
 * What becomes of each row. $1 company, $2 whether the file's word goes before corrections by hand, $3 the header of the
 * ticket number's column.
 */
export const createDecidedRows = (stated: Stated): string => `
  create temp table decided_rows on commit drop as
  select line, case when outcome = 'added' then gen_random_uuid() else recovery_id end as recovery_id,
         outcome, case outcome when 'added' then 1 when 'updated' then version + 1 end as version_after,
         case when outcome <> 'rejected' then null
              when state = 'refused' then reasons
              when state = 'contradiction' then jsonb_build_array(jsonb_build_object(
                'column', $3::text, 'code', 'contradicts_earlier_row', 'value', record_ref, 'message',
                format('Line %s has the same record_ref and says something else; only that line counts.', first_line)))
              else jsonb_build_array(jsonb_build_object(
                'column', $3::text, 'code', 'corrected_by_hand', 'value', record_ref, 'message',
                'The record was entered or corrected by hand and the file says something else. '
                || 'The record was left as it is.')) end as reasons,
         branch_id, technician_id, site_id, appliance_id, cylinder_id
  from (
    select s.line, s.record_ref, s.reasons, m.state, m.first_line, m.recovery_id, m.version, ${ids},
           case when m.state in ('refused', 'contradiction') then 'rejected'
                when m.state in ('repeat', 'known') then 'unchanged'
                when r.id is null then 'added'
                when not ${differs(stated)} then 'unchanged'
                when m.edited and not $2 then 'rejected'
                else 'updated' end as outcome
    from staged_rows s join matched_rows m using (line)
    left join recoveries r on m.state = 'open' and r.company_id = $1 and r.id = m.recovery_id
    left join staged_branches branches on branches.spelling = s.branch
    left join staged_technicians technicians on technicians.spelling = s.technician
    left join staged_sites sites on sites.spelling = s.site
    left join staged_appliances appliances on appliances.site_id = sites.id and appliances.spelling = s.appliance
    left join staged_cylinders cylinders on cylinders.spelling = s.cylinder
  ) compared`;

export const ANALYZE_DECIDED_ROWS = 'analyze decided_rows';

/** One line of the ledger for every row of the file. $1 company, $2 import. */
export const INSERT_IMPORT_ROWS = `
  insert into import_rows (company_id, import_id, line, outcome, record_ref, recovery_id, cells, reasons, before, version_after)
  select $1, $2, s.line, d.outcome, s.record_ref, d.recovery_id,
         case when d.outcome = 'rejected' then array(select jsonb_array_elements_text(s.cells)) end,
         d.reasons,
         case when d.outcome = 'updated' then to_jsonb(r) end,
         d.version_after
  from staged_rows s join decided_rows d using (line)
  left join recoveries r on d.outcome = 'updated' and r.company_id = $1 and r.id = d.recovery_id
  order by s.line`;

export const COUNT_OUTCOMES = `
  select count(*)::int as "rowsRead",
         (count(*) filter (where outcome = 'added'))::int as added,
         (count(*) filter (where outcome = 'updated'))::int as updated,
         (count(*) filter (where outcome = 'unchanged'))::int as unchanged,
         (count(*) filter (where outcome = 'rejected'))::int as rejected
  from decided_rows`;
