ALTER TABLE corrections FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE TRIGGER corrections_append_only BEFORE UPDATE OR DELETE ON corrections
  FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER corrections_no_truncate BEFORE TRUNCATE ON corrections
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
-- Until now an invitation whose mail failed was not kept.
UPDATE invitations SET sent_at = created_at;
