-- What is signed, logged or superseded can be added to and read, by whatever route and role.
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% on % is refused: its rows are never changed', TG_OP, TG_TABLE_NAME
    USING ERRCODE = 'insufficient_privilege';
END;
$$;--> statement-breakpoint
CREATE TRIGGER signed_versions_stay BEFORE UPDATE OR DELETE ON signed_versions
  FOR EACH ROW EXECUTE FUNCTION refuse_change();--> statement-breakpoint
CREATE TRIGGER signed_versions_not_emptied BEFORE TRUNCATE ON signed_versions
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();--> statement-breakpoint
CREATE TRIGGER audit_log_stays BEFORE UPDATE OR DELETE ON audit_log
  FOR EACH ROW EXECUTE FUNCTION refuse_change();--> statement-breakpoint
CREATE TRIGGER audit_log_not_emptied BEFORE TRUNCATE ON audit_log
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();--> statement-breakpoint
CREATE TRIGGER case_revisions_stay BEFORE UPDATE OR DELETE ON case_revisions
  FOR EACH ROW EXECUTE FUNCTION refuse_change();--> statement-breakpoint
CREATE TRIGGER case_revisions_not_emptied BEFORE TRUNCATE ON case_revisions
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();--> statement-breakpoint

-- A case that is signed stays as it was when it was signed.
CREATE FUNCTION refuse_signed_case() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF OLD.state = 'signed' THEN
    RAISE EXCEPTION '% of a signed case is refused', TG_OP USING ERRCODE = 'insufficient_privilege';
  END IF;
  IF TG_OP = 'DELETE' THEN RETURN OLD; END IF;
  RETURN NEW;
END;
$$;--> statement-breakpoint
CREATE TRIGGER signed_cases_stay BEFORE UPDATE OR DELETE ON cases
  FOR EACH ROW EXECUTE FUNCTION refuse_signed_case();--> statement-breakpoint

-- The application's role has no more rights than its desks need.
DO $$
BEGIN
  IF EXISTS (SELECT FROM pg_roles WHERE rolname = 'buckram_app') THEN
    REVOKE ALL ON ALL TABLES IN SCHEMA public FROM buckram_app;
    GRANT SELECT, INSERT ON signed_versions, audit_log, case_revisions TO buckram_app;
    GRANT SELECT, INSERT, UPDATE ON units, people, cases, recipients, letters, codings TO buckram_app;
    GRANT SELECT, INSERT, UPDATE, DELETE ON sessions, rate_limits TO buckram_app;
  END IF;
END;
$$;
