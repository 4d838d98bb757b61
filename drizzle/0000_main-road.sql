CREATE TABLE "activities" (
	"office_id" uuid NOT NULL,
	"submission_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"activity_id" text NOT NULL,
	"name" text NOT NULL,
	"sheet" text NOT NULL,
	"row" integer NOT NULL,
	"data" jsonb NOT NULL,
	CONSTRAINT "activities_pk" PRIMARY KEY("submission_id","position")
);
--> statement-breakpoint
ALTER TABLE "activities" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "api_tokens" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"membership_id" uuid NOT NULL,
	"name" text NOT NULL,
	"token_hash" text NOT NULL,
	"read_only" boolean DEFAULT false NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"last_used_at" timestamp (3) with time zone,
	"revoked_at" timestamp (3) with time zone,
	"expires_at" timestamp (3) with time zone,
	CONSTRAINT "api_tokens_token_hash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "api_tokens" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "comments" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"submission_id" uuid NOT NULL,
	"finding_id" uuid,
	"sheet" text,
	"row" integer,
	"audience" text NOT NULL,
	"body" text NOT NULL,
	"author_id" uuid NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "comments_audience" CHECK ("comments"."audience" in ('inside', 'shared'))
);
--> statement-breakpoint
ALTER TABLE "comments" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "contractors" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "contractors_office_name" UNIQUE("office_id","name"),
	CONSTRAINT "contractors_office_id" UNIQUE("office_id","id")
);
--> statement-breakpoint
ALTER TABLE "contractors" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "corrections" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"submission_id" uuid NOT NULL,
	"sequence" integer NOT NULL,
	"batch" uuid NOT NULL,
	"fix_id" uuid,
	"finding_id" uuid,
	"edits" jsonb NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"withdrawn_by" uuid,
	"withdrawn_at" timestamp (3) with time zone,
	CONSTRAINT "corrections_submission_sequence" UNIQUE("submission_id","sequence"),
	CONSTRAINT "corrections_withdrawn" CHECK (("corrections"."withdrawn_by" is null) = ("corrections"."withdrawn_at" is null))
);
--> statement-breakpoint
ALTER TABLE "corrections" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "findings" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"submission_id" uuid NOT NULL,
	"key" text NOT NULL,
	"rule" text NOT NULL,
	"weight" text NOT NULL,
	"message_id" text NOT NULL,
	"data" jsonb NOT NULL,
	"activity_id" text,
	"activity_name" text,
	"sheet" text,
	"row" integer,
	"cell" text,
	"state" text DEFAULT 'open' NOT NULL,
	"origin" text DEFAULT 'received' NOT NULL,
	"position" integer NOT NULL,
	CONSTRAINT "findings_submission_position" UNIQUE("submission_id","position","id"),
	CONSTRAINT "findings_weight" CHECK ("findings"."weight" in ('blocks', 'distorts', 'query')),
	CONSTRAINT "findings_state" CHECK ("findings"."state" in ('open', 'corrected', 'waived', 'answered')),
	CONSTRAINT "findings_origin" CHECK ("findings"."origin" in ('received', 'correction'))
);
--> statement-breakpoint
ALTER TABLE "findings" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "fixes" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"submission_id" uuid NOT NULL,
	"finding_id" uuid NOT NULL,
	"rank" integer DEFAULT 0 NOT NULL,
	"reason" text NOT NULL,
	"edits" jsonb NOT NULL,
	"effect_expected" double precision,
	"effect_variance" double precision,
	"state" text DEFAULT 'proposed' NOT NULL,
	CONSTRAINT "fixes_finding_rank" UNIQUE("finding_id","rank"),
	CONSTRAINT "fixes_state" CHECK ("fixes"."state" in ('proposed', 'adopted', 'declined')),
	CONSTRAINT "fixes_rank" CHECK ("fixes"."rank" >= 0)
);
--> statement-breakpoint
ALTER TABLE "fixes" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "invitations" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"used_at" timestamp (3) with time zone,
	"created_by" uuid NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "invitations_token_hash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "invitations" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "memberships" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"role" text NOT NULL,
	"contractor_id" uuid,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"disabled_at" timestamp (3) with time zone,
	CONSTRAINT "memberships_office_user" UNIQUE("office_id","user_id"),
	CONSTRAINT "memberships_office_id" UNIQUE("office_id","id"),
	CONSTRAINT "memberships_role" CHECK ("memberships"."role" in ('administrator', 'analyst', 'reviewer', 'scheduler')),
	CONSTRAINT "memberships_scheduler_has_contractor" CHECK (("memberships"."role" = 'scheduler') = ("memberships"."contractor_id" is not null))
);
--> statement-breakpoint
ALTER TABLE "memberships" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "offices" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"locale" text DEFAULT 'en-GB' NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "offices_slug_unique" UNIQUE("slug")
);
--> statement-breakpoint
ALTER TABLE "offices" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "projects" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"contractor_id" uuid NOT NULL,
	"code" text NOT NULL,
	"name" text NOT NULL,
	"start" date NOT NULL,
	"target_finish" date,
	"unit" text,
	"hours_per_day" double precision DEFAULT 8 NOT NULL,
	"working_days" integer[] DEFAULT '{1,2,3,4,5}' NOT NULL,
	"holidays" date[] DEFAULT '{}'::date[] NOT NULL,
	"version" integer DEFAULT 0 NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "projects_office_code" UNIQUE("office_id","code"),
	CONSTRAINT "projects_office_contractor_id" UNIQUE("office_id","contractor_id","id"),
	CONSTRAINT "projects_unit" CHECK ("projects"."unit" in ('day', 'hour', 'week')),
	CONSTRAINT "projects_hours_per_day" CHECK ("projects"."hours_per_day" > 0 and "projects"."hours_per_day" <= 24),
	CONSTRAINT "projects_working_days" CHECK (cardinality("projects"."working_days") > 0 and "projects"."working_days" <@ array[1, 2, 3, 4, 5, 6, 7])
);
--> statement-breakpoint
ALTER TABLE "projects" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "record_entries" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"submission_id" uuid,
	"sequence" integer NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	"actor_id" uuid NOT NULL,
	"actor_name" text NOT NULL,
	"verb" text NOT NULL,
	"data" jsonb NOT NULL,
	"audience" text DEFAULT 'shared' NOT NULL,
	"previous_hash" text NOT NULL,
	"hash" text NOT NULL,
	CONSTRAINT "record_entries_sequence" UNIQUE NULLS NOT DISTINCT("office_id","submission_id","sequence"),
	CONSTRAINT "record_entries_audience" CHECK ("record_entries"."audience" in ('inside', 'shared')),
	CONSTRAINT "record_entries_first" CHECK (("record_entries"."sequence" = 1) = ("record_entries"."previous_hash" = ''))
);
--> statement-breakpoint
ALTER TABLE "record_entries" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "submission_files" (
	"submission_id" uuid PRIMARY KEY NOT NULL,
	"office_id" uuid NOT NULL,
	"bytes" "bytea" NOT NULL
);
--> statement-breakpoint
ALTER TABLE "submission_files" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "submissions" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"project_id" uuid NOT NULL,
	"contractor_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"status" text DEFAULT 'received' NOT NULL,
	"file_name" text NOT NULL,
	"file_sha256" text NOT NULL,
	"file_bytes" integer NOT NULL,
	"matching" jsonb NOT NULL,
	"reading" jsonb NOT NULL,
	"rows" jsonb NOT NULL,
	"summary" jsonb NOT NULL,
	"version" integer DEFAULT 0 NOT NULL,
	"received_by" uuid NOT NULL,
	"received_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "submissions_project_revision" UNIQUE("project_id","revision"),
	CONSTRAINT "submissions_office_id" UNIQUE("office_id","id"),
	CONSTRAINT "submissions_status" CHECK ("submissions"."status" in ('received', 'under review', 'returned', 'accepted', 'superseded')),
	CONSTRAINT "submissions_revision" CHECK ("submissions"."revision" >= 0),
	CONSTRAINT "submissions_sha256" CHECK ("submissions"."file_sha256" ~ '^[0-9a-f]{64}$')
);
--> statement-breakpoint
ALTER TABLE "submissions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text,
	"session_epoch" integer DEFAULT 0 NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "users_email_unique" UNIQUE("email"),
	CONSTRAINT "users_email_lower" CHECK ("users"."email" = lower("users"."email"))
);
--> statement-breakpoint
ALTER TABLE "users" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "activities" ADD CONSTRAINT "activities_submission" FOREIGN KEY ("office_id","submission_id") REFERENCES "public"."submissions"("office_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "api_tokens" ADD CONSTRAINT "api_tokens_membership" FOREIGN KEY ("office_id","membership_id") REFERENCES "public"."memberships"("office_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_finding_id_findings_id_fk" FOREIGN KEY ("finding_id") REFERENCES "public"."findings"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_submission" FOREIGN KEY ("office_id","submission_id") REFERENCES "public"."submissions"("office_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "contractors" ADD CONSTRAINT "contractors_office_id_offices_id_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_fix_id_fixes_id_fk" FOREIGN KEY ("fix_id") REFERENCES "public"."fixes"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_finding_id_findings_id_fk" FOREIGN KEY ("finding_id") REFERENCES "public"."findings"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_withdrawn_by_users_id_fk" FOREIGN KEY ("withdrawn_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_submission" FOREIGN KEY ("office_id","submission_id") REFERENCES "public"."submissions"("office_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings" ADD CONSTRAINT "findings_submission" FOREIGN KEY ("office_id","submission_id") REFERENCES "public"."submissions"("office_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fixes" ADD CONSTRAINT "fixes_finding_id_findings_id_fk" FOREIGN KEY ("finding_id") REFERENCES "public"."findings"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fixes" ADD CONSTRAINT "fixes_submission_fk" FOREIGN KEY ("office_id","submission_id") REFERENCES "public"."submissions"("office_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_membership" FOREIGN KEY ("office_id","user_id") REFERENCES "public"."memberships"("office_id","user_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_office_id_offices_id_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_contractor" FOREIGN KEY ("office_id","contractor_id") REFERENCES "public"."contractors"("office_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "projects" ADD CONSTRAINT "projects_office_id_offices_id_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "projects" ADD CONSTRAINT "projects_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "projects" ADD CONSTRAINT "projects_contractor" FOREIGN KEY ("office_id","contractor_id") REFERENCES "public"."contractors"("office_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "record_entries" ADD CONSTRAINT "record_entries_office_id_offices_id_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "record_entries" ADD CONSTRAINT "record_entries_actor_id_users_id_fk" FOREIGN KEY ("actor_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "record_entries" ADD CONSTRAINT "record_entries_submission" FOREIGN KEY ("office_id","submission_id") REFERENCES "public"."submissions"("office_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "submission_files" ADD CONSTRAINT "submission_files_submission" FOREIGN KEY ("office_id","submission_id") REFERENCES "public"."submissions"("office_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "submissions" ADD CONSTRAINT "submissions_office_id_offices_id_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "submissions" ADD CONSTRAINT "submissions_received_by_users_id_fk" FOREIGN KEY ("received_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "submissions" ADD CONSTRAINT "submissions_project" FOREIGN KEY ("office_id","contractor_id","project_id") REFERENCES "public"."projects"("office_id","contractor_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "api_tokens_office_membership" ON "api_tokens" USING btree ("office_id","membership_id");--> statement-breakpoint
CREATE INDEX "comments_submission_created" ON "comments" USING btree ("submission_id","created_at");--> statement-breakpoint
CREATE INDEX "comments_finding" ON "comments" USING btree ("finding_id");--> statement-breakpoint
CREATE INDEX "comments_author" ON "comments" USING btree ("author_id");--> statement-breakpoint
CREATE INDEX "corrections_batch" ON "corrections" USING btree ("submission_id","batch");--> statement-breakpoint
CREATE INDEX "corrections_fix" ON "corrections" USING btree ("fix_id");--> statement-breakpoint
CREATE INDEX "corrections_finding" ON "corrections" USING btree ("finding_id");--> statement-breakpoint
CREATE INDEX "corrections_created_by" ON "corrections" USING btree ("created_by");--> statement-breakpoint
CREATE INDEX "corrections_withdrawn_by" ON "corrections" USING btree ("withdrawn_by");--> statement-breakpoint
CREATE UNIQUE INDEX "findings_submission_key" ON "findings" USING btree ("submission_id",md5("key"));--> statement-breakpoint
CREATE INDEX "fixes_submission" ON "fixes" USING btree ("submission_id");--> statement-breakpoint
CREATE INDEX "invitations_office_user" ON "invitations" USING btree ("office_id","user_id");--> statement-breakpoint
CREATE INDEX "invitations_created_by" ON "invitations" USING btree ("created_by");--> statement-breakpoint
CREATE INDEX "memberships_user" ON "memberships" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "memberships_office_contractor" ON "memberships" USING btree ("office_id","contractor_id");--> statement-breakpoint
CREATE INDEX "projects_created_by" ON "projects" USING btree ("created_by");--> statement-breakpoint
CREATE INDEX "record_entries_submission_sequence" ON "record_entries" USING btree ("submission_id","sequence");--> statement-breakpoint
CREATE INDEX "record_entries_actor" ON "record_entries" USING btree ("actor_id");--> statement-breakpoint
CREATE INDEX "submissions_office_contractor_project" ON "submissions" USING btree ("office_id","contractor_id","project_id");--> statement-breakpoint
CREATE INDEX "submissions_received_by" ON "submissions" USING btree ("received_by");--> statement-breakpoint
CREATE POLICY "activities_staff" ON "activities" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("activities"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("activities"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "activities_contractor" ON "activities" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("activities"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "activities"."submission_id" in (select id from submissions)) WITH CHECK ("activities"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "activities"."submission_id" in (select id from submissions));--> statement-breakpoint
CREATE POLICY "api_tokens_staff" ON "api_tokens" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("api_tokens"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("api_tokens"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "api_tokens_contractor" ON "api_tokens" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("api_tokens"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "api_tokens"."membership_id" in (select "memberships"."id" from "memberships" where "memberships"."user_id" = (select nullif(current_setting('app.user', true), '')::uuid))) WITH CHECK ("api_tokens"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "api_tokens"."membership_id" in (select "memberships"."id" from "memberships" where "memberships"."user_id" = (select nullif(current_setting('app.user', true), '')::uuid)));--> statement-breakpoint
CREATE POLICY "api_tokens_identity" ON "api_tokens" AS PERMISSIVE FOR ALL TO "plumbrow_identity" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "comments_staff" ON "comments" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("comments"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("comments"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "comments_contractor" ON "comments" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("comments"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "comments"."audience" = 'shared' and "comments"."submission_id" in (select id from submissions)) WITH CHECK ("comments"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "comments"."audience" = 'shared' and "comments"."submission_id" in (select id from submissions));--> statement-breakpoint
CREATE POLICY "contractors_staff" ON "contractors" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("contractors"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("contractors"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "contractors_contractor" ON "contractors" AS PERMISSIVE FOR SELECT TO "plumbrow_app" USING ("contractors"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "contractors"."id" = (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid));--> statement-breakpoint
CREATE POLICY "corrections_staff" ON "corrections" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("corrections"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("corrections"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "corrections_contractor" ON "corrections" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("corrections"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "corrections"."submission_id" in (select id from submissions)) WITH CHECK ("corrections"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "corrections"."submission_id" in (select id from submissions));--> statement-breakpoint
CREATE POLICY "findings_staff" ON "findings" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("findings"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("findings"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "findings_contractor" ON "findings" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("findings"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "findings"."submission_id" in (select id from submissions)) WITH CHECK ("findings"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "findings"."submission_id" in (select id from submissions));--> statement-breakpoint
CREATE POLICY "fixes_staff" ON "fixes" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("fixes"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("fixes"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "fixes_contractor" ON "fixes" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("fixes"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "fixes"."submission_id" in (select id from submissions)) WITH CHECK ("fixes"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "fixes"."submission_id" in (select id from submissions));--> statement-breakpoint
CREATE POLICY "invitations_staff" ON "invitations" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("invitations"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("invitations"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "invitations_identity" ON "invitations" AS PERMISSIVE FOR ALL TO "plumbrow_identity" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "memberships_staff" ON "memberships" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("memberships"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("memberships"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "memberships_contractor" ON "memberships" AS PERMISSIVE FOR SELECT TO "plumbrow_app" USING ("memberships"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and ("memberships"."contractor_id" is null or "memberships"."contractor_id" = (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid)));--> statement-breakpoint
CREATE POLICY "memberships_identity" ON "memberships" AS PERMISSIVE FOR ALL TO "plumbrow_identity" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "offices_own" ON "offices" AS PERMISSIVE FOR SELECT TO "plumbrow_app" USING ("offices"."id" = (select nullif(current_setting('app.office', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "offices_identity" ON "offices" AS PERMISSIVE FOR ALL TO "plumbrow_identity" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "projects_staff" ON "projects" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("projects"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("projects"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "projects_contractor" ON "projects" AS PERMISSIVE FOR SELECT TO "plumbrow_app" USING ("projects"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "projects"."contractor_id" = (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid));--> statement-breakpoint
CREATE POLICY "record_entries_staff" ON "record_entries" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("record_entries"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("record_entries"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "record_entries_contractor" ON "record_entries" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("record_entries"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "record_entries"."audience" = 'shared' and "record_entries"."submission_id" in (select id from submissions)) WITH CHECK ("record_entries"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "record_entries"."audience" = 'shared' and "record_entries"."submission_id" in (select id from submissions));--> statement-breakpoint
CREATE POLICY "submission_files_staff" ON "submission_files" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("submission_files"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("submission_files"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "submission_files_contractor" ON "submission_files" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("submission_files"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "submission_files"."submission_id" in (select id from submissions)) WITH CHECK ("submission_files"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "submission_files"."submission_id" in (select id from submissions));--> statement-breakpoint
CREATE POLICY "submissions_staff" ON "submissions" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("submissions"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none')) WITH CHECK ("submissions"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select current_setting('app.contractor', true) = 'none'));--> statement-breakpoint
CREATE POLICY "submissions_contractor" ON "submissions" AS PERMISSIVE FOR ALL TO "plumbrow_app" USING ("submissions"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "submissions"."contractor_id" = (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid)) WITH CHECK ("submissions"."office_id" = (select nullif(current_setting('app.office', true), '')::uuid) and (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid) is not null and "submissions"."contractor_id" = (select nullif(nullif(current_setting('app.contractor', true), ''), 'none')::uuid));--> statement-breakpoint
CREATE POLICY "users_fellow" ON "users" AS PERMISSIVE FOR SELECT TO "plumbrow_app" USING ("users"."id" in (select user_id from memberships));--> statement-breakpoint
CREATE POLICY "users_invited" ON "users" AS PERMISSIVE FOR INSERT TO "plumbrow_app" WITH CHECK ((select nullif(current_setting('app.office', true), '') is not null) and "users"."password_hash" is null);--> statement-breakpoint
CREATE POLICY "users_identity" ON "users" AS PERMISSIVE FOR ALL TO "plumbrow_identity" USING (true) WITH CHECK (true);