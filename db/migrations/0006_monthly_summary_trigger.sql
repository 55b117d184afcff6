ALTER TABLE monthly_summary FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
-- Level of evacuation that 40 CFR 82.156(a) Table 1 asks of recovery machines made on or after 15 November 1993, as absolute
-- pressure in kPa: very high 0, high 0 (10 inHg from 200 lb), medium 10 (15 from 200 lb) inHg vacuum, low 25 mm Hg
-- absolute; small appliances 4 inHg vacuum, 82.156(b). 200 lb = 90.718474 kg; 1 inHg = 3.386389 kPa (NIST SP 811).
CREATE FUNCTION required_level_kpa_abs(pressure_class text, full_charge_kg numeric, category text)
RETURNS double precision LANGUAGE sql IMMUTABLE PARALLEL SAFE AS $$
  SELECT CASE
    WHEN category = 'small_appliance' THEN 101.325 - 4 * 3.386389
    WHEN pressure_class = 'low' THEN 25 * 0.1333224
    WHEN pressure_class = 'very_high' THEN 101.325
    WHEN pressure_class = 'high' THEN 101.325 - CASE WHEN full_charge_kg < 90.718474 THEN 0 ELSE 10 END * 3.386389
    ELSE 101.325 - CASE WHEN full_charge_kg < 90.718474 THEN 10 ELSE 15 END * 3.386389
  END
$$;
--> statement-breakpoint
-- Adds the given months up anew from the records. Whole months: a change touches few of them, and a month that is made
-- from its records cannot drift away from them.
CREATE FUNCTION renew_months(company uuid, months date[]) RETURNS void LANGUAGE plpgsql AS $$
BEGIN
  DELETE FROM monthly_summary WHERE company_id = company AND month = ANY (months);
  INSERT INTO monthly_summary
  SELECT company,
         CASE GROUPING(r.refrigerant, r.technician_id, r.site_id, r.branch_id, r.category, r.job_type)
           WHEN 31 THEN 'refrigerant' WHEN 47 THEN 'technician' WHEN 55 THEN 'site' WHEN 59 THEN 'branch'
           WHEN 61 THEN 'category' WHEN 62 THEN 'job_type' ELSE 'all' END,
         r.recovered_month,
         coalesce(r.refrigerant, r.technician_id::text, r.site_id::text, r.branch_id::text, r.category, r.job_type, ''),
         count(*), sum(r.recovered_mass_kg), sum(r.full_charge_kg),
         percentile_cont(0.5) WITHIN GROUP (ORDER BY r.recovery_yield),
         sum(r.recovered_mass_kg::double precision * f.gwp_ar4),
         count(r.final_vacuum_kpa_abs),
         -- A reading in inHg is good to about 0.1 kPa.
         count(*) FILTER (WHERE r.final_vacuum_kpa_abs::double precision
                                <= required_level_kpa_abs(f.pressure_class, r.full_charge_kg, r.category) + 0.1),
         count(r.hold_minutes), count(*) FILTER (WHERE r.hold_minutes > 0)
  FROM recoveries r JOIN refrigerants f ON f.designation = r.refrigerant
  WHERE r.company_id = company AND r.recovered_month = ANY (months) AND r.exclusion IS NULL
  GROUP BY GROUPING SETS ((r.recovered_month), (r.recovered_month, r.refrigerant), (r.recovered_month, r.technician_id),
                          (r.recovered_month, r.site_id), (r.recovered_month, r.branch_id),
                          (r.recovered_month, r.category), (r.recovered_month, r.job_type));
END $$;
--> statement-breakpoint
-- SECURITY DEFINER and without a technician's narrower scope: his edit adds up everybody's records. Runs after the
-- history trigger (names are in order), whose lock on the company's chain lets one transaction at a time add up.
CREATE FUNCTION keep_months() RETURNS trigger LANGUAGE plpgsql SECURITY DEFINER
SET search_path = public, pg_temp AS $$
DECLARE
  months date[];
  narrowed text := coalesce(current_setting('app.technician_id', true), '');
BEGIN
  IF TG_OP = 'INSERT' THEN
    SELECT array_agg(DISTINCT recovered_month) INTO months FROM new_rows;
  ELSIF TG_OP = 'DELETE' THEN
    SELECT array_agg(DISTINCT recovered_month) INTO months FROM old_rows;
  ELSE
    SELECT array_agg(DISTINCT m) INTO months
    FROM (SELECT recovered_month AS m FROM new_rows UNION SELECT recovered_month FROM old_rows) touched;
  END IF;
  IF months IS NOT NULL THEN
    PERFORM set_config('app.technician_id', '', true);
    PERFORM renew_months(nullif(current_setting('app.company_id', true), '')::uuid, months);
    PERFORM set_config('app.technician_id', narrowed, true);
  END IF;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER recoveries_months_insert AFTER INSERT ON recoveries REFERENCING NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_months();
--> statement-breakpoint
CREATE TRIGGER recoveries_months_update AFTER UPDATE ON recoveries REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_months();
--> statement-breakpoint
CREATE TRIGGER recoveries_months_delete AFTER DELETE ON recoveries REFERENCING OLD TABLE AS old_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_months();
