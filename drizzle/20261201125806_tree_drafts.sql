ALTER TABLE "tree_versions" ADD COLUMN "begun_from" uuid NOT NULL;--> statement-breakpoint
ALTER TABLE "tree_versions" ADD COLUMN "taken_up" uuid NOT NULL;--> statement-breakpoint
ALTER TABLE "tree_versions" ADD COLUMN "note" text;--> statement-breakpoint
ALTER TABLE "tree_versions" ADD COLUMN "differences" jsonb DEFAULT '[]'::jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "tree_versions" ADD COLUMN "saved_at" timestamp with time zone DEFAULT now() NOT NULL;--> statement-breakpoint
ALTER TABLE "tree_versions" ADD CONSTRAINT "tree_versions_taken_up_shipped_tree_versions_id_fk" FOREIGN KEY ("taken_up") REFERENCES "public"."shipped_tree_versions"("id") ON DELETE no action ON UPDATE no action;