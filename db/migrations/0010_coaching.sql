CREATE TABLE "coaching" (
	"company_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"technician_id" uuid NOT NULL,
	"started_on" date NOT NULL,
	"plan" text NOT NULL,
	"ended_on" date,
	"outcome" text,
	"written_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "coaching_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "coaching_days" CHECK (started_on <= ended_on),
	CONSTRAINT "coaching_outcome" CHECK ((ended_on is null) = (outcome is null)),
	CONSTRAINT "coaching_words" CHECK (char_length(plan) between 1 and 2000 and char_length(outcome) between 1 and 2000)
);
--> statement-breakpoint
ALTER TABLE "coaching" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "coaching" ADD CONSTRAINT "coaching_company_id_technician_id_technicians_company_id_id_fk" FOREIGN KEY ("company_id","technician_id") REFERENCES "public"."technicians"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "coaching_by_technician" ON "coaching" USING btree ("company_id","technician_id","started_on");--> statement-breakpoint
CREATE POLICY "of_company" ON "coaching" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "of_technician" ON "coaching" AS RESTRICTIVE FOR ALL TO public USING (case when (select nullif(current_setting('app.technician_id', true), '')) is null then true else technician_id = (select nullif(current_setting('app.technician_id', true), ''))::uuid end) WITH CHECK (case when (select nullif(current_setting('app.technician_id', true), '')) is null then true else technician_id = (select nullif(current_setting('app.technician_id', true), ''))::uuid end);--> statement-breakpoint
ALTER TABLE coaching FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE TRIGGER coaching_count_edit BEFORE UPDATE ON coaching FOR EACH ROW EXECUTE FUNCTION count_edit();
--> statement-breakpoint
CREATE TRIGGER coaching_history_insert AFTER INSERT ON coaching REFERENCING NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER coaching_history_update AFTER UPDATE ON coaching REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
--> statement-breakpoint
CREATE TRIGGER coaching_history_delete AFTER DELETE ON coaching REFERENCING OLD TABLE AS old_rows
  FOR EACH STATEMENT EXECUTE FUNCTION write_history();
