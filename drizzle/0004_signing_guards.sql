CREATE INDEX "audit_log_by_subject" ON "audit_log" USING btree ("subject","position");--> statement-breakpoint
-- A case begins as a draft. Its signature changes its state and nothing else, and only when what was signed is there. Tables are named in
-- full: a temporary table of the same name would be found first.
CREATE OR REPLACE FUNCTION refuse_signed_case() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'INSERT' THEN
    IF NEW.state <> 'draft' THEN
      RAISE EXCEPTION 'a case begins as a draft' USING ERRCODE = 'insufficient_privilege';
    END IF;
    RETURN NEW;
  END IF;
  IF OLD.state = 'signed' THEN
    RAISE EXCEPTION '% of a signed case is refused', TG_OP USING ERRCODE = 'insufficient_privilege';
  END IF;
  IF TG_OP = 'DELETE' THEN RETURN OLD; END IF;
  IF NEW.state <> OLD.state THEN
    IF to_jsonb(NEW) - 'state' IS DISTINCT FROM to_jsonb(OLD) - 'state' THEN
      RAISE EXCEPTION 'a signature changes nothing in the case' USING ERRCODE = 'insufficient_privilege';
    END IF;
    IF NOT EXISTS (SELECT FROM public.signed_versions WHERE case_id = NEW.id) THEN
      RAISE EXCEPTION 'a case is signed with what was signed' USING ERRCODE = 'insufficient_privilege';
    END IF;
  END IF;
  RETURN NEW;
END;
$$;--> statement-breakpoint
DROP TRIGGER signed_cases_stay ON cases;--> statement-breakpoint
CREATE TRIGGER signed_cases_stay BEFORE INSERT OR UPDATE OR DELETE ON cases
  FOR EACH ROW EXECUTE FUNCTION refuse_signed_case();--> statement-breakpoint

-- What is signed carries the hash of its very bytes, and a case that is signed gets no other version beside it.
CREATE FUNCTION refuse_wrong_hash() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NEW.sha256 <> encode(pg_catalog.sha256(convert_to(NEW.canonical, 'UTF8')), 'hex') THEN
    RAISE EXCEPTION 'the hash is not that of the text' USING ERRCODE = 'insufficient_privilege';
  END IF;
  IF TG_TABLE_NAME = 'signed_versions' THEN
    IF NEW.docx_sha256 <> encode(pg_catalog.sha256(NEW.docx), 'hex') THEN
      RAISE EXCEPTION 'the hash is not that of the document' USING ERRCODE = 'insufficient_privilege';
    END IF;
    IF NOT EXISTS (SELECT FROM public.cases WHERE id = NEW.case_id AND state = 'draft') THEN
      RAISE EXCEPTION 'the case is signed already' USING ERRCODE = 'insufficient_privilege';
    END IF;
  END IF;
  RETURN NEW;
END;
$$;--> statement-breakpoint
CREATE TRIGGER signed_versions_fit BEFORE INSERT ON signed_versions
  FOR EACH ROW EXECUTE FUNCTION refuse_wrong_hash();--> statement-breakpoint
CREATE TRIGGER addenda_fit BEFORE INSERT ON addenda
  FOR EACH ROW EXECUTE FUNCTION refuse_wrong_hash();--> statement-breakpoint

-- The log grows at its end only, each entry on the one before.
CREATE FUNCTION refuse_loose_entry() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE
  last_position bigint;
  last_hash text;
BEGIN
  SELECT position, hash INTO last_position, last_hash
    FROM public.audit_log ORDER BY position DESC LIMIT 1;
  IF NEW.position <> coalesce(last_position, 0) + 1
    OR NEW.previous_hash <> coalesce(last_hash, repeat('0', 64))
    OR NEW.hash !~ '^[0-9a-f]{64}$' THEN
    RAISE EXCEPTION 'an entry goes at the end of the log' USING ERRCODE = 'insufficient_privilege';
  END IF;
  RETURN NEW;
END;
$$;--> statement-breakpoint
CREATE TRIGGER audit_log_grows BEFORE INSERT ON audit_log
  FOR EACH ROW EXECUTE FUNCTION refuse_loose_entry();
