CREATE TABLE "monthly_summary" (
	"company_id" uuid NOT NULL,
	"dimension" text NOT NULL,
	"month" date NOT NULL,
	"key" text NOT NULL,
	"recoveries" integer NOT NULL,
	"recovered_mass_kg" numeric(16, 9) NOT NULL,
	"full_charge_kg" numeric(16, 9) NOT NULL,
	"median_yield" double precision NOT NULL,
	"co2e_kg" double precision NOT NULL,
	"vacuum_stated" integer NOT NULL,
	"down_to_level" integer NOT NULL,
	"hold_stated" integer NOT NULL,
	"held" integer NOT NULL,
	CONSTRAINT "monthly_summary_company_id_dimension_month_key_pk" PRIMARY KEY("company_id","dimension","month","key")
);
--> statement-breakpoint
ALTER TABLE "monthly_summary" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
DROP VIEW "public"."monthly_recovered_mass_by_branch";--> statement-breakpoint
DROP VIEW "public"."monthly_recovered_mass_by_category";--> statement-breakpoint
DROP VIEW "public"."monthly_recovered_mass_by_job_type";--> statement-breakpoint
DROP VIEW "public"."monthly_recovered_mass_by_refrigerant";--> statement-breakpoint
DROP VIEW "public"."monthly_recovered_mass_by_site";--> statement-breakpoint
DROP VIEW "public"."monthly_recovered_mass_by_technician";--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass" WITH (security_invoker = true) AS (select "company_id", "month", nullif("monthly_summary"."key", '') as "key", "recovered_mass_kg" as "recovered_mass_kg", "full_charge_kg" as "full_charge_kg", "recoveries", "median_yield", "co2e_kg", "vacuum_stated", "down_to_level", "hold_stated", "held" from "monthly_summary" where "monthly_summary"."dimension" = 'all');--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_branch" WITH (security_invoker = true) AS (select "monthly_summary"."company_id", "monthly_summary"."month", "branches"."name" as "key", "monthly_summary"."recovered_mass_kg" as "recovered_mass_kg", "monthly_summary"."full_charge_kg" as "full_charge_kg", "monthly_summary"."recoveries", "monthly_summary"."median_yield", "monthly_summary"."co2e_kg", "monthly_summary"."vacuum_stated", "monthly_summary"."down_to_level", "monthly_summary"."hold_stated", "monthly_summary"."held" from "monthly_summary" left join "branches" on ("branches"."company_id" = "monthly_summary"."company_id" and "branches"."id" = nullif("monthly_summary"."key", '')::uuid) where "monthly_summary"."dimension" = 'branch');--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_category" WITH (security_invoker = true) AS (select "company_id", "month", nullif("monthly_summary"."key", '') as "key", "recovered_mass_kg" as "recovered_mass_kg", "full_charge_kg" as "full_charge_kg", "recoveries", "median_yield", "co2e_kg", "vacuum_stated", "down_to_level", "hold_stated", "held" from "monthly_summary" where "monthly_summary"."dimension" = 'category');--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_job_type" WITH (security_invoker = true) AS (select "company_id", "month", nullif("monthly_summary"."key", '') as "key", "recovered_mass_kg" as "recovered_mass_kg", "full_charge_kg" as "full_charge_kg", "recoveries", "median_yield", "co2e_kg", "vacuum_stated", "down_to_level", "hold_stated", "held" from "monthly_summary" where "monthly_summary"."dimension" = 'job_type');--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_refrigerant" WITH (security_invoker = true) AS (select "company_id", "month", nullif("monthly_summary"."key", '') as "key", "recovered_mass_kg" as "recovered_mass_kg", "full_charge_kg" as "full_charge_kg", "recoveries", "median_yield", "co2e_kg", "vacuum_stated", "down_to_level", "hold_stated", "held" from "monthly_summary" where "monthly_summary"."dimension" = 'refrigerant');--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_site" WITH (security_invoker = true) AS (select "monthly_summary"."company_id", "monthly_summary"."month", "sites"."name" as "key", "monthly_summary"."recovered_mass_kg" as "recovered_mass_kg", "monthly_summary"."full_charge_kg" as "full_charge_kg", "monthly_summary"."recoveries", "monthly_summary"."median_yield", "monthly_summary"."co2e_kg", "monthly_summary"."vacuum_stated", "monthly_summary"."down_to_level", "monthly_summary"."hold_stated", "monthly_summary"."held" from "monthly_summary" left join "sites" on ("sites"."company_id" = "monthly_summary"."company_id" and "sites"."id" = nullif("monthly_summary"."key", '')::uuid) where "monthly_summary"."dimension" = 'site');--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_technician" WITH (security_invoker = true) AS (select "monthly_summary"."company_id", "monthly_summary"."month", "technicians"."name" as "key", "monthly_summary"."recovered_mass_kg" as "recovered_mass_kg", "monthly_summary"."full_charge_kg" as "full_charge_kg", "monthly_summary"."recoveries", "monthly_summary"."median_yield", "monthly_summary"."co2e_kg", "monthly_summary"."vacuum_stated", "monthly_summary"."down_to_level", "monthly_summary"."hold_stated", "monthly_summary"."held" from "monthly_summary" left join "technicians" on ("technicians"."company_id" = "monthly_summary"."company_id" and "technicians"."id" = nullif("monthly_summary"."key", '')::uuid) where "monthly_summary"."dimension" = 'technician');--> statement-breakpoint
CREATE POLICY "of_company" ON "monthly_summary" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "monthly_summary" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);