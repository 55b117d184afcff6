CREATE TABLE "flag_baselines" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"judging" text NOT NULL,
	"content" jsonb NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "flag_baselines_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "flag_baselines" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "flag_renewals" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"judging" text NOT NULL,
	"baseline_id" uuid NOT NULL,
	"records" integer NOT NULL,
	"added" integer NOT NULL,
	"changed" integer NOT NULL,
	"gone" integer NOT NULL,
	"judged_singly" integer DEFAULT 0 NOT NULL,
	"renewed_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "flag_renewals_company_id_pk" PRIMARY KEY("company_id")
);
--> statement-breakpoint
ALTER TABLE "flag_renewals" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "flags_due" (
	"company_id" uuid NOT NULL,
	"recovery_id" uuid NOT NULL,
	"touches" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "flags_due_company_id_recovery_id_pk" PRIMARY KEY("company_id","recovery_id")
);
--> statement-breakpoint
ALTER TABLE "flags_due" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
DROP INDEX "flags_by_certainty";--> statement-breakpoint
ALTER TABLE "flag_decisions" ADD COLUMN "follows_id" uuid;--> statement-breakpoint
ALTER TABLE "flags" ADD COLUMN "baseline_id" uuid NOT NULL;--> statement-breakpoint
ALTER TABLE "flags" ADD COLUMN "decision" text;--> statement-breakpoint
ALTER TABLE "flags" ADD COLUMN "decided_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "flags" ADD COLUMN "note" text;--> statement-breakpoint
ALTER TABLE "flags" ADD CONSTRAINT "flags_company_id_baseline_id_flag_baselines_company_id_id_fk" FOREIGN KEY ("company_id","baseline_id") REFERENCES "public"."flag_baselines"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "flags_by_baseline" ON "flags" USING btree ("company_id","baseline_id");--> statement-breakpoint
CREATE INDEX "flags_that_count" ON "flags" USING btree ("company_id","recovery_id") WHERE state = 'open' and certainty >= 0.5 and rule <> 'short_on_arrival';--> statement-breakpoint
CREATE INDEX "flags_that_excuse" ON "flags" USING btree ("company_id","recovery_id") WHERE decision in ('leaked_before', 'known_low_charge');--> statement-breakpoint
CREATE INDEX "flags_by_certainty" ON "flags" USING btree ("company_id","state","certainty","id");--> statement-breakpoint
ALTER TABLE "flags" DROP COLUMN "baseline";--> statement-breakpoint
CREATE VIEW "public"."flagged_recoveries" WITH (security_invoker = true) AS (select "company_id", "recovery_id", max("certainty") as "certainty" from "flags" where ("flags"."state" = 'open' and "flags"."certainty" >= 0.5 and "flags"."rule" <> 'short_on_arrival') group by "flags"."company_id", "flags"."recovery_id");--> statement-breakpoint
CREATE VIEW "public"."recovery_excuses" WITH (security_invoker = true) AS (select distinct "company_id", "recovery_id" from "flags" where "flags"."decision" in ('leaked_before', 'known_low_charge'));--> statement-breakpoint
CREATE POLICY "of_technician" ON "flag_decisions" AS RESTRICTIVE FOR ALL TO public USING (case when (select nullif(current_setting('app.technician_id', true), '')) is null then true else exists (select from flags f where f.company_id = flag_decisions.company_id and f.id = flag_decisions.flag_id) end);--> statement-breakpoint
CREATE POLICY "of_technician" ON "flags" AS RESTRICTIVE FOR ALL TO public USING (case when (select nullif(current_setting('app.technician_id', true), '')) is null then true else exists (select from recoveries r where r.company_id = flags.company_id and r.id = flags.recovery_id) end);--> statement-breakpoint
CREATE POLICY "of_company" ON "flag_baselines" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "flag_renewals" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "flags_due" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);
--> statement-breakpoint
-- By hand from here on: what Drizzle 0.45 cannot express.
ALTER TABLE flag_baselines FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE flag_renewals FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE flags_due FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE flags ADD CONSTRAINT flags_assigned_to_member FOREIGN KEY (company_id, assigned_to)
  REFERENCES memberships (company_id, person_id) ON DELETE SET NULL (assigned_to);
