CREATE TABLE "boats" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"call_minutes" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"removed_at" timestamp with time zone,
	CONSTRAINT "boats_fleet_id_id_pk" PRIMARY KEY("fleet_id","id")
);
--> statement-breakpoint
ALTER TABLE "boats" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "engines" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"boat_id" uuid NOT NULL,
	"name" text NOT NULL,
	"has_hour_meter" boolean DEFAULT true NOT NULL,
	"estimated_hours_per_year" double precision,
	"profile" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"removed_at" timestamp with time zone,
	CONSTRAINT "engines_fleet_id_id_pk" PRIMARY KEY("fleet_id","id")
);
--> statement-breakpoint
ALTER TABLE "engines" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "hour_readings" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"engine_id" uuid NOT NULL,
	"reading" double precision NOT NULL,
	"read_at" timestamp with time zone NOT NULL,
	"reset" boolean DEFAULT false NOT NULL,
	"by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "hour_readings_fleet_id_id_pk" PRIMARY KEY("fleet_id","id")
);
--> statement-breakpoint
ALTER TABLE "hour_readings" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "diagnoses" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"engine_id" uuid NOT NULL,
	"shipped_version_id" uuid,
	"own_version_id" uuid,
	"begun_at" timestamp with time zone NOT NULL,
	"begun_by" uuid NOT NULL,
	"symptoms" text[] DEFAULT '{}' NOT NULL,
	"ended_at" timestamp with time zone,
	"outcome" text,
	"last_event_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "diagnoses_fleet_id_id_pk" PRIMARY KEY("fleet_id","id"),
	CONSTRAINT "diagnoses_one_tree_version" CHECK (num_nonnulls(shipped_version_id, own_version_id) = 1)
);
--> statement-breakpoint
ALTER TABLE "diagnoses" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "diagnosis_events" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"diagnosis_id" uuid NOT NULL,
	"device" uuid NOT NULL,
	"sequence" integer NOT NULL,
	"kind" text NOT NULL,
	"payload" jsonb NOT NULL,
	"seen" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"supersedes" uuid,
	"made_at" timestamp with time zone NOT NULL,
	"received_at" timestamp with time zone DEFAULT now() NOT NULL,
	"by" uuid NOT NULL,
	CONSTRAINT "diagnosis_events_fleet_id_id_pk" PRIMARY KEY("fleet_id","id"),
	CONSTRAINT "diagnosis_events_fleetId_diagnosisId_device_sequence_unique" UNIQUE("fleet_id","diagnosis_id","device","sequence")
);
--> statement-breakpoint
ALTER TABLE "diagnosis_events" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "files" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"media_type" text NOT NULL,
	"bytes" integer NOT NULL,
	"width_px" integer NOT NULL,
	"height_px" integer NOT NULL,
	"sent_hash" text NOT NULL,
	"by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "files_fleet_id_id_pk" PRIMARY KEY("fleet_id","id")
);
--> statement-breakpoint
ALTER TABLE "files" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "fleets" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "fleets" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "people" (
	"fleet_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"name" text NOT NULL,
	"joined_at" timestamp with time zone DEFAULT now() NOT NULL,
	"left_at" timestamp with time zone,
	CONSTRAINT "people_fleet_id_user_id_pk" PRIMARY KEY("fleet_id","user_id")
);
--> statement-breakpoint
ALTER TABLE "people" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "log_entries" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"engine_id" uuid NOT NULL,
	"diagnosis_id" uuid,
	"at" timestamp with time zone NOT NULL,
	"outcome" text,
	"symptoms" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"cause_key" text,
	"cause_title" text,
	"cause_system" text,
	"remedy_key" text,
	"remedy_title" text,
	"proof" text,
	"temporary" boolean DEFAULT false NOT NULL,
	"engine_hours" double precision,
	"minutes" double precision,
	"parts" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"note" text,
	"by" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "log_entries_fleet_id_id_pk" PRIMARY KEY("fleet_id","id"),
	CONSTRAINT "log_entries_fleetId_diagnosisId_unique" UNIQUE("fleet_id","diagnosis_id")
);
--> statement-breakpoint
ALTER TABLE "log_entries" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "invitations" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"email" text NOT NULL,
	"roles" text[] NOT NULL,
	"fleet_name" text NOT NULL,
	"invited_by" uuid NOT NULL,
	"invited_by_name" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	CONSTRAINT "invitations_fleet_id_id_pk" PRIMARY KEY("fleet_id","id"),
	CONSTRAINT "invitations_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "memberships" (
	"fleet_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"roles" text[] NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "memberships_fleet_id_user_id_pk" PRIMARY KEY("fleet_id","user_id")
);
--> statement-breakpoint
CREATE TABLE "attempts" (
	"key" text PRIMARY KEY NOT NULL,
	"count" integer NOT NULL,
	"ends_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "one_time_tokens" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"purpose" text NOT NULL,
	"email" text NOT NULL,
	"user_id" uuid,
	"payload" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"device" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"last_seen_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "shipped_tree_versions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"key" text NOT NULL,
	"title" text NOT NULL,
	"number" integer NOT NULL,
	"document" jsonb NOT NULL,
	"hash" text NOT NULL,
	"published_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "shipped_tree_versions_key_number_unique" UNIQUE("key","number")
);
--> statement-breakpoint
CREATE TABLE "tree_versions" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"tree_id" uuid NOT NULL,
	"number" integer,
	"revision" integer DEFAULT 1 NOT NULL,
	"document" jsonb NOT NULL,
	"hash" text NOT NULL,
	"by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"published_at" timestamp with time zone,
	CONSTRAINT "tree_versions_fleet_id_id_pk" PRIMARY KEY("fleet_id","id"),
	CONSTRAINT "tree_versions_fleetId_treeId_number_unique" UNIQUE("fleet_id","tree_id","number"),
	CONSTRAINT "tree_versions_numbered_when_published" CHECK ((number is null) = (published_at is null))
);
--> statement-breakpoint
ALTER TABLE "tree_versions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "trees" (
	"fleet_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"key" text NOT NULL,
	"title" text NOT NULL,
	"ancestor_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "trees_fleet_id_id_pk" PRIMARY KEY("fleet_id","id"),
	CONSTRAINT "trees_fleetId_key_unique" UNIQUE("fleet_id","key")
);
--> statement-breakpoint
ALTER TABLE "trees" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "credentials" (
	"user_id" uuid PRIMARY KEY NOT NULL,
	"password_hash" text NOT NULL,
	"changed_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "users_email_unique" UNIQUE("email")
);
--> statement-breakpoint
ALTER TABLE "boats" ADD CONSTRAINT "boats_fleet_id_fleets_id_fk" FOREIGN KEY ("fleet_id") REFERENCES "public"."fleets"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "engines" ADD CONSTRAINT "engines_fleet_id_boat_id_boats_fleet_id_id_fk" FOREIGN KEY ("fleet_id","boat_id") REFERENCES "public"."boats"("fleet_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "hour_readings" ADD CONSTRAINT "hour_readings_fleet_id_engine_id_engines_fleet_id_id_fk" FOREIGN KEY ("fleet_id","engine_id") REFERENCES "public"."engines"("fleet_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "hour_readings" ADD CONSTRAINT "hour_readings_fleet_id_by_people_fleet_id_user_id_fk" FOREIGN KEY ("fleet_id","by") REFERENCES "public"."people"("fleet_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "diagnoses" ADD CONSTRAINT "diagnoses_shipped_version_id_shipped_tree_versions_id_fk" FOREIGN KEY ("shipped_version_id") REFERENCES "public"."shipped_tree_versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "diagnoses" ADD CONSTRAINT "diagnoses_fleet_id_engine_id_engines_fleet_id_id_fk" FOREIGN KEY ("fleet_id","engine_id") REFERENCES "public"."engines"("fleet_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "diagnoses" ADD CONSTRAINT "diagnoses_fleet_id_own_version_id_tree_versions_fleet_id_id_fk" FOREIGN KEY ("fleet_id","own_version_id") REFERENCES "public"."tree_versions"("fleet_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "diagnoses" ADD CONSTRAINT "diagnoses_fleet_id_begun_by_people_fleet_id_user_id_fk" FOREIGN KEY ("fleet_id","begun_by") REFERENCES "public"."people"("fleet_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "diagnosis_events" ADD CONSTRAINT "diagnosis_events_fleet_id_diagnosis_id_diagnoses_fleet_id_id_fk" FOREIGN KEY ("fleet_id","diagnosis_id") REFERENCES "public"."diagnoses"("fleet_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "diagnosis_events" ADD CONSTRAINT "diagnosis_events_fleet_id_by_people_fleet_id_user_id_fk" FOREIGN KEY ("fleet_id","by") REFERENCES "public"."people"("fleet_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "files" ADD CONSTRAINT "files_fleet_id_fleets_id_fk" FOREIGN KEY ("fleet_id") REFERENCES "public"."fleets"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "files" ADD CONSTRAINT "files_fleet_id_by_people_fleet_id_user_id_fk" FOREIGN KEY ("fleet_id","by") REFERENCES "public"."people"("fleet_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "people" ADD CONSTRAINT "people_fleet_id_fleets_id_fk" FOREIGN KEY ("fleet_id") REFERENCES "public"."fleets"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "log_entries" ADD CONSTRAINT "log_entries_fleet_id_engine_id_engines_fleet_id_id_fk" FOREIGN KEY ("fleet_id","engine_id") REFERENCES "public"."engines"("fleet_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "log_entries" ADD CONSTRAINT "log_entries_fleet_id_diagnosis_id_diagnoses_fleet_id_id_fk" FOREIGN KEY ("fleet_id","diagnosis_id") REFERENCES "public"."diagnoses"("fleet_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "log_entries" ADD CONSTRAINT "log_entries_fleet_id_by_people_fleet_id_user_id_fk" FOREIGN KEY ("fleet_id","by") REFERENCES "public"."people"("fleet_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_fleet_id_fleets_id_fk" FOREIGN KEY ("fleet_id") REFERENCES "public"."fleets"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_invited_by_users_id_fk" FOREIGN KEY ("invited_by") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_fleet_id_fleets_id_fk" FOREIGN KEY ("fleet_id") REFERENCES "public"."fleets"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "one_time_tokens" ADD CONSTRAINT "one_time_tokens_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tree_versions" ADD CONSTRAINT "tree_versions_fleet_id_tree_id_trees_fleet_id_id_fk" FOREIGN KEY ("fleet_id","tree_id") REFERENCES "public"."trees"("fleet_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tree_versions" ADD CONSTRAINT "tree_versions_fleet_id_by_people_fleet_id_user_id_fk" FOREIGN KEY ("fleet_id","by") REFERENCES "public"."people"("fleet_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "trees" ADD CONSTRAINT "trees_fleet_id_fleets_id_fk" FOREIGN KEY ("fleet_id") REFERENCES "public"."fleets"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "trees" ADD CONSTRAINT "trees_ancestor_id_shipped_tree_versions_id_fk" FOREIGN KEY ("ancestor_id") REFERENCES "public"."shipped_tree_versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "credentials" ADD CONSTRAINT "credentials_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "engines_fleet_id_boat_id_index" ON "engines" USING btree ("fleet_id","boat_id");--> statement-breakpoint
CREATE INDEX "hour_readings_fleet_id_engine_id_read_at_index" ON "hour_readings" USING btree ("fleet_id","engine_id","read_at");--> statement-breakpoint
CREATE INDEX "diagnoses_fleet_id_engine_id_begun_at_index" ON "diagnoses" USING btree ("fleet_id","engine_id","begun_at");--> statement-breakpoint
CREATE INDEX "diagnoses_fleet_id_begun_at_index" ON "diagnoses" USING btree ("fleet_id","begun_at");--> statement-breakpoint
CREATE INDEX "log_entries_fleet_id_engine_id_at_id_index" ON "log_entries" USING btree ("fleet_id","engine_id","at","id");--> statement-breakpoint
CREATE INDEX "log_entries_fleet_id_at_id_index" ON "log_entries" USING btree ("fleet_id","at","id");--> statement-breakpoint
CREATE INDEX "log_entries_fleet_id_engine_id_cause_key_index" ON "log_entries" USING btree ("fleet_id","engine_id","cause_key");--> statement-breakpoint
CREATE INDEX "invitations_fleet_id_email_index" ON "invitations" USING btree ("fleet_id","email");--> statement-breakpoint
CREATE INDEX "memberships_user_id_index" ON "memberships" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "attempts_ends_at_index" ON "attempts" USING btree ("ends_at");--> statement-breakpoint
CREATE INDEX "one_time_tokens_user_id_index" ON "one_time_tokens" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "one_time_tokens_expires_at_index" ON "one_time_tokens" USING btree ("expires_at");--> statement-breakpoint
CREATE INDEX "sessions_user_id_index" ON "sessions" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "sessions_expires_at_index" ON "sessions" USING btree ("expires_at");--> statement-breakpoint
CREATE UNIQUE INDEX "tree_versions_one_draft" ON "tree_versions" USING btree ("fleet_id","tree_id") WHERE published_at is null;--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "boats" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "engines" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "hour_readings" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "diagnoses" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "diagnosis_events" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "files" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "fleets" AS PERMISSIVE FOR ALL TO public USING (id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "people" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "log_entries" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "tree_versions" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "trees" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));