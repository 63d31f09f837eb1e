ALTER TABLE "pulls" ADD COLUMN "recorded_at" timestamp with time zone DEFAULT now() NOT NULL;--> statement-breakpoint
ALTER TABLE "releases" ADD COLUMN "pull_ids" integer[] NOT NULL;--> statement-breakpoint
ALTER TABLE "releases" ADD COLUMN "described" jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "releases" ADD COLUMN "files" jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_have_pulls" CHECK (cardinality("releases"."pull_ids") > 0);