-- What drizzle-kit does not generate: triggers that keep revisions as they are, and what the application's role may do.

CREATE FUNCTION refuse_revision_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'UPDATE' AND to_jsonb(NEW) - 'status' = to_jsonb(OLD) - 'status' THEN
    RETURN NEW;
  END IF;
  RAISE EXCEPTION 'a revision is never changed or removed'
    USING ERRCODE = 'restrict_violation', HINT = 'Save a new revision instead.';
END
$$;
--> statement-breakpoint
CREATE TRIGGER revisions_stay BEFORE UPDATE OR DELETE ON revisions
  FOR EACH ROW EXECUTE FUNCTION refuse_revision_change();
--> statement-breakpoint
CREATE TRIGGER revisions_stay_all BEFORE TRUNCATE ON revisions
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_revision_change();
--> statement-breakpoint
REVOKE ALL ON ALL TABLES IN SCHEMA public FROM PUBLIC;
--> statement-breakpoint
GRANT USAGE ON SCHEMA public TO linkwright_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ON people, workshops, builds, studies, comments, sheets, outbox TO linkwright_app;
--> statement-breakpoint
GRANT SELECT, INSERT ON memberships, draft_edits, revisions TO linkwright_app;
--> statement-breakpoint
GRANT UPDATE (status) ON revisions TO linkwright_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON sessions, rate_limits TO linkwright_app;
