import { withConnection } from '@/db/cluster/roles';

/**
 * Fills a company with `count` records of ten years by arithmetic on the row number: no file, no chance, the same rows
 * each time, one in 53 far below like jobs. Triggers are skipped, what they keep is made at the end.
 */
export const fillCompany = (adminUrl: string, companyId: string, count: number): Promise<void> =>
  withConnection(adminUrl, async (admin) => {
    await admin.query(`select set_config('app.company_id', $1, false), set_config('app.actor', 'bench', false)`, [
      companyId,
    ]);
    const names: [table: string, prefix: string, count: number][] = [
      ['branches', 'Branch', 3],
      ['technicians', 'Technician', 30],
      ['sites', 'Site', 400],
    ];
    for (const [table, prefix, many] of names)
      await admin.query(
        `insert into ${table} (company_id, name) select $1, $2 || ' ' || g from generate_series(1, $3::int) g`,
        [companyId, prefix, many],
      );
    await admin.query(
      `insert into appliances (company_id, site_id, name) select company_id, id, 'RTU-' || g from sites, generate_series(1, 3) g where company_id = $1`,
      [companyId],
    );
    // Neither history nor foreign keys: the rows are joined from what they point at.
    await admin.query(`set session_replication_role = 'replica'`);
    // Of a company just made the planner expects one row, and would look through all sites for each record.
    await admin.query('set enable_nestloop = off');
    await admin.query(FILL, [companyId, count]);
    await admin.query('reset enable_nestloop');
    await admin.query(`set session_replication_role = 'origin'`);
    await admin.query(
      `select renew_months($1, array_agg(distinct recovered_month)) from recoveries where company_id = $1`,
      [companyId],
    );
    await admin.query('select renew_summaries($1)', [companyId]);
    for (const table of ['recoveries', 'monthly_summary', 'group_summary', 'like_jobs'])
      await admin.query(`vacuum analyze ${table}`);
  });

const FILL = `
  with crew as (select id, row_number() over (order by name) - 1 as n from technicians where company_id = $1),
       place as (select id, row_number() over (order by name) - 1 as n from sites where company_id = $1),
       unit as (select site_id, min(id::text)::uuid as id from appliances where company_id = $1 group by site_id),
       branch as (select id, row_number() over (order by name) - 1 as n from branches where company_id = $1)
  insert into recoveries (company_id, record_ref, recovered_on, technician_id, site_id, appliance_id, branch_id, category,
                          job_type, refrigerant, nameplate_charge_kg, recovered_mass_kg, mass_unit, final_vacuum_kpa_abs, hold_minutes)
  select $1, 'B-' || g, date '2016-12-01' + (g::bigint * 7919 % 3652)::int, crew.id, place.id, unit.id, branch.id,
         (array['comfort_cooling', 'commercial_refrigeration', 'small_appliance', null])[1 + g % 4],
         (array['service', 'repair', 'conversion', 'disposal'])[1 + g / 7 % 4],
         (array['R-22', 'R-410A', 'R-134a', 'R-404A', 'R-407C', 'R-32', 'R-454B', 'R-448A'])[1 + g / 3 % 8],
         1 + g % 17, round((1 + g % 17) * case when g % 53 = 0 then 0.005 else 0.35 + (g::bigint * 104729 % 6500) / 10000.0 end, 4), 'kg',
         101.325 - g % 12, g % 16
  from generate_series(1, $2::int) g
  join crew on crew.n = g % 30 join place on place.n = g % 400 join unit on unit.site_id = place.id join branch on branch.n = g % 3`;
