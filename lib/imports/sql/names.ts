import type { RecordName } from '../record-columns';

/** What two spellings of one name share; the expression of the generated columns in db/schema/places.ts. */
const nameKey = (name: string) => `lower(btrim(regexp_replace(normalize(${name}, NFC), '[[:space:]]+', ' ', 'g')))`;

/**
 * Every spelling of a name in the open rows with the id it stands for: the company's, or a fresh one when the company
 * does not know the name yet (`is_new`; written only if a taken row needs it). $1 company.
 */
export const createStagedNames = ({ name, table }: Omit<RecordName, 'name'> & { name: string }): string => `
  create temp table staged_${table} on commit drop as
  with spelled as (
    select s.${name} as spelling, min(s.line) as line
    from staged_rows s join matched_rows m using (line)
    where m.state = 'open' and s.${name} is not null
    group by s.${name}
  ), keyed as (
    select spelling, line, ${nameKey('spelling')} as name_key from spelled
  ), fresh as materialized (
    select name_key, (array_agg(spelling order by line))[1] as name, min(line) as line, gen_random_uuid() as id
    from keyed group by name_key
  )
  select k.spelling, f.name, f.line, coalesce(known.id, f.id) as id, known.id is null as is_new
  from keyed k join fresh f using (name_key)
  left join ${table} known on known.company_id = $1 and known.name_key = k.name_key`;

/** The same for appliances, which are known by their site and their name. $1 company. */
export const CREATE_STAGED_APPLIANCES = `
  create temp table staged_appliances on commit drop as
  with spelled as (
    select sites.id as site_id, s.appliance as spelling, min(s.line) as line
    from staged_rows s join matched_rows m using (line) join staged_sites sites on sites.spelling = s.site
    where m.state = 'open'
    group by sites.id, s.appliance
  ), keyed as (
    select site_id, spelling, line, ${nameKey('spelling')} as name_key from spelled
  ), fresh as materialized (
    select site_id, name_key, (array_agg(spelling order by line))[1] as name, min(line) as line, gen_random_uuid() as id
    from keyed group by site_id, name_key
  )
  select k.site_id, k.spelling, f.name, f.line, coalesce(known.id, f.id) as id, known.id is null as is_new
  from keyed k join fresh f using (site_id, name_key)
  left join appliances known on known.company_id = $1 and known.site_id = k.site_id and known.name_key = k.name_key`;

export const ANALYZE_STAGED_NAMES =
  'analyze staged_branches, staged_technicians, staged_sites, staged_appliances, staged_cylinders';
