/** Nobody changes a record between its comparison with the file and its update. $1 company. */
export const LOCK_KNOWN_RECORDS = `
  select count(*) from (
    select from recoveries r
    where r.company_id = $1 and r.record_ref in (select record_ref from staged_rows where reasons is null)
    for no key update) locked`;

/**
 * What each row is before its content is compared. $1 company.
 * - refused: the reader refused it.
 * - repeat, contradiction: an earlier row of the file has the same ref and says the same, or something else.
 * - known: the record's last imported row said exactly this, whatever was corrected since.
 * - open: to be compared.
 * A record was `edited` when no import wrote its present version.
 */
export const CREATE_MATCHED_ROWS = `
  create temp table matched_rows on commit drop as
  with ordered as (
    select line, record_ref, source_hash,
           first_value(line) over same as first_line,
           first_value(source_hash) over same as first_hash
    from staged_rows where reasons is null
    window same as (partition by record_ref order by line)
  )
  select o.line, o.first_line, r.id as recovery_id, r.version,
         r.id is not null and (r.source_hash is null or written.version_after is distinct from r.version) as edited,
         case when o.first_line < o.line and o.first_hash = o.source_hash then 'repeat'
              when o.first_line < o.line then 'contradiction'
              when r.source_hash = o.source_hash then 'known'
              else 'open' end as state
  from ordered o
  left join recoveries r on r.company_id = $1 and r.record_ref = o.record_ref
  left join import_rows written on written.company_id = $1 and written.recovery_id = r.id
    and written.import_id is not distinct from r.import_id and written.outcome in ('added', 'updated')
  union all
  select line, line, null, null, false, 'refused' from staged_rows where reasons is not null`;

export const ANALYZE_MATCHED_ROWS = 'analyze matched_rows';
