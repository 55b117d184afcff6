CREATE TABLE "companies" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"time_zone" text DEFAULT 'America/New_York' NOT NULL,
	"mass_unit" text DEFAULT 'lb' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "companies" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "settings" (
	"company_id" uuid NOT NULL,
	"key" text NOT NULL,
	"value" jsonb NOT NULL,
	CONSTRAINT "settings_company_id_key_pk" PRIMARY KEY("company_id","key")
);
--> statement-breakpoint
ALTER TABLE "settings" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "flag_decisions" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"flag_id" uuid NOT NULL,
	"decision" text,
	"note" text,
	"decided_by" text NOT NULL,
	"decided_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "flag_decisions_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "flag_decisions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "flags" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"recovery_id" uuid NOT NULL,
	"rule" text NOT NULL,
	"certainty" double precision NOT NULL,
	"evidence" jsonb NOT NULL,
	"baseline" jsonb NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"assigned_to" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "flags_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "flags" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "history" (
	"company_id" uuid NOT NULL,
	"entry_no" bigint NOT NULL,
	"changed_at" timestamp with time zone NOT NULL,
	"table_name" text NOT NULL,
	"row_id" uuid NOT NULL,
	"action" text NOT NULL,
	"actor" text NOT NULL,
	"reason" text,
	"before" jsonb,
	"after" jsonb,
	"hash" text NOT NULL,
	CONSTRAINT "history_company_id_entry_no_pk" PRIMARY KEY("company_id","entry_no")
);
--> statement-breakpoint
ALTER TABLE "history" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "history_heads" (
	"company_id" uuid PRIMARY KEY NOT NULL,
	"entry_no" bigint NOT NULL,
	"hash" text NOT NULL
);
--> statement-breakpoint
ALTER TABLE "history_heads" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "import_file_chunks" (
	"company_id" uuid NOT NULL,
	"import_id" uuid NOT NULL,
	"chunk_no" integer NOT NULL,
	"bytes" "bytea" NOT NULL,
	CONSTRAINT "import_file_chunks_company_id_import_id_chunk_no_pk" PRIMARY KEY("company_id","import_id","chunk_no")
);
--> statement-breakpoint
ALTER TABLE "import_file_chunks" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "import_mappings" (
	"company_id" uuid NOT NULL,
	"header_key" text NOT NULL,
	"mapping" jsonb NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "import_mappings_company_id_header_key_pk" PRIMARY KEY("company_id","header_key")
);
--> statement-breakpoint
ALTER TABLE "import_mappings" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "import_rows" (
	"company_id" uuid NOT NULL,
	"import_id" uuid NOT NULL,
	"line" integer NOT NULL,
	"outcome" text NOT NULL,
	"record_ref" text,
	"recovery_id" uuid,
	"cells" text[],
	"reasons" jsonb,
	"before" jsonb,
	"version_after" integer,
	CONSTRAINT "import_rows_company_id_import_id_line_pk" PRIMARY KEY("company_id","import_id","line")
);
--> statement-breakpoint
ALTER TABLE "import_rows" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "imports" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"file_name" text NOT NULL,
	"file_size" bigint NOT NULL,
	"file_sha256" text NOT NULL,
	"status" text DEFAULT 'queued' NOT NULL,
	"dry_run" boolean DEFAULT false NOT NULL,
	"mapping" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"reading" jsonb,
	"header_key" text,
	"rows_read" integer DEFAULT 0 NOT NULL,
	"rows_total" integer,
	"added" integer DEFAULT 0 NOT NULL,
	"updated" integer DEFAULT 0 NOT NULL,
	"unchanged" integer DEFAULT 0 NOT NULL,
	"rejected" integer DEFAULT 0 NOT NULL,
	"summary" jsonb,
	"failure" text,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"started_at" timestamp with time zone,
	"finished_at" timestamp with time zone,
	"undone_at" timestamp with time zone,
	CONSTRAINT "imports_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "imports" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "access_tokens" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"token_hash" text NOT NULL,
	"label" text NOT NULL,
	"role" text NOT NULL,
	"technician_id" uuid,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "access_tokens_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "access_tokens" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "memberships" (
	"company_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"role" text NOT NULL,
	"technician_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "memberships_company_id_person_id_pk" PRIMARY KEY("company_id","person_id")
);
--> statement-breakpoint
ALTER TABLE "memberships" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "password_links" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone
);
--> statement-breakpoint
ALTER TABLE "password_links" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "people" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "people" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"person_id" uuid NOT NULL,
	"company_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"user_agent" text
);
--> statement-breakpoint
ALTER TABLE "sessions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "appliances" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"name_key" text GENERATED ALWAYS AS (lower(btrim(regexp_replace(normalize(name, NFC), '[[:space:]]+', ' ', 'g')))) STORED NOT NULL,
	"import_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"site_id" uuid NOT NULL,
	"category" text,
	"refrigerant" text,
	"nameplate_charge_kg" numeric(16, 9),
	"manufactured_on" date,
	CONSTRAINT "appliances_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "appliances" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "branches" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"name_key" text GENERATED ALWAYS AS (lower(btrim(regexp_replace(normalize(name, NFC), '[[:space:]]+', ' ', 'g')))) STORED NOT NULL,
	"import_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "branches_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "branches" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "cylinders" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"name_key" text GENERATED ALWAYS AS (lower(btrim(regexp_replace(normalize(name, NFC), '[[:space:]]+', ' ', 'g')))) STORED NOT NULL,
	"import_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"refrigerant" text,
	"tare_weight_kg" numeric(16, 9),
	"water_capacity_kg" numeric(16, 9),
	"specification" text,
	"requalified_on" date,
	"branch_id" uuid,
	CONSTRAINT "cylinders_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "cylinders" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "sites" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"name_key" text GENERATED ALWAYS AS (lower(btrim(regexp_replace(normalize(name, NFC), '[[:space:]]+', ' ', 'g')))) STORED NOT NULL,
	"import_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"branch_id" uuid,
	"address" text,
	CONSTRAINT "sites_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "sites" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "technician_certifications" (
	"company_id" uuid NOT NULL,
	"technician_id" uuid NOT NULL,
	"type" text NOT NULL,
	"card_number" text,
	"certified_on" date,
	"import_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "technician_certifications_company_id_technician_id_type_pk" PRIMARY KEY("company_id","technician_id","type")
);
--> statement-breakpoint
ALTER TABLE "technician_certifications" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "technicians" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"name_key" text GENERATED ALWAYS AS (lower(btrim(regexp_replace(normalize(name, NFC), '[[:space:]]+', ' ', 'g')))) STORED NOT NULL,
	"import_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"branch_id" uuid,
	"active" boolean DEFAULT true NOT NULL,
	CONSTRAINT "technicians_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "technicians" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "recoveries" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"record_ref" text NOT NULL,
	"recovered_on" date NOT NULL,
	"recovered_at" timestamp with time zone,
	"recovered_month" date GENERATED ALWAYS AS ((date_trunc('month', recovered_on::timestamp))::date) STORED NOT NULL,
	"technician_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"appliance_id" uuid NOT NULL,
	"branch_id" uuid,
	"category" text,
	"job_type" text,
	"refrigerant" text NOT NULL,
	"nameplate_charge_kg" numeric(16, 9) NOT NULL,
	"added_charge_kg" numeric(16, 9) DEFAULT '0' NOT NULL,
	"full_charge_kg" numeric(16, 9) GENERATED ALWAYS AS (nameplate_charge_kg + added_charge_kg) STORED NOT NULL,
	"start_weight_kg" numeric(16, 9),
	"end_weight_kg" numeric(16, 9),
	"recovered_mass_kg" numeric(16, 9) NOT NULL,
	"mass_unit" text NOT NULL,
	"final_vacuum_kpa_abs" numeric(12, 6),
	"vacuum_unit" text,
	"hold_minutes" double precision,
	"hold_rise_kpa" numeric(12, 6),
	"cylinder_id" uuid,
	"disposition" text,
	"manufactured_on" date,
	"technician_certification" text,
	"notes" text,
	"entered" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"extra" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"exclusion" text,
	"import_id" uuid,
	"import_line" integer,
	"source_hash" text,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "recoveries_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "recoveries_masses" CHECK (nameplate_charge_kg > 0 and added_charge_kg >= 0 and recovered_mass_kg >= 0)
);
--> statement-breakpoint
ALTER TABLE "recoveries" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "refrigerant_components" (
	"designation" text NOT NULL,
	"component" text NOT NULL,
	"mass_percent" double precision NOT NULL,
	"tolerance" text,
	CONSTRAINT "refrigerant_components_designation_component_pk" PRIMARY KEY("designation","component")
);
--> statement-breakpoint
CREATE TABLE "refrigerants" (
	"designation" text PRIMARY KEY NOT NULL,
	"type" text NOT NULL,
	"safety_class" text NOT NULL,
	"safety_class_source" text NOT NULL,
	"safety_class_mark" text NOT NULL,
	"gwp_ar4" double precision NOT NULL,
	"gwp_source" text NOT NULL,
	"gwp_mark" text NOT NULL,
	"gwp_ar6" double precision,
	"odp" double precision NOT NULL,
	"odp_source" text NOT NULL,
	"odp_mark" text NOT NULL,
	"liquid_density_kg_per_m3" double precision,
	"pressure_at_104_f_psia" double precision,
	"pressure_class" text NOT NULL,
	"density_source" text NOT NULL,
	"density_mark" text NOT NULL,
	"composition_source" text NOT NULL,
	"composition_mark" text NOT NULL
);
--> statement-breakpoint
ALTER TABLE "settings" ADD CONSTRAINT "settings_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flag_decisions" ADD CONSTRAINT "flag_decisions_company_id_flag_id_flags_company_id_id_fk" FOREIGN KEY ("company_id","flag_id") REFERENCES "public"."flags"("company_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flags" ADD CONSTRAINT "flags_company_id_recovery_id_recoveries_company_id_id_fk" FOREIGN KEY ("company_id","recovery_id") REFERENCES "public"."recoveries"("company_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "import_file_chunks" ADD CONSTRAINT "import_file_chunks_company_id_import_id_imports_company_id_id_fk" FOREIGN KEY ("company_id","import_id") REFERENCES "public"."imports"("company_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "import_mappings" ADD CONSTRAINT "import_mappings_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "import_rows" ADD CONSTRAINT "import_rows_company_id_import_id_imports_company_id_id_fk" FOREIGN KEY ("company_id","import_id") REFERENCES "public"."imports"("company_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "imports" ADD CONSTRAINT "imports_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "access_tokens" ADD CONSTRAINT "access_tokens_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "access_tokens" ADD CONSTRAINT "access_tokens_company_id_technician_id_technicians_company_id_id_fk" FOREIGN KEY ("company_id","technician_id") REFERENCES "public"."technicians"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_company_id_technician_id_technicians_company_id_id_fk" FOREIGN KEY ("company_id","technician_id") REFERENCES "public"."technicians"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "password_links" ADD CONSTRAINT "password_links_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "appliances" ADD CONSTRAINT "appliances_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "appliances" ADD CONSTRAINT "appliances_refrigerant_refrigerants_designation_fk" FOREIGN KEY ("refrigerant") REFERENCES "public"."refrigerants"("designation") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "appliances" ADD CONSTRAINT "appliances_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "branches" ADD CONSTRAINT "branches_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cylinders" ADD CONSTRAINT "cylinders_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cylinders" ADD CONSTRAINT "cylinders_refrigerant_refrigerants_designation_fk" FOREIGN KEY ("refrigerant") REFERENCES "public"."refrigerants"("designation") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cylinders" ADD CONSTRAINT "cylinders_company_id_branch_id_branches_company_id_id_fk" FOREIGN KEY ("company_id","branch_id") REFERENCES "public"."branches"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sites" ADD CONSTRAINT "sites_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sites" ADD CONSTRAINT "sites_company_id_branch_id_branches_company_id_id_fk" FOREIGN KEY ("company_id","branch_id") REFERENCES "public"."branches"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "technician_certifications" ADD CONSTRAINT "technician_certifications_company_id_technician_id_technicians_company_id_id_fk" FOREIGN KEY ("company_id","technician_id") REFERENCES "public"."technicians"("company_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "technicians" ADD CONSTRAINT "technicians_company_id_companies_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "technicians" ADD CONSTRAINT "technicians_company_id_branch_id_branches_company_id_id_fk" FOREIGN KEY ("company_id","branch_id") REFERENCES "public"."branches"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recoveries" ADD CONSTRAINT "recoveries_refrigerant_refrigerants_designation_fk" FOREIGN KEY ("refrigerant") REFERENCES "public"."refrigerants"("designation") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recoveries" ADD CONSTRAINT "recoveries_company_id_technician_id_technicians_company_id_id_fk" FOREIGN KEY ("company_id","technician_id") REFERENCES "public"."technicians"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recoveries" ADD CONSTRAINT "recoveries_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recoveries" ADD CONSTRAINT "recoveries_company_id_appliance_id_appliances_company_id_id_fk" FOREIGN KEY ("company_id","appliance_id") REFERENCES "public"."appliances"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recoveries" ADD CONSTRAINT "recoveries_company_id_branch_id_branches_company_id_id_fk" FOREIGN KEY ("company_id","branch_id") REFERENCES "public"."branches"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recoveries" ADD CONSTRAINT "recoveries_company_id_cylinder_id_cylinders_company_id_id_fk" FOREIGN KEY ("company_id","cylinder_id") REFERENCES "public"."cylinders"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "refrigerant_components" ADD CONSTRAINT "refrigerant_components_designation_refrigerants_designation_fk" FOREIGN KEY ("designation") REFERENCES "public"."refrigerants"("designation") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "flag_decisions_by_flag" ON "flag_decisions" USING btree ("company_id","flag_id","decided_at");--> statement-breakpoint
CREATE UNIQUE INDEX "flags_of_record" ON "flags" USING btree ("company_id","recovery_id","rule");--> statement-breakpoint
CREATE INDEX "flags_by_certainty" ON "flags" USING btree ("company_id","state","certainty");--> statement-breakpoint
CREATE INDEX "history_by_row" ON "history" USING btree ("company_id","table_name","row_id","entry_no");--> statement-breakpoint
CREATE INDEX "import_rows_by_recovery" ON "import_rows" USING btree ("company_id","recovery_id");--> statement-breakpoint
CREATE INDEX "imports_by_time" ON "imports" USING btree ("company_id","created_at");--> statement-breakpoint
CREATE UNIQUE INDEX "access_tokens_hash" ON "access_tokens" USING btree ("token_hash");--> statement-breakpoint
CREATE INDEX "memberships_person" ON "memberships" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "password_links_person" ON "password_links" USING btree ("person_id");--> statement-breakpoint
CREATE UNIQUE INDEX "people_email" ON "people" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "sessions_person" ON "sessions" USING btree ("person_id");--> statement-breakpoint
CREATE UNIQUE INDEX "appliances_name" ON "appliances" USING btree ("company_id","site_id","name_key");--> statement-breakpoint
CREATE INDEX "appliances_import" ON "appliances" USING btree ("company_id","import_id");--> statement-breakpoint
CREATE UNIQUE INDEX "branches_name" ON "branches" USING btree ("company_id","name_key");--> statement-breakpoint
CREATE UNIQUE INDEX "cylinders_name" ON "cylinders" USING btree ("company_id","name_key");--> statement-breakpoint
CREATE INDEX "cylinders_import" ON "cylinders" USING btree ("company_id","import_id");--> statement-breakpoint
CREATE UNIQUE INDEX "sites_name" ON "sites" USING btree ("company_id","name_key");--> statement-breakpoint
CREATE UNIQUE INDEX "technicians_name" ON "technicians" USING btree ("company_id","name_key");--> statement-breakpoint
CREATE UNIQUE INDEX "recoveries_record_ref" ON "recoveries" USING btree ("company_id","record_ref");--> statement-breakpoint
CREATE INDEX "recoveries_by_date" ON "recoveries" USING btree ("company_id","recovered_on","id");--> statement-breakpoint
CREATE INDEX "recoveries_by_technician" ON "recoveries" USING btree ("company_id","technician_id","recovered_on");--> statement-breakpoint
CREATE INDEX "recoveries_by_site" ON "recoveries" USING btree ("company_id","site_id","recovered_on");--> statement-breakpoint
CREATE INDEX "recoveries_by_appliance" ON "recoveries" USING btree ("company_id","appliance_id","recovered_on");--> statement-breakpoint
CREATE INDEX "recoveries_by_cylinder" ON "recoveries" USING btree ("company_id","cylinder_id");--> statement-breakpoint
CREATE INDEX "recoveries_by_import" ON "recoveries" USING btree ("company_id","import_id");--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_branch" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."recovered_month", "branches"."name" as "key", sum("recoveries"."recovered_mass_kg") as "recovered_mass_kg", sum("recoveries"."full_charge_kg") as "full_charge_kg", count(*) as "recoveries", percentile_cont(0.5) within group (order by ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision) as "median_yield", sum("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar4") as "co2e_kg" from "recoveries" inner join "refrigerants" on "refrigerants"."designation" = "recoveries"."refrigerant" left join "branches" on ("branches"."company_id" = "recoveries"."company_id" and "branches"."id" = "recoveries"."branch_id") where "recoveries"."exclusion" is null group by "recoveries"."company_id", "recoveries"."recovered_month", 3);--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_category" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."recovered_month", "recoveries"."category" as "key", sum("recoveries"."recovered_mass_kg") as "recovered_mass_kg", sum("recoveries"."full_charge_kg") as "full_charge_kg", count(*) as "recoveries", percentile_cont(0.5) within group (order by ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision) as "median_yield", sum("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar4") as "co2e_kg" from "recoveries" inner join "refrigerants" on "refrigerants"."designation" = "recoveries"."refrigerant" where "recoveries"."exclusion" is null group by "recoveries"."company_id", "recoveries"."recovered_month", 3);--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_job_type" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."recovered_month", "recoveries"."job_type" as "key", sum("recoveries"."recovered_mass_kg") as "recovered_mass_kg", sum("recoveries"."full_charge_kg") as "full_charge_kg", count(*) as "recoveries", percentile_cont(0.5) within group (order by ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision) as "median_yield", sum("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar4") as "co2e_kg" from "recoveries" inner join "refrigerants" on "refrigerants"."designation" = "recoveries"."refrigerant" where "recoveries"."exclusion" is null group by "recoveries"."company_id", "recoveries"."recovered_month", 3);--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_refrigerant" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."recovered_month", "recoveries"."refrigerant" as "key", sum("recoveries"."recovered_mass_kg") as "recovered_mass_kg", sum("recoveries"."full_charge_kg") as "full_charge_kg", count(*) as "recoveries", percentile_cont(0.5) within group (order by ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision) as "median_yield", sum("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar4") as "co2e_kg" from "recoveries" inner join "refrigerants" on "refrigerants"."designation" = "recoveries"."refrigerant" where "recoveries"."exclusion" is null group by "recoveries"."company_id", "recoveries"."recovered_month", 3);--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_site" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."recovered_month", "sites"."name" as "key", sum("recoveries"."recovered_mass_kg") as "recovered_mass_kg", sum("recoveries"."full_charge_kg") as "full_charge_kg", count(*) as "recoveries", percentile_cont(0.5) within group (order by ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision) as "median_yield", sum("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar4") as "co2e_kg" from "recoveries" inner join "refrigerants" on "refrigerants"."designation" = "recoveries"."refrigerant" left join "sites" on ("sites"."company_id" = "recoveries"."company_id" and "sites"."id" = "recoveries"."site_id") where "recoveries"."exclusion" is null group by "recoveries"."company_id", "recoveries"."recovered_month", 3);--> statement-breakpoint
CREATE VIEW "public"."monthly_recovered_mass_by_technician" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."recovered_month", "technicians"."name" as "key", sum("recoveries"."recovered_mass_kg") as "recovered_mass_kg", sum("recoveries"."full_charge_kg") as "full_charge_kg", count(*) as "recoveries", percentile_cont(0.5) within group (order by ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision) as "median_yield", sum("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar4") as "co2e_kg" from "recoveries" inner join "refrigerants" on "refrigerants"."designation" = "recoveries"."refrigerant" left join "technicians" on ("technicians"."company_id" = "recoveries"."company_id" and "technicians"."id" = "recoveries"."technician_id") where "recoveries"."exclusion" is null group by "recoveries"."company_id", "recoveries"."recovered_month", 3);--> statement-breakpoint
CREATE VIEW "public"."recovery_facts" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."id", "recoveries"."record_ref", "recoveries"."recovered_on", "recoveries"."recovered_at", "recoveries"."recovered_month", "recoveries"."technician_id", "technicians"."name" as "technician", "recoveries"."site_id", "sites"."name" as "site", "recoveries"."appliance_id", "appliances"."name" as "appliance", "branches"."name" as "branch", "recoveries"."category", "recoveries"."job_type", "recoveries"."refrigerant", "recoveries"."full_charge_kg" as "full_charge_kg", "recoveries"."recovered_mass_kg" as "recovered_mass_kg", ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision as "recovery_yield", ("recoveries"."recovered_mass_kg"::double precision * "refrigerants"."gwp_ar4") as "co2e_kg", "cylinders"."name" as "cylinder", "recoveries"."exclusion", "recoveries"."import_id", "recoveries"."version" from "recoveries" inner join "refrigerants" on "refrigerants"."designation" = "recoveries"."refrigerant" inner join "technicians" on ("technicians"."company_id" = "recoveries"."company_id" and "technicians"."id" = "recoveries"."technician_id") inner join "sites" on ("sites"."company_id" = "recoveries"."company_id" and "sites"."id" = "recoveries"."site_id") inner join "appliances" on ("appliances"."company_id" = "recoveries"."company_id" and "appliances"."id" = "recoveries"."appliance_id") left join "branches" on ("branches"."company_id" = "recoveries"."company_id" and "branches"."id" = "recoveries"."branch_id") left join "cylinders" on ("cylinders"."company_id" = "recoveries"."company_id" and "cylinders"."id" = "recoveries"."cylinder_id"));--> statement-breakpoint
CREATE VIEW "public"."low_recoveries" WITH (security_invoker = true) AS (select "recoveries"."company_id", "recoveries"."id", "recoveries"."recovered_month", ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision as "recovery_yield", "like_jobs", "lower_quartile", "median_yield", "upper_quartile", "lower_fence" from "recoveries" inner join (select "company_id", "refrigerant", "category", count(*) as "like_jobs", percentile_cont(0.25) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) as "lower_quartile", percentile_cont(0.5) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) as "median_yield", percentile_cont(0.75) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) as "upper_quartile", 2.5 * percentile_cont(0.25) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) - 1.5 * percentile_cont(0.75) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) as "lower_fence" from "recoveries" "peer" where "peer"."exclusion" is null group by "peer"."company_id", "peer"."refrigerant", "peer"."category") "limits" on ("limits"."company_id" = "recoveries"."company_id" and "limits"."refrigerant" = "recoveries"."refrigerant" and "limits"."category" is not distinct from "recoveries"."category") where ("recoveries"."exclusion" is null and "like_jobs" >= 20 and ("recoveries"."recovered_mass_kg" / "recoveries"."full_charge_kg")::double precision < "lower_fence"));--> statement-breakpoint
CREATE VIEW "public"."yield_limits" WITH (security_invoker = true) AS (select "company_id", "refrigerant", "category", count(*) as "like_jobs", percentile_cont(0.25) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) as "lower_quartile", percentile_cont(0.5) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) as "median_yield", percentile_cont(0.75) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) as "upper_quartile", 2.5 * percentile_cont(0.25) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) - 1.5 * percentile_cont(0.75) within group (order by ("peer"."recovered_mass_kg" / "peer"."full_charge_kg")::double precision) as "lower_fence" from "recoveries" "peer" where "peer"."exclusion" is null group by "peer"."company_id", "peer"."refrigerant", "peer"."category");--> statement-breakpoint
CREATE POLICY "of_company" ON "companies" AS PERMISSIVE FOR ALL TO public USING (id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "by_name" ON "companies" AS PERMISSIVE FOR SELECT TO public USING (name = (select nullif(current_setting('app.company_name', true), '')));--> statement-breakpoint
CREATE POLICY "of_member" ON "companies" AS PERMISSIVE FOR SELECT TO public USING (id in (select m.company_id from memberships m where m.person_id = (select nullif(current_setting('app.person_id', true), ''))::uuid));--> statement-breakpoint
CREATE POLICY "of_company" ON "settings" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "flag_decisions" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "flags" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "history" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "history_heads" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "import_file_chunks" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "import_mappings" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "import_rows" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "imports" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "access_tokens" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "by_token" ON "access_tokens" AS PERMISSIVE FOR SELECT TO public USING (token_hash = (select nullif(current_setting('app.token_hash', true), '')));--> statement-breakpoint
CREATE POLICY "of_company" ON "memberships" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "own_membership" ON "memberships" AS PERMISSIVE FOR SELECT TO public USING (person_id = (select nullif(current_setting('app.person_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "own_link" ON "password_links" AS PERMISSIVE FOR ALL TO public USING (person_id = (select nullif(current_setting('app.person_id', true), ''))::uuid) WITH CHECK (person_id = (select nullif(current_setting('app.person_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "by_token" ON "password_links" AS PERMISSIVE FOR SELECT TO public USING (token_hash = (select nullif(current_setting('app.link_hash', true), '')));--> statement-breakpoint
CREATE POLICY "oneself" ON "people" AS PERMISSIVE FOR ALL TO public USING (id = (select nullif(current_setting('app.person_id', true), ''))::uuid) WITH CHECK (id = (select nullif(current_setting('app.person_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "by_email" ON "people" AS PERMISSIVE FOR SELECT TO public USING (lower(email) = lower((select nullif(current_setting('app.sign_in_email', true), ''))));--> statement-breakpoint
CREATE POLICY "of_company" ON "people" AS PERMISSIVE FOR SELECT TO public USING (id in (select m.person_id from memberships m where m.company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid));--> statement-breakpoint
CREATE POLICY "own_session" ON "sessions" AS PERMISSIVE FOR ALL TO public USING (person_id = (select nullif(current_setting('app.person_id', true), ''))::uuid) WITH CHECK (person_id = (select nullif(current_setting('app.person_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "by_token" ON "sessions" AS PERMISSIVE FOR SELECT TO public USING (token_hash = (select nullif(current_setting('app.session_hash', true), '')));--> statement-breakpoint
CREATE POLICY "of_company" ON "appliances" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "branches" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "cylinders" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "sites" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "technician_certifications" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "technicians" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_company" ON "recoveries" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_technician" ON "recoveries" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null or technician_id = (select nullif(current_setting('app.technician_id', true), ''))::uuid) WITH CHECK ((select nullif(current_setting('app.technician_id', true), '')) is null or technician_id = (select nullif(current_setting('app.technician_id', true), ''))::uuid);