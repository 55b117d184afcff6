CREATE TABLE "addition_imports" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"file_name" text NOT NULL,
	"file_sha256" text NOT NULL,
	"rows_read" integer NOT NULL,
	"added" integer NOT NULL,
	"updated" integer NOT NULL,
	"unchanged" integer NOT NULL,
	"rejected" integer NOT NULL,
	"refused" jsonb NOT NULL,
	"ledger" jsonb NOT NULL,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"undone_at" timestamp with time zone,
	CONSTRAINT "addition_imports_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "addition_imports" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "charge_additions" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"addition_ref" text,
	"appliance_id" uuid NOT NULL,
	"added_on" date NOT NULL,
	"added_charge_kg" numeric(16, 9) NOT NULL,
	"mass_unit" text NOT NULL,
	"entered_mass" text NOT NULL,
	"reason" text NOT NULL,
	"leaks_verified_on" date,
	"notes" text,
	"import_id" uuid,
	"source_hash" text,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "charge_additions_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "charge_additions_mass" CHECK (added_charge_kg > 0),
	CONSTRAINT "charge_additions_verified" CHECK (leaks_verified_on >= added_on)
);
--> statement-breakpoint
ALTER TABLE "charge_additions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "site_leak_methods" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"method" text NOT NULL,
	"chosen_by" text NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "site_leak_methods_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "site_leak_methods" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "appliances" ADD COLUMN "light_commercial" boolean;--> statement-breakpoint
ALTER TABLE "addition_imports" ADD CONSTRAINT "addition_imports_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "charge_additions" ADD CONSTRAINT "charge_additions_company_id_appliance_id_appliances_company_id_id_fk" FOREIGN KEY ("company_id","appliance_id") REFERENCES "public"."appliances"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_leak_methods" ADD CONSTRAINT "site_leak_methods_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "addition_imports_by_time" ON "addition_imports" USING btree ("company_id","created_at");--> statement-breakpoint
CREATE UNIQUE INDEX "charge_additions_ref" ON "charge_additions" USING btree ("company_id","addition_ref");--> statement-breakpoint
CREATE INDEX "charge_additions_by_appliance" ON "charge_additions" USING btree ("company_id","appliance_id","added_on");--> statement-breakpoint
CREATE UNIQUE INDEX "site_leak_methods_site" ON "site_leak_methods" USING btree ("company_id","site_id");--> statement-breakpoint
CREATE VIEW "public"."appliance_charges" WITH (security_invoker = true) AS (select "company_id", "appliance_id", mode() within group (order by "full_charge_kg") as "full_charge_kg", (array_agg("refrigerant" order by "recovered_on" desc, "id"))[1] as "refrigerant", (array_agg("category" order by "recovered_on" desc, "id"))[1] as "category" from "recoveries" where "recoveries"."exclusion" is null group by "recoveries"."company_id", "recoveries"."appliance_id");--> statement-breakpoint
CREATE POLICY "of_company" ON "addition_imports" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "addition_imports" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);--> statement-breakpoint
CREATE POLICY "of_company" ON "charge_additions" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "charge_additions" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);--> statement-breakpoint
CREATE POLICY "of_company" ON "site_leak_methods" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "site_leak_methods" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);
--> statement-breakpoint
ALTER TABLE addition_imports FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE charge_additions FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE site_leak_methods FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE TRIGGER charge_additions_count_edit BEFORE UPDATE ON charge_additions FOR EACH ROW EXECUTE FUNCTION count_edit();
--> statement-breakpoint
CREATE TRIGGER charge_additions_history_insert AFTER INSERT ON charge_additions REFERENCING NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER charge_additions_history_update AFTER UPDATE ON charge_additions REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER charge_additions_history_delete AFTER DELETE ON charge_additions REFERENCING OLD TABLE AS old_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER site_leak_methods_count_edit BEFORE UPDATE ON site_leak_methods FOR EACH ROW EXECUTE FUNCTION count_edit();
--> statement-breakpoint
CREATE TRIGGER site_leak_methods_history_insert AFTER INSERT ON site_leak_methods REFERENCING NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER site_leak_methods_history_update AFTER UPDATE ON site_leak_methods REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER site_leak_methods_history_delete AFTER DELETE ON site_leak_methods REFERENCING OLD TABLE AS old_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
