-- The planner learns of rows that a large import or undo has just written; until then it expects a handful and joins
-- row by row. Only the owner of a table may analyze it, so jobs ask through this.
CREATE FUNCTION refresh_statistics() RETURNS void LANGUAGE plpgsql SECURITY DEFINER SET search_path = public, pg_temp AS $$
BEGIN
  ANALYZE recoveries, monthly_summary, technicians, sites, appliances, branches, cylinders, import_rows;
END $$;
