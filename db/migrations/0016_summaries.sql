CREATE TABLE "group_summary" (
	"company_id" uuid NOT NULL,
	"dimension" text NOT NULL,
	"group_id" uuid NOT NULL,
	"recoveries" integer NOT NULL,
	"recovered_mass_kg" numeric(20, 9) NOT NULL,
	"full_charge_kg" numeric(20, 9) NOT NULL,
	"median_yield" double precision NOT NULL,
	"appliances" integer,
	"first_recovered_on" date NOT NULL,
	"last_recovered_on" date NOT NULL,
	CONSTRAINT "group_summary_company_id_dimension_group_id_pk" PRIMARY KEY("company_id","dimension","group_id")
);
--> statement-breakpoint
ALTER TABLE "group_summary" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "like_jobs" (
	"company_id" uuid NOT NULL,
	"refrigerant" text NOT NULL,
	"kind" text NOT NULL,
	"records" integer NOT NULL,
	"lower_quartile" double precision NOT NULL,
	"median_yield" double precision NOT NULL,
	"upper_quartile" double precision NOT NULL,
	CONSTRAINT "like_jobs_company_id_refrigerant_kind_pk" PRIMARY KEY("company_id","refrigerant","kind")
);
--> statement-breakpoint
ALTER TABLE "like_jobs" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "middle_yields" (
	"company_id" uuid PRIMARY KEY NOT NULL,
	"records" bigint NOT NULL,
	"below" bigint NOT NULL,
	"lower" double precision NOT NULL,
	"upper" double precision NOT NULL
);
--> statement-breakpoint
ALTER TABLE "middle_yields" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
DROP VIEW "public"."low_recoveries";--> statement-breakpoint
DROP VIEW "public"."yield_limits";--> statement-breakpoint
DROP INDEX "recoveries_by_technician";--> statement-breakpoint
DROP INDEX "recoveries_by_site";--> statement-breakpoint
CREATE INDEX "recoveries_by_yield" ON "recoveries" USING btree ("company_id","recovery_yield") WHERE exclusion is null;--> statement-breakpoint
CREATE INDEX "recoveries_left_out" ON "recoveries" USING btree ("company_id","recovered_on") WHERE exclusion is not null;--> statement-breakpoint
CREATE VIEW "public"."recovered_by_site" WITH (security_invoker = true) AS (select "group_summary"."company_id", "group_summary"."group_id", "sites"."name", "group_summary"."recoveries", "group_summary"."recovered_mass_kg", "group_summary"."full_charge_kg", ("group_summary"."recovered_mass_kg" / "group_summary"."full_charge_kg") as "total_yield", "group_summary"."median_yield", "group_summary"."appliances" as "appliances", "group_summary"."first_recovered_on", "group_summary"."last_recovered_on" from "group_summary" inner join "sites" on ("sites"."company_id" = "group_summary"."company_id" and "sites"."id" = "group_summary"."group_id") where "group_summary"."dimension" = 'site');--> statement-breakpoint
CREATE VIEW "public"."recovered_by_technician" WITH (security_invoker = true) AS (select "group_summary"."company_id", "group_summary"."group_id", "technicians"."name", "group_summary"."recoveries", "group_summary"."recovered_mass_kg", "group_summary"."full_charge_kg", ("group_summary"."recovered_mass_kg" / "group_summary"."full_charge_kg") as "total_yield", "group_summary"."median_yield", "group_summary"."appliances" as "appliances", "group_summary"."first_recovered_on", "group_summary"."last_recovered_on" from "group_summary" inner join "technicians" on ("technicians"."company_id" = "group_summary"."company_id" and "technicians"."id" = "group_summary"."group_id") where "group_summary"."dimension" = 'technician');--> statement-breakpoint
CREATE VIEW "public"."low_recoveries" WITH (security_invoker = true) AS (select "limits"."company_id", "below"."id", "below"."recovered_month", "below"."recovery_yield", "like_jobs", "lower_quartile", "median_yield", "upper_quartile", "lower_fence" from ((select "company_id", "refrigerant", nullif("kind", '') as "category", "kind" as "kind", "records" as "like_jobs", "lower_quartile" as "lower_quartile", "median_yield" as "median_yield", "upper_quartile" as "upper_quartile", 2.5 * "like_jobs"."lower_quartile" - 1.5 * "like_jobs"."upper_quartile" as "lower_fence" from "like_jobs") union all (select "company_id", "refrigerant", nullif(case when "peer"."category" is null then '' else "peer"."category" end, '') as "category", case when "peer"."category" is null then '' else "peer"."category" end as "kind", count(*) as "like_jobs", percentile_cont(0.25) within group (order by "peer"."recovery_yield") as "lower_quartile", percentile_cont(0.5) within group (order by "peer"."recovery_yield") as "median_yield", percentile_cont(0.75) within group (order by "peer"."recovery_yield") as "upper_quartile", 2.5 * percentile_cont(0.25) within group (order by "peer"."recovery_yield") - 1.5 * percentile_cont(0.75) within group (order by "peer"."recovery_yield") as "lower_fence" from "recoveries" "peer" where ("peer"."exclusion" is null and (select nullif(current_setting('app.technician_id', true), '')) is not null) group by "peer"."company_id", "peer"."refrigerant", case when "peer"."category" is null then '' else "peer"."category" end)) "limits" cross join lateral (select "id", "recovered_month", "recovery_yield" from "recoveries" where ("recoveries"."company_id" = "limits"."company_id" and "recoveries"."refrigerant" = "limits"."refrigerant" and case when "recoveries"."category" is null then '' else "recoveries"."category" end = "kind" and "recoveries"."exclusion" is null and "recoveries"."recovery_yield" < "lower_fence") order by "recoveries"."recovery_yield") "below" where "like_jobs" >= 20);--> statement-breakpoint
CREATE VIEW "public"."yield_limits" WITH (security_invoker = true) AS ((select "company_id", "refrigerant", nullif("kind", '') as "category", "kind" as "kind", "records" as "like_jobs", "lower_quartile" as "lower_quartile", "median_yield" as "median_yield", "upper_quartile" as "upper_quartile", 2.5 * "like_jobs"."lower_quartile" - 1.5 * "like_jobs"."upper_quartile" as "lower_fence" from "like_jobs") union all (select "company_id", "refrigerant", nullif(case when "peer"."category" is null then '' else "peer"."category" end, '') as "category", case when "peer"."category" is null then '' else "peer"."category" end as "kind", count(*) as "like_jobs", percentile_cont(0.25) within group (order by "peer"."recovery_yield") as "lower_quartile", percentile_cont(0.5) within group (order by "peer"."recovery_yield") as "median_yield", percentile_cont(0.75) within group (order by "peer"."recovery_yield") as "upper_quartile", 2.5 * percentile_cont(0.25) within group (order by "peer"."recovery_yield") - 1.5 * percentile_cont(0.75) within group (order by "peer"."recovery_yield") as "lower_fence" from "recoveries" "peer" where ("peer"."exclusion" is null and (select nullif(current_setting('app.technician_id', true), '')) is not null) group by "peer"."company_id", "peer"."refrigerant", case when "peer"."category" is null then '' else "peer"."category" end));--> statement-breakpoint
CREATE POLICY "of_company" ON "group_summary" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "group_summary" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);--> statement-breakpoint
CREATE POLICY "of_company" ON "like_jobs" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "like_jobs" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);--> statement-breakpoint
CREATE POLICY "of_company" ON "middle_yields" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "middle_yields" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);