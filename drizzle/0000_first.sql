CREATE TABLE "designs" (
	"id" serial PRIMARY KEY NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"family" text NOT NULL,
	"description" text DEFAULT '' NOT NULL,
	"settings" text[] DEFAULT '{}' NOT NULL,
	"invented" boolean DEFAULT false NOT NULL,
	CONSTRAINT "designs_slug_unique" UNIQUE("slug"),
	CONSTRAINT "designs_slug_form" CHECK ("designs"."slug" ~ '^[a-z0-9]+(-[a-z0-9]+)*$')
);
--> statement-breakpoint
CREATE TABLE "families" (
	"slug" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	CONSTRAINT "families_slug_known" CHECK ("families"."slug" in ('hinged-plough', 'fixed-plough', 'claw', 'pivoting-fluke', 'light-alloy-pivoting-fluke', 'roll-bar-scoop', 'weighted-tip-scoop', 'plain-scoop', 'fisherman', 'stockless', 'grapnel', 'other'))
);
--> statement-breakpoint
CREATE TABLE "modifications" (
	"id" serial PRIMARY KEY NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"description" text DEFAULT '' NOT NULL,
	CONSTRAINT "modifications_slug_unique" UNIQUE("slug"),
	CONSTRAINT "modifications_slug_form" CHECK ("modifications"."slug" ~ '^[a-z0-9]+(-[a-z0-9]+)*$')
);
--> statement-breakpoint
CREATE TABLE "seabeds" (
	"slug" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"soil" text NOT NULL,
	"numbered" boolean NOT NULL,
	CONSTRAINT "seabeds_slug_known" CHECK ("seabeds"."slug" in ('soft-mud', 'silt', 'firm-mud', 'stiff-clay', 'sandy-mud', 'loose-sand', 'hard-sand', 'thin-sand', 'gravel', 'cobble-over-sand', 'shell', 'weed-over-sand', 'weed-over-mud', 'thick-weed', 'seagrass', 'rock', 'coral')),
	CONSTRAINT "seabeds_soil_known" CHECK ("seabeds"."soil" in ('soft', 'mixed', 'hard', 'none')),
	CONSTRAINT "seabeds_numbered_has_soil" CHECK ("seabeds"."numbered" = ("seabeds"."soil" <> 'none'))
);
--> statement-breakpoint
CREATE TABLE "sizes" (
	"id" serial PRIMARY KEY NOT NULL,
	"design_id" integer NOT NULL,
	"mass_kg" double precision NOT NULL,
	"shank_length_mm" double precision,
	"fluke_width_mm" double precision,
	"overall_height_mm" double precision,
	"shackle_hole_mm" double precision,
	"material" text,
	"shank_strength_n" double precision,
	"finish" text,
	"stows_flat" boolean,
	"price_minor" integer,
	"price_currency" char(3),
	"price_on" date,
	CONSTRAINT "sizes_design_mass" UNIQUE("design_id","mass_kg"),
	CONSTRAINT "sizes_mass_range" CHECK ("sizes"."mass_kg" between 0.5 and 2000),
	CONSTRAINT "sizes_shank_length_range" CHECK ("sizes"."shank_length_mm" between 50 and 5000),
	CONSTRAINT "sizes_fluke_width_range" CHECK ("sizes"."fluke_width_mm" between 20 and 5000),
	CONSTRAINT "sizes_overall_height_range" CHECK ("sizes"."overall_height_mm" between 20 and 5000),
	CONSTRAINT "sizes_shackle_hole_range" CHECK ("sizes"."shackle_hole_mm" between 3 and 100),
	CONSTRAINT "sizes_shank_strength_range" CHECK ("sizes"."shank_strength_n" between 100 and 5000000),
	CONSTRAINT "sizes_price_whole" CHECK (("sizes"."price_minor" is null) = ("sizes"."price_currency" is null) and ("sizes"."price_minor" is null) = ("sizes"."price_on" is null)),
	CONSTRAINT "sizes_price_range" CHECK ("sizes"."price_minor" >= 0)
);
--> statement-breakpoint
CREATE TABLE "pulls" (
	"id" serial PRIMARY KEY NOT NULL,
	"trial_id" integer NOT NULL,
	"ordinal" integer NOT NULL,
	"design_id" integer NOT NULL,
	"size_id" integer NOT NULL,
	"modification_id" integer,
	"anchor_setting" text,
	"pair" text,
	"seabed" text NOT NULL,
	"setting" text NOT NULL,
	"first_try" boolean NOT NULL,
	"fresh" boolean DEFAULT true NOT NULL,
	"held_n" double precision NOT NULL,
	"moved_n" double precision,
	"shank_angle_deg" double precision DEFAULT 0 NOT NULL,
	"ended" text,
	"creep_m_min" double precision,
	"after" text,
	"veer_deg" double precision,
	"veer" text,
	"east_m" double precision,
	"north_m" double precision,
	"attitude" text DEFAULT 'notSeen' NOT NULL,
	"fouling" text DEFAULT 'clean' NOT NULL,
	"condition" text DEFAULT 'undamaged' NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"superseded_by_id" integer,
	CONSTRAINT "pulls_trial_ordinal" UNIQUE("trial_id","ordinal"),
	CONSTRAINT "pulls_seabed_numbered" CHECK ("pulls"."seabed" in ('soft-mud', 'silt', 'firm-mud', 'stiff-clay', 'sandy-mud', 'loose-sand', 'hard-sand', 'thin-sand', 'gravel', 'cobble-over-sand', 'shell', 'weed-over-sand', 'weed-over-mud')),
	CONSTRAINT "pulls_setting_known" CHECK ("pulls"."setting" in ('set', 'setAfterDragging', 'neverSet', 'fouled')),
	CONSTRAINT "pulls_end_known" CHECK ("pulls"."ended" in ('atTheLimit', 'stoppedEarly', 'crept', 'dragged', 'brokeOut')),
	CONSTRAINT "pulls_after_known" CHECK ("pulls"."after" in ('reset', 'didNotReset', 'notTried')),
	CONSTRAINT "pulls_veer_known" CHECK ("pulls"."veer" in ('stayedBuried', 'brokeOutAndReset', 'brokeOutAndDidNotReset')),
	CONSTRAINT "pulls_attitude_known" CHECK ("pulls"."attitude" in ('upright', 'onItsSide', 'inverted', 'buried', 'notSeen')),
	CONSTRAINT "pulls_fouling_known" CHECK ("pulls"."fouling" in ('clean', 'mudBall', 'clayFilled', 'weed', 'shell', 'stoneJammed', 'ownChain')),
	CONSTRAINT "pulls_condition_known" CHECK ("pulls"."condition" in ('undamaged', 'bent')),
	CONSTRAINT "pulls_held_range" CHECK ("pulls"."held_n" between 0 and 1000000),
	CONSTRAINT "pulls_moved_range" CHECK ("pulls"."moved_n" between 1 and 1000000),
	CONSTRAINT "pulls_angle_range" CHECK ("pulls"."shank_angle_deg" between 0 and 60),
	CONSTRAINT "pulls_creep_range" CHECK ("pulls"."creep_m_min" between 0 and 100),
	CONSTRAINT "pulls_veer_deg_range" CHECK ("pulls"."veer_deg" between 0 and 180),
	CONSTRAINT "pulls_moved_above_held" CHECK ("pulls"."moved_n" > "pulls"."held_n"),
	CONSTRAINT "pulls_never_set_held_nothing" CHECK ("pulls"."setting" not in ('neverSet', 'fouled') or "pulls"."held_n" = 0),
	CONSTRAINT "pulls_set_has_bracket" CHECK ("pulls"."setting" in ('neverSet', 'fouled') or "pulls"."held_n" > 0 or "pulls"."moved_n" is not null),
	CONSTRAINT "pulls_veer_whole" CHECK (("pulls"."veer_deg" is null) = ("pulls"."veer" is null))
);
--> statement-breakpoint
CREATE TABLE "rigs" (
	"id" serial PRIMARY KEY NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"vessel" text DEFAULT '' NOT NULL,
	"method" text DEFAULT '' NOT NULL,
	"limit_n" double precision NOT NULL,
	"steps_n" double precision[] NOT NULL,
	"hold_s" double precision DEFAULT 30 NOT NULL,
	"calibrated_on" date,
	"calibration_method" text DEFAULT '' NOT NULL,
	"calibration_sd" double precision,
	"invented" boolean DEFAULT false NOT NULL,
	CONSTRAINT "rigs_slug_unique" UNIQUE("slug"),
	CONSTRAINT "rigs_slug_form" CHECK ("rigs"."slug" ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
	CONSTRAINT "rigs_limit_range" CHECK ("rigs"."limit_n" between 10 and 1000000),
	CONSTRAINT "rigs_hold_range" CHECK ("rigs"."hold_s" between 1 and 3600),
	CONSTRAINT "rigs_calibration_sd_range" CHECK ("rigs"."calibration_sd" between 0 and 1)
);
--> statement-breakpoint
CREATE TABLE "trials" (
	"id" serial PRIMARY KEY NOT NULL,
	"slug" text NOT NULL,
	"rig_id" integer NOT NULL,
	"tester" text NOT NULL,
	"day" date NOT NULL,
	"place" text NOT NULL,
	"latitude_deg" double precision,
	"longitude_deg" double precision,
	"depth_m" double precision NOT NULL,
	"wind_ms" double precision,
	"current_ms" double precision,
	"wind_from" text DEFAULT '' NOT NULL,
	"wave_height_m" double precision,
	"sea_state" text DEFAULT '' NOT NULL,
	"procedure" text DEFAULT '' NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"rode" jsonb NOT NULL,
	"published_at" timestamp with time zone,
	"invented" boolean DEFAULT false NOT NULL,
	CONSTRAINT "trials_slug_unique" UNIQUE("slug"),
	CONSTRAINT "trials_slug_form" CHECK ("trials"."slug" ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
	CONSTRAINT "trials_latitude_range" CHECK ("trials"."latitude_deg" between -90 and 90),
	CONSTRAINT "trials_longitude_range" CHECK ("trials"."longitude_deg" between -180 and 180),
	CONSTRAINT "trials_depth_range" CHECK ("trials"."depth_m" between 0.5 and 100),
	CONSTRAINT "trials_wind_range" CHECK ("trials"."wind_ms" between 0 and 60),
	CONSTRAINT "trials_current_range" CHECK ("trials"."current_ms" between 0 and 5),
	CONSTRAINT "trials_wave_range" CHECK ("trials"."wave_height_m" between 0 and 20)
);
--> statement-breakpoint
CREATE TABLE "covariances" (
	"fit_id" integer NOT NULL,
	"seabed" text NOT NULL,
	"exponent" double precision NOT NULL,
	"beta_mean" double precision NOT NULL,
	"design_ids" integer[] NOT NULL,
	"covariance" double precision[] NOT NULL,
	CONSTRAINT "covariances_fit_id_seabed_pk" PRIMARY KEY("fit_id","seabed"),
	CONSTRAINT "covariances_seabed_numbered" CHECK ("covariances"."seabed" in ('soft-mud', 'silt', 'firm-mud', 'stiff-clay', 'sandy-mud', 'loose-sand', 'hard-sand', 'thin-sand', 'gravel', 'cobble-over-sand', 'shell', 'weed-over-sand', 'weed-over-mud')),
	CONSTRAINT "covariances_square" CHECK (cardinality("covariances"."covariance") = (cardinality("covariances"."design_ids") + 1) * (cardinality("covariances"."design_ids") + 1))
);
--> statement-breakpoint
CREATE TABLE "estimates" (
	"id" serial PRIMARY KEY NOT NULL,
	"fit_id" integer NOT NULL,
	"design_id" integer NOT NULL,
	"seabed" text NOT NULL,
	"modification_id" integer,
	"ln_mean" double precision NOT NULL,
	"ln_sd" double precision NOT NULL,
	"pulls" integer NOT NULL,
	"days" integer,
	"pairs" integer,
	"at_limit" integer,
	"least_mass_kg" double precision,
	"greatest_mass_kg" double precision,
	"most_shown_15kg_n" double precision,
	"set_share" jsonb,
	"reset_share" jsonb,
	"veer_share" jsonb,
	"verdict" text,
	CONSTRAINT "estimates_seabed_numbered" CHECK ("estimates"."seabed" in ('soft-mud', 'silt', 'firm-mud', 'stiff-clay', 'sandy-mud', 'loose-sand', 'hard-sand', 'thin-sand', 'gravel', 'cobble-over-sand', 'shell', 'weed-over-sand', 'weed-over-mud')),
	CONSTRAINT "estimates_verdict_known" CHECK ("estimates"."verdict" in ('better', 'worse', 'noDifference', 'cannotTell')),
	CONSTRAINT "estimates_sd_range" CHECK ("estimates"."ln_sd" between 0 and 100),
	CONSTRAINT "estimates_mean_range" CHECK ("estimates"."ln_mean" between -100 and 100)
);
--> statement-breakpoint
CREATE TABLE "fits" (
	"id" serial PRIMARY KEY NOT NULL,
	"model_version" text NOT NULL,
	"data_hash" text NOT NULL,
	"seed" integer,
	"sigma" double precision NOT NULL,
	"sds" jsonb NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"stands_from" timestamp with time zone,
	CONSTRAINT "fits_model_data" UNIQUE("model_version","data_hash"),
	CONSTRAINT "fits_sigma_range" CHECK ("fits"."sigma" between 0 and 100)
);
--> statement-breakpoint
CREATE TABLE "facts" (
	"name" text PRIMARY KEY NOT NULL,
	"value" text NOT NULL
);
--> statement-breakpoint
ALTER TABLE "designs" ADD CONSTRAINT "designs_family_families_slug_fk" FOREIGN KEY ("family") REFERENCES "public"."families"("slug") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sizes" ADD CONSTRAINT "sizes_design_id_designs_id_fk" FOREIGN KEY ("design_id") REFERENCES "public"."designs"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pulls" ADD CONSTRAINT "pulls_trial_id_trials_id_fk" FOREIGN KEY ("trial_id") REFERENCES "public"."trials"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pulls" ADD CONSTRAINT "pulls_design_id_designs_id_fk" FOREIGN KEY ("design_id") REFERENCES "public"."designs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pulls" ADD CONSTRAINT "pulls_size_id_sizes_id_fk" FOREIGN KEY ("size_id") REFERENCES "public"."sizes"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pulls" ADD CONSTRAINT "pulls_modification_id_modifications_id_fk" FOREIGN KEY ("modification_id") REFERENCES "public"."modifications"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pulls" ADD CONSTRAINT "pulls_superseded_by_id_pulls_id_fk" FOREIGN KEY ("superseded_by_id") REFERENCES "public"."pulls"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "trials" ADD CONSTRAINT "trials_rig_id_rigs_id_fk" FOREIGN KEY ("rig_id") REFERENCES "public"."rigs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "covariances" ADD CONSTRAINT "covariances_fit_id_fits_id_fk" FOREIGN KEY ("fit_id") REFERENCES "public"."fits"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimates" ADD CONSTRAINT "estimates_fit_id_fits_id_fk" FOREIGN KEY ("fit_id") REFERENCES "public"."fits"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimates" ADD CONSTRAINT "estimates_design_id_designs_id_fk" FOREIGN KEY ("design_id") REFERENCES "public"."designs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimates" ADD CONSTRAINT "estimates_modification_id_modifications_id_fk" FOREIGN KEY ("modification_id") REFERENCES "public"."modifications"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "pulls_design_seabed" ON "pulls" USING btree ("design_id","seabed");--> statement-breakpoint
CREATE INDEX "pulls_seabed" ON "pulls" USING btree ("seabed");--> statement-breakpoint
CREATE UNIQUE INDEX "estimates_one_each" ON "estimates" USING btree ("fit_id","design_id","seabed",coalesce("modification_id", 0));--> statement-breakpoint
CREATE INDEX "estimates_fit_seabed" ON "estimates" USING btree ("fit_id","seabed");