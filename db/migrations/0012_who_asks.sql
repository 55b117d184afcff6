-- Who asks, in one statement: each function tells the transaction what it has learned and reads on, under the policies
-- of whoever calls it. A session's own row is shown to who knows its hash, then the person by the session, then the
-- company by the membership. `revision` is the end of the company's history, 0 before the first change.
CREATE FUNCTION viewer_of_session(hash text)
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
         coalesce((SELECT h.entry_no FROM history_heads h WHERE h.company_id = here), 0)
  FROM people p WHERE p.id = session.person_id;
END $$;
--> statement-breakpoint
CREATE FUNCTION viewer_of_access_token(hash text)
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
         coalesce((SELECT h.entry_no FROM history_heads h WHERE h.company_id = c.id), 0)
  FROM companies c WHERE c.id = token.company_id;
END $$;
