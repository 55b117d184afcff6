-- What stands ready besides the months: groups (each technician, each site), like jobs, and the middle of all yields.
-- Each is kept in the transaction that changes a record, and only what the change touches is made anew.
ALTER TABLE group_summary FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE like_jobs FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE middle_yields FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
-- The kind of job as a CASE: behind a policy PostgreSQL looks no COALESCE up in an index, since it could leak.
DROP INDEX recoveries_by_kind;
--> statement-breakpoint
CREATE INDEX recoveries_by_kind ON recoveries
  (company_id, refrigerant, (CASE WHEN category IS NULL THEN '' ELSE category END), recovery_yield)
  INCLUDE (category, technician_id, id, recovered_month) WHERE exclusion IS NULL;
--> statement-breakpoint
-- A group is made anew from an index alone.
CREATE INDEX recoveries_by_technician ON recoveries (company_id, technician_id, recovered_on)
  INCLUDE (recovered_mass_kg, full_charge_kg, recovery_yield, exclusion);
--> statement-breakpoint
CREATE INDEX recoveries_by_site ON recoveries (company_id, site_id, recovered_on)
  INCLUDE (recovered_mass_kg, full_charge_kg, recovery_yield, exclusion, appliance_id, technician_id);
--> statement-breakpoint
CREATE FUNCTION renew_groups(company uuid, technician_ids uuid[], site_ids uuid[]) RETURNS void
LANGUAGE plpgsql SET plan_cache_mode = force_custom_plan AS $$
BEGIN
  DELETE FROM group_summary g WHERE g.company_id = company
    AND ((g.dimension = 'technician' AND g.group_id = ANY (technician_ids)) OR (g.dimension = 'site' AND g.group_id = ANY (site_ids)));
  INSERT INTO group_summary
  SELECT company, 'technician', r.technician_id, count(*), sum(r.recovered_mass_kg), sum(r.full_charge_kg),
         percentile_cont(0.5) WITHIN GROUP (ORDER BY r.recovery_yield), NULL, min(r.recovered_on), max(r.recovered_on)
  FROM recoveries r
  WHERE r.company_id = company AND r.technician_id = ANY (technician_ids) AND r.exclusion IS NULL GROUP BY r.technician_id;
  INSERT INTO group_summary
  SELECT company, 'site', r.site_id, count(*), sum(r.recovered_mass_kg), sum(r.full_charge_kg),
         percentile_cont(0.5) WITHIN GROUP (ORDER BY r.recovery_yield), count(DISTINCT r.appliance_id),
         min(r.recovered_on), max(r.recovered_on)
  FROM recoveries r
  WHERE r.company_id = company AND r.site_id = ANY (site_ids) AND r.exclusion IS NULL GROUP BY r.site_id;
END $$;
--> statement-breakpoint
-- `refrigerants` and `kinds` name the touched kinds of job, pairwise and perhaps more than once.
CREATE FUNCTION renew_like_jobs(company uuid, refrigerants text[], kinds text[]) RETURNS void
LANGUAGE plpgsql SET plan_cache_mode = force_custom_plan AS $$
BEGIN
  DELETE FROM like_jobs l USING unnest(refrigerants, kinds) AS t (refrigerant, kind)
  WHERE l.company_id = company AND l.refrigerant = t.refrigerant AND l.kind = t.kind;
  INSERT INTO like_jobs
  SELECT company, t.refrigerant, t.kind, s.records, s.quartiles[1], s.quartiles[2], s.quartiles[3]
  FROM (SELECT DISTINCT * FROM unnest(refrigerants, kinds)) AS t (refrigerant, kind)
  CROSS JOIN LATERAL (
    SELECT count(*) AS records, percentile_cont(ARRAY[0.25, 0.5, 0.75]) WITHIN GROUP (ORDER BY r.recovery_yield) AS quartiles
    FROM recoveries r WHERE r.company_id = company AND r.refrigerant = t.refrigerant
      AND (CASE WHEN r.category IS NULL THEN '' ELSE r.category END) = t.kind AND r.exclusion IS NULL
  ) s WHERE s.records > 0;
END $$;
--> statement-breakpoint
-- The middle of all yields is found from where it was: a change moves its rank by no more places than records changed,
-- and the index is walked that far. `below` counts the yields less than the lower middle one.
CREATE FUNCTION move_middle_yield(company uuid, added double precision[], removed double precision[]) RETURNS void
LANGUAGE plpgsql AS $$
DECLARE
  middle middle_yields;
  pivot double precision;
  rank bigint;