--> statement-breakpoint
CREATE INDEX flags_by_assigned ON flags (company_id, assigned_to) WHERE assigned_to IS NOT NULL;
--> statement-breakpoint
-- What people do with flags stands in the history; what a renewal does follows from the records and is told by the one
-- row of flag_renewals, or each import would write the history of thousands of flags.
DROP TRIGGER flags_history_insert ON flags;
--> statement-breakpoint
DROP TRIGGER flags_history_update ON flags;
--> statement-breakpoint
DROP TRIGGER flags_history_delete ON flags;
--> statement-breakpoint
CREATE TRIGGER flags_history_insert AFTER INSERT ON flags REFERENCING NEW TABLE AS new_rows FOR EACH STATEMENT
  WHEN (current_setting('app.actor', true) IS DISTINCT FROM 'renewal of flags') EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER flags_history_update AFTER UPDATE ON flags REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows FOR EACH STATEMENT
  WHEN (current_setting('app.actor', true) IS DISTINCT FROM 'renewal of flags') EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER flags_history_delete AFTER DELETE ON flags REFERENCING OLD TABLE AS old_rows FOR EACH STATEMENT
  WHEN (current_setting('app.actor', true) IS DISTINCT FROM 'renewal of flags') EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER flag_renewals_history_insert AFTER INSERT ON flag_renewals REFERENCING NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER flag_renewals_history_update AFTER UPDATE ON flag_renewals REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER flag_renewals_history_delete AFTER DELETE ON flag_renewals REFERENCING OLD TABLE AS old_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
-- Flags that may no longer hold: those of the changed records and of the other records of their appliances and
-- cylinders. From 200 changed records on everything is judged anew, which is one row of zeros. SECURITY DEFINER and
-- without a technician's narrower scope: his edit may touch a colleague's record.
CREATE FUNCTION note_flags_due(company uuid, changed_records bigint, appliances uuid[], cylinders uuid[]) RETURNS void
LANGUAGE plpgsql SECURITY DEFINER SET search_path = public, pg_temp AS $$
DECLARE
  narrowed text := coalesce(current_setting('app.technician_id', true), '');
BEGIN
  IF changed_records = 0 THEN RETURN; END IF;
  PERFORM set_config('app.technician_id', '', true);
  IF changed_records >= 200 THEN
    INSERT INTO flags_due AS due (company_id, recovery_id) VALUES (company, '00000000-0000-0000-0000-000000000000')
    ON CONFLICT (company_id, recovery_id) DO UPDATE SET touches = due.touches + 1;
  ELSE
    INSERT INTO flags_due AS due (company_id, recovery_id)
    SELECT company, r.id FROM recoveries r
    WHERE r.company_id = company AND (r.appliance_id = ANY (appliances) OR r.cylinder_id = ANY (cylinders))
    ORDER BY r.id
    ON CONFLICT (company_id, recovery_id) DO UPDATE SET touches = due.touches + 1;
  END IF;
  PERFORM set_config('app.technician_id', narrowed, true);
END $$;
--> statement-breakpoint
CREATE FUNCTION keep_flags_due() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE
  company uuid := nullif(current_setting('app.company_id', true), '')::uuid;
BEGIN
  -- The three forms differ only in where the rows come from: transition tables must be named in the text.
  IF TG_OP = 'INSERT' THEN
    PERFORM note_flags_due(company, count(*), array_agg(DISTINCT appliance_id) FILTER (WHERE n <= 200),
                           array_agg(DISTINCT cylinder_id) FILTER (WHERE n <= 200))
    FROM (SELECT appliance_id, cylinder_id, row_number() OVER () AS n FROM new_rows) changed;
  ELSIF TG_OP = 'UPDATE' THEN
    PERFORM note_flags_due(company, count(*), array_agg(DISTINCT appliance_id) FILTER (WHERE n <= 400),
                           array_agg(DISTINCT cylinder_id) FILTER (WHERE n <= 400))
    FROM (SELECT appliance_id, cylinder_id, row_number() OVER () AS n
          FROM (SELECT appliance_id, cylinder_id FROM new_rows UNION ALL SELECT appliance_id, cylinder_id FROM old_rows) both_rows) changed;
  ELSE
    PERFORM note_flags_due(company, count(*), array_agg(DISTINCT appliance_id) FILTER (WHERE n <= 200),
                           array_agg(DISTINCT cylinder_id) FILTER (WHERE n <= 200))
    FROM (SELECT appliance_id, cylinder_id, row_number() OVER () AS n FROM old_rows) changed;
  END IF;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER recoveries_flags_due_insert AFTER INSERT ON recoveries REFERENCING NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_flags_due();
--> statement-breakpoint
CREATE TRIGGER recoveries_flags_due_update AFTER UPDATE ON recoveries REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_flags_due();
--> statement-breakpoint
CREATE TRIGGER recoveries_flags_due_delete AFTER DELETE ON recoveries REFERENCING OLD TABLE AS old_rows
  FOR EACH STATEMENT EXECUTE FUNCTION keep_flags_due();
