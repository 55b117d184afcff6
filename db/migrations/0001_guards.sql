-- What Drizzle 0.45 cannot express: forced row-level security, covering indexes, and the chained history.

-- Row-level security holds for the owner of the tables too.
DO $$
DECLARE t text;
BEGIN
  FOR t IN
    SELECT c.relname FROM pg_class c
    WHERE c.relnamespace = 'public'::regnamespace AND c.relkind = 'r' AND c.relrowsecurity
  LOOP
    EXECUTE format('ALTER TABLE %I FORCE ROW LEVEL SECURITY', t);
  END LOOP;
END $$;
--> statement-breakpoint
CREATE INDEX recoveries_by_month ON recoveries (company_id, recovered_month, refrigerant)
  INCLUDE (recovered_mass_kg, full_charge_kg, exclusion);
--> statement-breakpoint
-- Every edit counts: a correction that names an older version is refused.
CREATE FUNCTION count_edit() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  NEW.version := OLD.version + 1;
  NEW.updated_at := now();
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER recoveries_count_edit BEFORE UPDATE ON recoveries FOR EACH ROW EXECUTE FUNCTION count_edit();
--> statement-breakpoint
-- The chain: the hash of an entry is SHA-256 over the hash before it and its own content.
CREATE FUNCTION history_link(state bytea, item text, start bytea) RETURNS bytea LANGUAGE sql IMMUTABLE PARALLEL SAFE AS $$
  SELECT sha256(coalesce(state, start) || convert_to(item, 'UTF8'))
$$;
--> statement-breakpoint
CREATE AGGREGATE history_chain(item text, start bytea) (sfunc = history_link, stype = bytea);
--> statement-breakpoint
CREATE FUNCTION history_item(entry_no bigint, changed_at timestamptz, table_name text, row_id uuid, action text,
                             actor text, reason text, before jsonb, after jsonb) RETURNS text LANGUAGE sql STABLE AS $$
  SELECT concat_ws('|', entry_no, extract(epoch FROM changed_at), table_name, row_id, action, actor,
                   coalesce(reason, ''), coalesce(before::text, ''), coalesce(after::text, ''))
$$;
--> statement-breakpoint
-- Statement-level, so that an import of many rows pays for one call. SECURITY DEFINER: the application may read the
-- history but write it only through here.
CREATE FUNCTION write_history() RETURNS trigger LANGUAGE plpgsql SECURITY DEFINER SET search_path = public, pg_temp AS $$
DECLARE
  company uuid := nullif(current_setting('app.company_id', true), '')::uuid;
  who text := coalesce(nullif(current_setting('app.actor', true), ''), 'system');
  why text := nullif(current_setting('app.reason', true), '');
  head record;
  last record;