BEGIN
  SELECT * INTO middle FROM middle_yields m WHERE m.company_id = company;
  IF NOT FOUND THEN
    middle.records := 0;
    middle.below := 0;
    middle.lower := (SELECT min(y) FROM unnest(added) y);
  END IF;
  pivot := middle.lower;
  middle.records := middle.records + cardinality(added) - cardinality(removed);
  IF middle.records = 0 THEN
    DELETE FROM middle_yields WHERE company_id = company;
    RETURN;
  END IF;
  middle.below := middle.below + (SELECT count(*) FROM unnest(added) y WHERE y < pivot)
                               - (SELECT count(*) FROM unnest(removed) y WHERE y < pivot);
  rank := (middle.records - 1) / 2;
  IF middle.below <= rank THEN
    SELECT r.recovery_yield INTO STRICT middle.lower FROM recoveries r
    WHERE r.company_id = company AND r.exclusion IS NULL AND r.recovery_yield >= pivot
    ORDER BY r.recovery_yield OFFSET rank - middle.below LIMIT 1;
    middle.below := middle.below + (SELECT count(*) FROM recoveries r WHERE r.company_id = company
      AND r.exclusion IS NULL AND r.recovery_yield >= pivot AND r.recovery_yield < middle.lower);
  ELSE
    SELECT r.recovery_yield INTO STRICT middle.lower FROM recoveries r
    WHERE r.company_id = company AND r.exclusion IS NULL AND r.recovery_yield < pivot
    ORDER BY r.recovery_yield DESC OFFSET middle.below - rank - 1 LIMIT 1;
    middle.below := middle.below - (SELECT count(*) FROM recoveries r WHERE r.company_id = company
      AND r.exclusion IS NULL AND r.recovery_yield >= middle.lower AND r.recovery_yield < pivot);
  END IF;
  middle.upper := middle.lower;
  IF middle.records % 2 = 0 THEN
    SELECT r.recovery_yield INTO STRICT middle.upper FROM recoveries r
    WHERE r.company_id = company AND r.exclusion IS NULL AND r.recovery_yield >= middle.lower
    ORDER BY r.recovery_yield OFFSET rank + 1 - middle.below LIMIT 1;
  END IF;
  INSERT INTO middle_yields VALUES (company, middle.records, middle.below, middle.lower, middle.upper)
  ON CONFLICT (company_id) DO UPDATE
  SET records = excluded.records, below = excluded.below, lower = excluded.lower, upper = excluded.upper;
END $$;
--> statement-breakpoint
-- Everything of one company anew from its records.
CREATE FUNCTION renew_summaries(company uuid) RETURNS void LANGUAGE plpgsql AS $$
BEGIN
  PERFORM renew_groups(company, (SELECT array_agg(t.id) FROM technicians t WHERE t.company_id = company),
                       (SELECT array_agg(s.id) FROM sites s WHERE s.company_id = company));
  DELETE FROM like_jobs WHERE company_id = company;
  PERFORM renew_like_jobs(company, array_agg(k.refrigerant), array_agg(k.kind))
  FROM (SELECT DISTINCT r.refrigerant, CASE WHEN r.category IS NULL THEN '' ELSE r.category END AS kind FROM recoveries r
        WHERE r.company_id = company AND r.exclusion IS NULL) k;
  DELETE FROM middle_yields WHERE company_id = company;
  PERFORM move_middle_yield(company, array_agg(r.recovery_yield), '{}')
  FROM recoveries r WHERE r.company_id = company AND r.exclusion IS NULL HAVING count(*) > 0;
END $$;
--> statement-breakpoint
-- As keep_months(): it runs after the history trigger, whose lock lets one transaction of a company at a time add up, and
-- without a technician's narrower scope. A correction that leaves these figures alone renews nothing.
CREATE FUNCTION keep_summaries() RETURNS trigger LANGUAGE plpgsql SECURITY DEFINER SET search_path = public, pg_temp AS $$
DECLARE
  company uuid := nullif(current_setting('app.company_id', true), '')::uuid;
  narrowed text := coalesce(current_setting('app.technician_id', true), '');
  changed text := CASE TG_OP
    WHEN 'INSERT' THEN 'SELECT 1 AS n, * FROM new_rows'
    WHEN 'DELETE' THEN 'SELECT -1 AS n, * FROM old_rows'
    ELSE 'SELECT 1 AS n, * FROM new_rows UNION ALL SELECT -1, * FROM old_rows' END;
  touched record;
BEGIN
  EXECUTE format(
    $touched$
    SELECT array_agg(DISTINCT technician_id) AS technicians, array_agg(DISTINCT site_id) AS sites,
           array_agg(refrigerant) AS refrigerants, array_agg(kind) AS kinds,
           coalesce(array_agg(recovery_yield) FILTER (WHERE n > 0), '{}') AS added,
           coalesce(array_agg(recovery_yield) FILTER (WHERE n < 0), '{}') AS removed
    FROM (SELECT id, technician_id, site_id, appliance_id, refrigerant, coalesce(category, '') AS kind, recovered_on,
                 recovered_mass_kg, full_charge_kg, recovery_yield, sum(n) AS n
          FROM (%s) rows WHERE exclusion IS NULL GROUP BY 1, 2, 3, 4, 5, 6, 7, 8, 9, 10 HAVING sum(n) <> 0) net
    $touched$, changed) INTO touched;
  IF touched.sites IS NOT NULL THEN
    PERFORM set_config('app.technician_id', '', true);
    PERFORM renew_groups(company, touched.technicians, touched.sites);
    PERFORM renew_like_jobs(company, touched.refrigerants, touched.kinds);
    PERFORM move_middle_yield(company, touched.added, touched.removed);
    PERFORM set_config('app.technician_id', narrowed, true);
  END IF;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER recoveries_summaries_insert AFTER INSERT ON recoveries REFERENCING NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_summaries();
--> statement-breakpoint
CREATE TRIGGER recoveries_summaries_update AFTER UPDATE ON recoveries REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_summaries();
--> statement-breakpoint
CREATE TRIGGER recoveries_summaries_delete AFTER DELETE ON recoveries REFERENCING OLD TABLE AS old_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_summaries();
--> statement-breakpoint
-- Records that were there before. The owner of the tables sees the companies' list for as long as this takes.
ALTER TABLE companies NO FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
DO $$
DECLARE company uuid;
BEGIN
  FOR company IN SELECT id FROM companies LOOP
    PERFORM set_config('app.company_id', company::text, true);
    PERFORM renew_summaries(company);
  END LOOP;
  PERFORM set_config('app.company_id', '', true);
END $$;
--> statement-breakpoint
ALTER TABLE companies FORCE ROW LEVEL SECURITY;
