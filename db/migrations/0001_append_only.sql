-- History and signatures are only ever added to; an approved assessment only ever becomes superseded.
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
END $$;
--> statement-breakpoint
CREATE TRIGGER history_append_only BEFORE UPDATE OR DELETE ON history FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER history_no_truncate BEFORE TRUNCATE ON history FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER signatures_append_only BEFORE UPDATE OR DELETE ON signatures FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER signatures_no_truncate BEFORE TRUNCATE ON signatures FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE FUNCTION keep_approved_assessment() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF OLD.state IN ('approved', 'superseded') AND (
    TG_OP = 'DELETE'
    OR NEW.state NOT IN (OLD.state, 'superseded')
    OR (to_jsonb(NEW) - 'state' - 'version' - 'updated_at') IS DISTINCT FROM (to_jsonb(OLD) - 'state' - 'version' - 'updated_at')
  ) THEN
    RAISE EXCEPTION 'an approved assessment never changes' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN CASE WHEN TG_OP = 'DELETE' THEN OLD ELSE NEW END;
END $$;
--> statement-breakpoint
CREATE TRIGGER assessments_keep_approved BEFORE UPDATE OR DELETE ON assessments FOR EACH ROW EXECUTE FUNCTION keep_approved_assessment();
--> statement-breakpoint
DO $$
BEGIN
  IF NOT EXISTS (SELECT FROM pg_roles WHERE rolname = 'ligament_app') THEN
    CREATE ROLE ligament_app NOLOGIN;
  END IF;
END $$;
--> statement-breakpoint
GRANT USAGE ON SCHEMA public TO ligament_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA public TO ligament_app;
--> statement-breakpoint
REVOKE UPDATE, DELETE ON history, signatures FROM ligament_app;
--> statement-breakpoint
GRANT USAGE, SELECT ON ALL SEQUENCES IN SCHEMA public TO ligament_app;
--> statement-breakpoint
ALTER DEFAULT PRIVILEGES IN SCHEMA public GRANT SELECT, INSERT, UPDATE, DELETE ON TABLES TO ligament_app;
--> statement-breakpoint
ALTER DEFAULT PRIVILEGES IN SCHEMA public GRANT USAGE, SELECT ON SEQUENCES TO ligament_app;
