CREATE TABLE "notes" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"from_day" date NOT NULL,
	"to_day" date NOT NULL,
	"text" text NOT NULL,
	"written_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "notes_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "notes_days" CHECK (from_day <= to_day),
	CONSTRAINT "notes_text" CHECK (char_length(text) between 1 and 500)
);
--> statement-breakpoint
ALTER TABLE "notes" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
DROP VIEW "public"."recovery_facts";--> statement-breakpoint
CREATE INDEX "notes_by_day" ON "notes" USING btree ("company_id","from_day");--> statement-breakpoint
CREATE VIEW "public"."recovery_facts" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."id", "recoveries"."record_ref", "recoveries"."recovered_on", "recoveries"."recovered_at", "recoveries"."recovered_month", "recoveries"."technician_id", "technicians"."name" as "technician", "recoveries"."site_id", "sites"."name" as "site", "recoveries"."appliance_id", "appliances"."name" as "appliance", "branches"."name" as "branch", "recoveries"."category", "recoveries"."job_type", "recoveries"."refrigerant", "recoveries"."full_charge_kg" as "full_charge_kg", "recoveries"."recovered_mass_kg" as "recovered_mass_kg", "recoveries"."recovery_yield", ("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar4") as "co2e_kg", ("recoveries"."final_vacuum_kpa_abs"::double precision <= required_level_kpa_abs("refrigerants"."pressure_class", "recoveries"."full_charge_kg", "recoveries"."category") + 0.1) as "down_to_level", ("recoveries"."hold_minutes" > 0) as "held", ("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar6") as "co2e_ar6_kg", "cylinders"."name" as "cylinder", "recoveries"."exclusion", "recoveries"."import_id", "recoveries"."version" from "recoveries" left join "refrigerants" on "refrigerants"."designation" = "recoveries"."refrigerant" left join "technicians" on ("technicians"."company_id" = "recoveries"."company_id" and "technicians"."id" = "recoveries"."technician_id") left join "sites" on ("sites"."company_id" = "recoveries"."company_id" and "sites"."id" = "recoveries"."site_id") left join "appliances" on ("appliances"."company_id" = "recoveries"."company_id" and "appliances"."id" = "recoveries"."appliance_id") left join "branches" on ("branches"."company_id" = "recoveries"."company_id" and "branches"."id" = "recoveries"."branch_id") left join "cylinders" on ("cylinders"."company_id" = "recoveries"."company_id" and "cylinders"."id" = "recoveries"."cylinder_id"));--> statement-breakpoint
CREATE POLICY "of_company" ON "notes" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "notes" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);--> statement-breakpoint
ALTER TABLE notes FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE TRIGGER notes_count_edit BEFORE UPDATE ON notes FOR EACH ROW EXECUTE FUNCTION count_edit();
--> statement-breakpoint
CREATE TRIGGER notes_history_insert AFTER INSERT ON notes REFERENCING NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER notes_history_update AFTER UPDATE ON notes REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER notes_history_delete AFTER DELETE ON notes REFERENCING OLD TABLE AS old_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
