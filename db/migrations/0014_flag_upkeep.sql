ALTER TABLE "flag_baselines" ADD COLUMN "judged_singly" integer DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE "flag_renewals" DROP COLUMN "judged_singly";--> statement-breakpoint
CREATE POLICY "for_upkeep" ON "companies" AS PERMISSIVE FOR SELECT TO public USING ((select nullif(current_setting('app.upkeep', true), '')) = 'companies' and current_user = 'tarebook_job');