CREATE TABLE "corrections" (
	"fleet_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"subject_id" uuid NOT NULL,
	"version" integer NOT NULL,
	"was" jsonb NOT NULL,
	"taken_back" boolean NOT NULL,
	"by" uuid NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "corrections_fleet_id_kind_subject_id_version_pk" PRIMARY KEY("fleet_id","kind","subject_id","version")
);
--> statement-breakpoint
ALTER TABLE "corrections" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "hour_readings" ADD COLUMN "version" integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE "hour_readings" ADD COLUMN "taken_back_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "log_entries" ADD COLUMN "taken_back_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "invitations" ADD COLUMN "sent_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_fleet_id_by_people_fleet_id_user_id_fk" FOREIGN KEY ("fleet_id","by") REFERENCES "public"."people"("fleet_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE POLICY "fleet_wall" ON "corrections" AS PERMISSIVE FOR ALL TO public USING (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid)) WITH CHECK (fleet_id = (select nullif(current_setting('app.fleet_id', true), '')::uuid));