BEGIN
  IF TG_OP = 'DELETE' THEN
    IF NOT EXISTS (SELECT FROM old_rows) THEN RETURN NULL; END IF;
  ELSIF NOT EXISTS (SELECT FROM new_rows) THEN RETURN NULL;
  END IF;
  INSERT INTO history_heads (company_id, entry_no, hash) VALUES (company, 0, '') ON CONFLICT DO NOTHING;
  SELECT h.entry_no, h.hash INTO STRICT head FROM history_heads h WHERE h.company_id = company FOR UPDATE;
  -- The three forms differ only in where the rows come from: transition tables must be named in the text.
  IF TG_OP = 'INSERT' THEN
    INSERT INTO history
    SELECT company, e.entry_no, now(), TG_TABLE_NAME, e.row_id, 'insert', who, why, NULL, e.after,
           encode(history_chain(history_item(e.entry_no, now(), TG_TABLE_NAME, e.row_id, 'insert', who, why, NULL, e.after),
                                decode(head.hash, 'hex')) OVER (ORDER BY e.entry_no ROWS UNBOUNDED PRECEDING), 'hex')
    FROM (SELECT head.entry_no + row_number() OVER () AS entry_no, coalesce(j->>'id', j->>'person_id')::uuid AS row_id, j AS after
          FROM (SELECT jsonb_strip_nulls(to_jsonb(n)) AS j FROM new_rows n) s) e;
  ELSIF TG_OP = 'UPDATE' THEN
    INSERT INTO history
    SELECT company, e.entry_no, now(), TG_TABLE_NAME, e.row_id, 'update', who, why, e.before, e.after,
           encode(history_chain(history_item(e.entry_no, now(), TG_TABLE_NAME, e.row_id, 'update', who, why, e.before, e.after),
                                decode(head.hash, 'hex')) OVER (ORDER BY e.entry_no ROWS UNBOUNDED PRECEDING), 'hex')
    FROM (SELECT head.entry_no + row_number() OVER () AS entry_no, o.row_id, o.j AS before, n.j AS after
          FROM (SELECT coalesce(j->>'id', j->>'person_id')::uuid AS row_id, j FROM (SELECT jsonb_strip_nulls(to_jsonb(x)) AS j FROM old_rows x) s) o
          JOIN (SELECT coalesce(j->>'id', j->>'person_id')::uuid AS row_id, j FROM (SELECT jsonb_strip_nulls(to_jsonb(x)) AS j FROM new_rows x) s) n USING (row_id)) e;
  ELSE
    INSERT INTO history
    SELECT company, e.entry_no, now(), TG_TABLE_NAME, e.row_id, 'delete', who, why, e.before, NULL,
           encode(history_chain(history_item(e.entry_no, now(), TG_TABLE_NAME, e.row_id, 'delete', who, why, e.before, NULL),
                                decode(head.hash, 'hex')) OVER (ORDER BY e.entry_no ROWS UNBOUNDED PRECEDING), 'hex')
    FROM (SELECT head.entry_no + row_number() OVER () AS entry_no, coalesce(j->>'id', j->>'person_id')::uuid AS row_id, j AS before
          FROM (SELECT jsonb_strip_nulls(to_jsonb(o)) AS j FROM old_rows o) s) e;
  END IF;
  SELECT h.entry_no, h.hash INTO STRICT last FROM history h WHERE h.company_id = company ORDER BY h.entry_no DESC LIMIT 1;
  UPDATE history_heads SET entry_no = last.entry_no, hash = last.hash WHERE company_id = company;
  RETURN NULL;
END $$;
--> statement-breakpoint
DO $$
DECLARE t text;
BEGIN
  FOREACH t IN ARRAY ARRAY['recoveries', 'branches', 'technicians', 'sites', 'appliances', 'cylinders', 'flags',
                           'flag_decisions', 'memberships']
  LOOP
    EXECUTE format('CREATE TRIGGER %I AFTER INSERT ON %I REFERENCING NEW TABLE AS new_rows
                    FOR EACH STATEMENT EXECUTE FUNCTION write_history()', t || '_history_insert', t);
    EXECUTE format('CREATE TRIGGER %I AFTER UPDATE ON %I REFERENCING OLD TABLE AS old_rows NEW TABLE AS new_rows
                    FOR EACH STATEMENT EXECUTE FUNCTION write_history()', t || '_history_update', t);
    EXECUTE format('CREATE TRIGGER %I AFTER DELETE ON %I REFERENCING OLD TABLE AS old_rows
                    FOR EACH STATEMENT EXECUTE FUNCTION write_history()', t || '_history_delete', t);
  END LOOP;
END $$;
--> statement-breakpoint
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'history is append-only';
END $$;
--> statement-breakpoint
CREATE TRIGGER history_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON history
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
-- The first entry whose hash does not follow from its content and the entry before it; NULL when the chain is whole.
CREATE FUNCTION history_break() RETURNS bigint LANGUAGE sql STABLE AS $$
  SELECT min(entry_no) FROM (
    SELECT entry_no, hash,
           encode(history_link(decode(coalesce(lag(hash) OVER w, ''), 'hex'),
                  history_item(entry_no, changed_at, table_name, row_id, action, actor, reason, before, after), ''), 'hex') AS expected
    FROM history WHERE company_id = nullif(current_setting('app.company_id', true), '')::uuid
    WINDOW w AS (ORDER BY entry_no)) chain
  WHERE hash <> expected
$$;
