-- The roles themselves are made before the migrations: they belong to the cluster, not to one database.
-- Nothing is granted by default; every table and column that a role may touch is named here.
GRANT USAGE ON SCHEMA "public" TO "plumbrow_app", "plumbrow_identity";--> statement-breakpoint

-- plumbrow_app: the work of an office. No password and no token can be read by it.
GRANT SELECT ON "offices" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT ("id", "email", "name", "session_epoch", "created_at"), INSERT ON "users" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ("role", "contractor_id", "disabled_at") ON "memberships" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT ("id", "office_id", "user_id", "expires_at", "used_at", "created_by", "created_at"), INSERT, UPDATE ("expires_at") ON "invitations" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT ("id", "office_id", "membership_id", "name", "read_only", "created_at", "last_used_at", "revoked_at", "expires_at"), INSERT, UPDATE ("name", "revoked_at") ON "api_tokens" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ("name") ON "contractors" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ("code", "name", "start", "target_finish", "unit", "hours_per_day", "working_days", "holidays", "version") ON "projects" TO "plumbrow_app";--> statement-breakpoint
-- What was received is never changed: no update of the file, the activities or the counted rows.
GRANT SELECT, INSERT, UPDATE ("status", "summary", "version") ON "submissions" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT, INSERT ON "submission_files", "activities", "comments", "record_entries" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "findings", "fixes" TO "plumbrow_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ("withdrawn_by", "withdrawn_at") ON "corrections" TO "plumbrow_app";--> statement-breakpoint

-- plumbrow_identity: who is asking, before an office is known.
GRANT SELECT ON "offices", "users", "memberships", "invitations", "api_tokens" TO "plumbrow_identity";--> statement-breakpoint
GRANT UPDATE ("password_hash", "session_epoch") ON "users" TO "plumbrow_identity";--> statement-breakpoint
GRANT UPDATE ("used_at") ON "invitations" TO "plumbrow_identity";--> statement-breakpoint
GRANT UPDATE ("last_used_at") ON "api_tokens" TO "plumbrow_identity";--> statement-breakpoint

-- The end of a chain of the record, and a lock on it until the transaction ends. A scheduler appends to a chain
-- of which it does not see the entries about what was said inside the office; it learns their hash and no more.
CREATE FUNCTION "record_head"("of_submission" uuid) RETURNS TABLE ("sequence" integer, "hash" text)
LANGUAGE plpgsql SECURITY DEFINER SET search_path = pg_catalog, public AS $$
DECLARE
  of_office uuid := nullif(current_setting('app.office', true), '')::uuid;
BEGIN
  PERFORM pg_advisory_xact_lock(hashtextextended('record ' || of_office || coalesce(of_submission::text, ''), 0));
  IF of_submission IS NULL THEN
    RETURN QUERY SELECT e.sequence, e.hash FROM public.record_entries e
      WHERE e.office_id = of_office AND e.submission_id IS NULL ORDER BY e.sequence DESC LIMIT 1;
  ELSE
    RETURN QUERY SELECT e.sequence, e.hash FROM public.record_entries e
      WHERE e.office_id = of_office AND e.submission_id = of_submission ORDER BY e.sequence DESC LIMIT 1;
  END IF;
END $$;--> statement-breakpoint
REVOKE ALL ON FUNCTION "record_head"(uuid) FROM PUBLIC;--> statement-breakpoint
GRANT EXECUTE ON FUNCTION "record_head"(uuid) TO "plumbrow_app";
