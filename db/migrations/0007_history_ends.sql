-- Who and why are free text: quoted, so that no two entries read the same to the hash.
CREATE OR REPLACE FUNCTION history_item(entry_no bigint, changed_at timestamptz, table_name text, row_id uuid, action text,
                                        actor text, reason text, before jsonb, after jsonb) RETURNS text LANGUAGE sql STABLE AS $$
  SELECT concat_ws('|', entry_no, extract(epoch FROM changed_at), table_name, row_id, action, quote_literal(actor),
                   quote_nullable(reason), coalesce(before::text, ''), coalesce(after::text, ''))
$$;
--> statement-breakpoint
-- Entries and the end of the chain come from write_history() alone, also for the owner of the tables: a statement by
-- hand is at trigger depth 1 when it gets here, one of that function's at 2 or more.
CREATE FUNCTION refuse_by_hand() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF pg_trigger_depth() < 2 THEN RAISE EXCEPTION 'history is not written by hand'; END IF;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER history_by_trigger BEFORE INSERT ON history FOR EACH STATEMENT EXECUTE FUNCTION refuse_by_hand();
--> statement-breakpoint
CREATE TRIGGER history_heads_by_trigger BEFORE INSERT OR UPDATE ON history_heads
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_by_hand();
--> statement-breakpoint
CREATE TRIGGER history_heads_stay BEFORE DELETE OR TRUNCATE ON history_heads
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
-- The first entry whose hash does not follow from its content and the entry before it, or at which the chain does not
-- end as its head says (entries cut off, or the last one rewritten with its hash); NULL when the chain is whole.
CREATE OR REPLACE FUNCTION history_break() RETURNS bigint LANGUAGE sql STABLE AS $$
  WITH entries AS (
    SELECT * FROM history WHERE company_id = nullif(current_setting('app.company_id', true), '')::uuid
  ), links AS (
    SELECT entry_no, hash,
           encode(history_link(decode(coalesce(lag(hash) OVER w, ''), 'hex'),
                  history_item(entry_no, changed_at, table_name, row_id, action, actor, reason, before, after), ''), 'hex') AS expected
    FROM entries WINDOW w AS (ORDER BY entry_no)
  ), ends AS (
    SELECT coalesce(max(h.entry_no), 0) AS head_no, coalesce(max(h.hash), '') AS head_hash,
           coalesce((SELECT max(entry_no) FROM entries), 0) AS last_no,
           coalesce((SELECT hash FROM entries ORDER BY entry_no DESC LIMIT 1), '') AS last_hash
    FROM history_heads h WHERE h.company_id = nullif(current_setting('app.company_id', true), '')::uuid
  )
  SELECT min(entry_no) FROM (
    SELECT entry_no FROM links WHERE hash <> expected
    UNION ALL
    SELECT CASE WHEN head_no = last_no THEN last_no ELSE least(head_no, last_no) + 1 END
    FROM ends WHERE (head_no, head_hash) <> (last_no, last_hash)
  ) broken
$$;
