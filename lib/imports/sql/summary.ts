import type { RecordColumn, RecordName, Stated } from '../record-columns';

const EXAMPLES = 5;
const MOST_CHANGES = 200;

/** Refused rows by reason, most frequent first; the first row's sentence stands for its group. */
export const REJECTED_BY_REASON = `
  with reason as (
    select d.line, s.record_ref, r.value ->> 'code' as code, r.value ->> 'column' as "column",
           r.value ->> 'message' as message, coalesce(r.value ->> 'value', '') as value
    from decided_rows d join staged_rows s using (line) cross join jsonb_array_elements(d.reasons) r
    where d.outcome = 'rejected'
  ), ranked as (
    select *, row_number() over (partition by code, "column" order by line) as nth from reason
  )
  select code, "column", min(message) filter (where nth = 1) as message, count(*)::int as count,
         jsonb_agg(jsonb_build_object('line', line, 'recordRef', record_ref, 'value', value) order by line)
           filter (where nth <= ${EXAMPLES}) as examples
  from ranked group by code, "column" order by count(*) desc, min(line) limit 100`;

/** Names that taken rows bring and the company does not have. */
export const newNames = ({ table, column }: RecordName): string => `
  select count(*)::int as count, coalesce((array_agg(name order by line))[1:${EXAMPLES}], '{}') as examples
  from (select distinct id, name, line from staged_${table}
        where is_new and id in (select ${column} from decided_rows where outcome in ('added', 'updated'))) brought`;

const shown = (alias: string, { column, unit, type }: RecordColumn) => {
  const value = `${alias}.${column}`;
  if (type === 'timestamptz') return `to_char(${value} at time zone $2, 'YYYY-MM-DD HH24:MI')`;
  return unit ? `trim_scale(${value})::text || ' ${unit}'` : `${value}::text`;
};

const comparedColumn = (column: RecordColumn) => `('${column.shownAs}', ${shown('r', column)}, ${shown('s', column)})`;
const comparedName = ({ name, column, table }: RecordName) =>
  `('${name}', (select t.name from ${table} t where t.company_id = $1 and t.id = r.${column}), s.${name})`;

/** The first updated rows, field by field. $1 company, $2 its time zone. */
export const changedFields = ({ columns, names }: Stated): string => `
  select s.line, s.record_ref as "recordRef",
         jsonb_agg(jsonb_build_object('field', f.field, 'before', f.before, 'after', f.after)) as fields
  from (select line, recovery_id from decided_rows where outcome = 'updated' order by line limit ${MOST_CHANGES}) d
  join staged_rows s using (line) join recoveries r on r.company_id = $1 and r.id = d.recovery_id
  cross join lateral (values ${[...columns.map(comparedColumn), ...names.map(comparedName)].join(',\n    ')})
    f(field, before, after)
  where f.before is distinct from f.after
  group by s.line, s.record_ref order by s.line`;
