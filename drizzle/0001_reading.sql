CREATE TABLE "pull_questions" (
	"id" serial PRIMARY KEY NOT NULL,
	"pull_id" integer NOT NULL,
	"question" text NOT NULL,
	"mail_address" text NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "pull_questions_state_known" CHECK ("pull_questions"."state" in ('open', 'answered', 'closed')),
	CONSTRAINT "pull_questions_length" CHECK (char_length("pull_questions"."question") between 10 and 2000),
	CONSTRAINT "pull_questions_mail_form" CHECK (char_length("pull_questions"."mail_address") between 3 and 254 and "pull_questions"."mail_address" like '%_@_%' and "pull_questions"."mail_address" !~ '[[:cntrl:][:space:]]')
);
--> statement-breakpoint
CREATE TABLE "releases" (
	"id" serial PRIMARY KEY NOT NULL,
	"version" text NOT NULL,
	"cut_at" timestamp with time zone NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	"fit_id" integer NOT NULL,
	"hash" text NOT NULL,
	"notes" text DEFAULT '' NOT NULL,
	CONSTRAINT "releases_version" UNIQUE("version"),
	CONSTRAINT "releases_version_form" CHECK ("releases"."version" ~ '^[0-9]+([.][0-9]+)*$'),
	CONSTRAINT "releases_hash_form" CHECK ("releases"."hash" ~ '^[0-9a-f]{64}$')
);
--> statement-breakpoint
CREATE TABLE "trial_replies" (
	"id" serial PRIMARY KEY NOT NULL,
	"trial_id" integer NOT NULL,
	"author" text NOT NULL,
	"reply" text NOT NULL,
	"published_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "trial_replies_length" CHECK (char_length("trial_replies"."reply") between 1 and 5000)
);
--> statement-breakpoint
ALTER TABLE "modifications" ADD COLUMN "added_mass_kg" double precision;--> statement-breakpoint
ALTER TABLE "modifications" ADD COLUMN "price_minor" integer;--> statement-breakpoint
ALTER TABLE "modifications" ADD COLUMN "price_currency" char(3);--> statement-breakpoint
ALTER TABLE "modifications" ADD COLUMN "price_on" date;--> statement-breakpoint
ALTER TABLE "pull_questions" ADD CONSTRAINT "pull_questions_pull_id_pulls_id_fk" FOREIGN KEY ("pull_id") REFERENCES "public"."pulls"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_fit_id_fits_id_fk" FOREIGN KEY ("fit_id") REFERENCES "public"."fits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "trial_replies" ADD CONSTRAINT "trial_replies_trial_id_trials_id_fk" FOREIGN KEY ("trial_id") REFERENCES "public"."trials"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "pull_questions_pull" ON "pull_questions" USING btree ("pull_id");--> statement-breakpoint
CREATE INDEX "trial_replies_trial" ON "trial_replies" USING btree ("trial_id");--> statement-breakpoint
CREATE INDEX "pulls_modification" ON "pulls" USING btree ("modification_id") WHERE modification_id is not null;--> statement-breakpoint
CREATE INDEX "trials_published" ON "trials" USING btree ("published_at");--> statement-breakpoint
CREATE INDEX "trials_rig" ON "trials" USING btree ("rig_id");--> statement-breakpoint
CREATE INDEX "estimates_fit_modification" ON "estimates" USING btree ("fit_id","modification_id") WHERE modification_id is not null;--> statement-breakpoint
ALTER TABLE "modifications" ADD CONSTRAINT "modifications_added_mass_range" CHECK ("modifications"."added_mass_kg" between -500 and 500);--> statement-breakpoint
ALTER TABLE "modifications" ADD CONSTRAINT "modifications_price_whole" CHECK (("modifications"."price_minor" is null) = ("modifications"."price_currency" is null) and ("modifications"."price_minor" is null) = ("modifications"."price_on" is null));