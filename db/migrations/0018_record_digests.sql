CREATE TABLE "appliance_suspicions" (
	"company_id" uuid NOT NULL,
	"appliance_id" uuid NOT NULL,
	"visits" integer NOT NULL,
	"short_visits" integer NOT NULL,
	"expected_short" double precision NOT NULL,
	"chance" double precision,
	"visited_on" date[] NOT NULL,
	"yields" double precision[] NOT NULL,
	"short_chances" double precision[] NOT NULL,
	CONSTRAINT "appliance_suspicions_company_id_appliance_id_pk" PRIMARY KEY("company_id","appliance_id")
);
--> statement-breakpoint
ALTER TABLE "appliance_suspicions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "record_digests" (
	"company_id" uuid PRIMARY KEY NOT NULL,
	"version" integer NOT NULL,
	"digests" bigint DEFAULT 1 NOT NULL,
	"revision" bigint NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	"leak_model" jsonb,
	"comparison" jsonb NOT NULL
);
--> statement-breakpoint
ALTER TABLE "record_digests" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "site_suspicions" (
	"company_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"judged" integer NOT NULL,
	"suspected" integer NOT NULL,
	"low_again" integer NOT NULL,
	"chance" double precision,
	"expected" double precision NOT NULL,
	"adjusted_p" double precision NOT NULL,
	"look" boolean NOT NULL,
	CONSTRAINT "site_suspicions_company_id_site_id_pk" PRIMARY KEY("company_id","site_id")
);
--> statement-breakpoint
ALTER TABLE "site_suspicions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE POLICY "of_company" ON "appliance_suspicions" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "appliance_suspicions" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);--> statement-breakpoint
CREATE POLICY "of_company" ON "record_digests" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "record_digests" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);--> statement-breakpoint
CREATE POLICY "of_company" ON "site_suspicions" AS PERMISSIVE FOR ALL TO public USING (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid) WITH CHECK (company_id = (select nullif(current_setting('app.company_id', true), ''))::uuid);--> statement-breakpoint
CREATE POLICY "not_for_a_technician" ON "site_suspicions" AS RESTRICTIVE FOR ALL TO public USING ((select nullif(current_setting('app.technician_id', true), '')) is null);
--> statement-breakpoint
-- By hand from here on: what Drizzle 0.45 cannot express.
ALTER TABLE record_digests FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE appliance_suspicions FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE site_suspicions FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
-- A number that grows with every change that an answer could show: with each entry of the company's history, and with
-- each digest of its records, which writes no history. 0 before the first of either.
CREATE FUNCTION state_of_records(company uuid) RETURNS bigint LANGUAGE sql STABLE AS $$
  SELECT coalesce((SELECT h.entry_no FROM history_heads h WHERE h.company_id = company), 0)
       + coalesce((SELECT d.digests FROM record_digests d WHERE d.company_id = company), 0)
$$;
--> statement-breakpoint
CREATE OR REPLACE FUNCTION viewer_of_session(hash text)
RETURNS TABLE (person_id uuid, name text, email text, company_id uuid, memberships jsonb, revision bigint)
LANGUAGE plpgsql AS $$
#variable_conflict use_column
DECLARE
  session record;
  here uuid;
BEGIN
  PERFORM set_config('app.session_hash', hash, true);
  SELECT s.person_id, s.company_id INTO session FROM sessions s WHERE s.token_hash = hash AND s.expires_at > now();
  IF NOT FOUND THEN RETURN; END IF;
  PERFORM set_config('app.person_id', session.person_id::text, true);
  -- The company the session works in, or the first when the person has left that one.
  SELECT m.company_id INTO here FROM memberships m JOIN companies c ON c.id = m.company_id
  WHERE m.person_id = session.person_id ORDER BY (m.company_id = session.company_id) IS TRUE DESC, c.name LIMIT 1;
  IF NOT FOUND THEN RETURN; END IF;
  PERFORM set_config('app.company_id', here::text, true);
  RETURN QUERY
  SELECT p.id, p.name, p.email, here,
         (SELECT jsonb_agg(jsonb_build_object('companyId', c.id, 'companyName', c.name, 'role', m.role, 'technicianId',
                           m.technician_id, 'timeZone', c.time_zone, 'massUnit', c.mass_unit) ORDER BY c.name)
          FROM memberships m JOIN companies c ON c.id = m.company_id WHERE m.person_id = p.id),
         state_of_records(here)
  FROM people p WHERE p.id = session.person_id;
END $$;
--> statement-breakpoint
CREATE OR REPLACE FUNCTION viewer_of_access_token(hash text)
RETURNS TABLE (token_id uuid, label text, membership jsonb, revision bigint)
LANGUAGE plpgsql AS $$
DECLARE
  token record;
BEGIN
  PERFORM set_config('app.token_hash', hash, true);
  SELECT t.* INTO token FROM access_tokens t WHERE t.token_hash = hash AND t.revoked_at IS NULL;
  IF NOT FOUND THEN RETURN; END IF;
  PERFORM set_config('app.company_id', token.company_id::text, true);
  RETURN QUERY
  SELECT token.id, token.label,
         jsonb_build_object('companyId', c.id, 'companyName', c.name, 'role', token.role, 'technicianId',
                            token.technician_id, 'timeZone', c.time_zone, 'massUnit', c.mass_unit),
         state_of_records(c.id)
  FROM companies c WHERE c.id = token.company_id;
END $$;
