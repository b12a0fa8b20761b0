CREATE TABLE "audit_entries" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"user_id" uuid,
	"studio_id" uuid,
	"event" text NOT NULL,
	"details" jsonb NOT NULL
);
--> statement-breakpoint
CREATE TABLE "change_observations" (
	"change_id" uuid NOT NULL,
	"observation_id" uuid NOT NULL,
	CONSTRAINT "change_observations_change_id_observation_id_pk" PRIMARY KEY("change_id","observation_id")
);
--> statement-breakpoint
CREATE TABLE "changes" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"sample_id" uuid NOT NULL,
	"cause" text,
	"side" text DEFAULT 'both' NOT NULL,
	"decision" text NOT NULL,
	"title" text NOT NULL,
	"suggested_mm" double precision,
	"amount_mm" double precision NOT NULL,
	"paper" jsonb NOT NULL,
	"predictions" jsonb NOT NULL,
	"reason" text,
	"note" text DEFAULT '' NOT NULL,
	"carried_to" integer,
	"decided_by" uuid,
	"decided_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "comments" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"author_id" uuid,
	"text" text NOT NULL,
	"sample_number" integer,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "final_cuts" (
	"project_id" uuid PRIMARY KEY NOT NULL,
	"ticks" jsonb NOT NULL,
	"cloth" jsonb NOT NULL,
	"shrinkage" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"agreed_by" uuid,
	"agreed_at" timestamp with time zone,
	"cleared_at" timestamp with time zone,
	"cut_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "observations" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"sample_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"photograph_id" uuid,
	"mark" jsonb,
	"sign" text NOT NULL,
	"zone" text NOT NULL,
	"view" text NOT NULL,
	"side" text NOT NULL,
	"direction" text,
	"towards" text,
	"line" text,
	"severity" integer NOT NULL,
	"amount" jsonb,
	"note" text DEFAULT '' NOT NULL,
	"state" text DEFAULT 'noted' NOT NULL,
	"let_be_reason" text DEFAULT '' NOT NULL,
	"noted_by" uuid,
	"removed_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "readings" (
	"observation_id" uuid NOT NULL,
	"sample_id" uuid NOT NULL,
	"gone" boolean NOT NULL,
	"reversed" boolean DEFAULT false NOT NULL,
	"amount" jsonb,
	"note" text DEFAULT '' NOT NULL,
	"read_by" uuid,
	"read_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "readings_observation_id_sample_id_pk" PRIMARY KEY("observation_id","sample_id")
);
--> statement-breakpoint
CREATE TABLE "password_resets" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "patterns" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"studio_id" uuid NOT NULL,
	"name" text NOT NULL,
	"origin" text DEFAULT '' NOT NULL,
	"view" text DEFAULT '' NOT NULL,
	"garment" jsonb NOT NULL,
	"drafted_cup_mm" double precision,
	"allowance_mm" double precision DEFAULT 15 NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"chart" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "photographs" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"sample_id" uuid NOT NULL,
	"view" text NOT NULL,
	"caption" text DEFAULT '' NOT NULL,
	"pose" text DEFAULT '' NOT NULL,
	"drawing" boolean DEFAULT false NOT NULL,
	"content_hash" text,
	"width" integer,
	"height" integer,
	"bytes" bigint DEFAULT 0 NOT NULL,
	"stored_at" timestamp with time zone,
	"taken_by" uuid,
	"removed_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "pieces" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"role" text NOT NULL,
	"name" text NOT NULL,
	"view" text DEFAULT '' NOT NULL,
	"cut_count" integer NOT NULL,
	"on_fold" boolean NOT NULL,
	"notch_count" integer,
	"dart_count" integer,
	"allowance_mm" double precision NOT NULL,
	"marks" jsonb NOT NULL,
	"hangs" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "transfers" (
	"change_id" uuid NOT NULL,
	"piece_id" uuid NOT NULL,
	"ticked_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ticked_by" uuid,
	CONSTRAINT "transfers_change_id_piece_id_pk" PRIMARY KEY("change_id","piece_id")
);
--> statement-breakpoint
CREATE TABLE "projects" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"studio_id" uuid NOT NULL,
	"wearer_id" uuid NOT NULL,
	"pattern_id" uuid NOT NULL,
	"maker_id" uuid,
	"name" text NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"stage" text DEFAULT 'size' NOT NULL,
	"sample_number" integer,
	"sample_state" text,
	"open_count" integer DEFAULT 0 NOT NULL,
	"next_fitting_at" timestamp with time zone,
	"rested_from" text,
	"last_look_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "size_plans" (
	"project_id" uuid PRIMARY KEY NOT NULL,
	"choices" jsonb NOT NULL,
	"lengths_mm" jsonb NOT NULL,
	"reason" text DEFAULT '' NOT NULL,
	"set_id" uuid,
	"kept_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "request_keys" (
	"user_id" uuid NOT NULL,
	"key" text NOT NULL,
	"request" text NOT NULL,
	"status" integer,
	"answer" jsonb,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "request_keys_user_id_key_pk" PRIMARY KEY("user_id","key")
);
--> statement-breakpoint
CREATE TABLE "samples" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"state" text DEFAULT 'to-sew' NOT NULL,
	"cloth" text DEFAULT '' NOT NULL,
	"differs" text DEFAULT '' NOT NULL,
	"stiffer" boolean DEFAULT false NOT NULL,
	"stretch_percent" double precision,
	"final_stretch_percent" double precision,
	"basted" text DEFAULT '' NOT NULL,
	"sewn_on" date,
	"note" text DEFAULT '' NOT NULL,
	"answers" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"sid" varchar PRIMARY KEY NOT NULL,
	"sess" json NOT NULL,
	"expire" timestamp (6) NOT NULL
);
--> statement-breakpoint
CREATE TABLE "memberships" (
	"studio_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"role" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "memberships_studio_id_user_id_pk" PRIMARY KEY("studio_id","user_id")
);
--> statement-breakpoint
CREATE TABLE "studios" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text NOT NULL,
	"units" text DEFAULT 'cm' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "measurement_sets" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"wearer_id" uuid NOT NULL,
	"taken_on" date NOT NULL,
	"taken_by" text NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"measurements" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "wearers" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"studio_id" uuid NOT NULL,
	"user_id" uuid,
	"name" text NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "audit_entries" ADD CONSTRAINT "audit_entries_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "change_observations" ADD CONSTRAINT "change_observations_change_id_changes_id_fk" FOREIGN KEY ("change_id") REFERENCES "public"."changes"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "change_observations" ADD CONSTRAINT "change_observations_observation_id_observations_id_fk" FOREIGN KEY ("observation_id") REFERENCES "public"."observations"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "changes" ADD CONSTRAINT "changes_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "changes" ADD CONSTRAINT "changes_sample_id_samples_id_fk" FOREIGN KEY ("sample_id") REFERENCES "public"."samples"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "changes" ADD CONSTRAINT "changes_decided_by_users_id_fk" FOREIGN KEY ("decided_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "final_cuts" ADD CONSTRAINT "final_cuts_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "final_cuts" ADD CONSTRAINT "final_cuts_agreed_by_users_id_fk" FOREIGN KEY ("agreed_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "observations" ADD CONSTRAINT "observations_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "observations" ADD CONSTRAINT "observations_sample_id_samples_id_fk" FOREIGN KEY ("sample_id") REFERENCES "public"."samples"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "observations" ADD CONSTRAINT "observations_photograph_id_photographs_id_fk" FOREIGN KEY ("photograph_id") REFERENCES "public"."photographs"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "observations" ADD CONSTRAINT "observations_noted_by_users_id_fk" FOREIGN KEY ("noted_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_observation_id_observations_id_fk" FOREIGN KEY ("observation_id") REFERENCES "public"."observations"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_sample_id_samples_id_fk" FOREIGN KEY ("sample_id") REFERENCES "public"."samples"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_read_by_users_id_fk" FOREIGN KEY ("read_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "password_resets" ADD CONSTRAINT "password_resets_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "patterns" ADD CONSTRAINT "patterns_studio_id_studios_id_fk" FOREIGN KEY ("studio_id") REFERENCES "public"."studios"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photographs" ADD CONSTRAINT "photographs_sample_id_samples_id_fk" FOREIGN KEY ("sample_id") REFERENCES "public"."samples"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photographs" ADD CONSTRAINT "photographs_taken_by_users_id_fk" FOREIGN KEY ("taken_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pieces" ADD CONSTRAINT "pieces_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "transfers" ADD CONSTRAINT "transfers_change_id_changes_id_fk" FOREIGN KEY ("change_id") REFERENCES "public"."changes"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "transfers" ADD CONSTRAINT "transfers_piece_id_pieces_id_fk" FOREIGN KEY ("piece_id") REFERENCES "public"."pieces"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "transfers" ADD CONSTRAINT "transfers_ticked_by_users_id_fk" FOREIGN KEY ("ticked_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "projects" ADD CONSTRAINT "projects_studio_id_studios_id_fk" FOREIGN KEY ("studio_id") REFERENCES "public"."studios"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "projects" ADD CONSTRAINT "projects_wearer_id_wearers_id_fk" FOREIGN KEY ("wearer_id") REFERENCES "public"."wearers"("id") ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "projects" ADD CONSTRAINT "projects_pattern_id_patterns_id_fk" FOREIGN KEY ("pattern_id") REFERENCES "public"."patterns"("id") ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "projects" ADD CONSTRAINT "projects_maker_id_users_id_fk" FOREIGN KEY ("maker_id") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "size_plans" ADD CONSTRAINT "size_plans_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "size_plans" ADD CONSTRAINT "size_plans_set_id_measurement_sets_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."measurement_sets"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "request_keys" ADD CONSTRAINT "request_keys_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "samples" ADD CONSTRAINT "samples_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_studio_id_studios_id_fk" FOREIGN KEY ("studio_id") REFERENCES "public"."studios"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measurement_sets" ADD CONSTRAINT "measurement_sets_wearer_id_wearers_id_fk" FOREIGN KEY ("wearer_id") REFERENCES "public"."wearers"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wearers" ADD CONSTRAINT "wearers_studio_id_studios_id_fk" FOREIGN KEY ("studio_id") REFERENCES "public"."studios"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wearers" ADD CONSTRAINT "wearers_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_entries_at_idx" ON "audit_entries" USING btree ("at");--> statement-breakpoint
CREATE INDEX "change_observations_observation_idx" ON "change_observations" USING btree ("observation_id");--> statement-breakpoint
CREATE INDEX "changes_project_idx" ON "changes" USING btree ("project_id","decided_at");--> statement-breakpoint
CREATE INDEX "changes_sample_idx" ON "changes" USING btree ("sample_id");--> statement-breakpoint
CREATE INDEX "comments_project_idx" ON "comments" USING btree ("project_id","created_at" DESC NULLS LAST);--> statement-breakpoint
CREATE UNIQUE INDEX "observations_number_key" ON "observations" USING btree ("project_id","number");--> statement-breakpoint
CREATE INDEX "observations_sample_idx" ON "observations" USING btree ("sample_id");--> statement-breakpoint
CREATE INDEX "readings_sample_idx" ON "readings" USING btree ("sample_id");--> statement-breakpoint
CREATE INDEX "password_resets_user_idx" ON "password_resets" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "patterns_studio_idx" ON "patterns" USING btree ("studio_id","name");--> statement-breakpoint
CREATE INDEX "photographs_sample_idx" ON "photographs" USING btree ("sample_id");--> statement-breakpoint
CREATE INDEX "photographs_hash_idx" ON "photographs" USING btree ("content_hash");--> statement-breakpoint
CREATE INDEX "pieces_project_idx" ON "pieces" USING btree ("project_id","number");--> statement-breakpoint
CREATE INDEX "transfers_piece_idx" ON "transfers" USING btree ("piece_id");--> statement-breakpoint
CREATE INDEX "projects_shelf_idx" ON "projects" USING btree ("studio_id","updated_at" DESC NULLS LAST,"id");--> statement-breakpoint
CREATE INDEX "projects_stage_idx" ON "projects" USING btree ("studio_id","stage","sample_state","updated_at" DESC NULLS LAST,"id");--> statement-breakpoint
CREATE INDEX "projects_wearer_idx" ON "projects" USING btree ("wearer_id");--> statement-breakpoint
CREATE INDEX "projects_pattern_idx" ON "projects" USING btree ("pattern_id");--> statement-breakpoint
CREATE INDEX "request_keys_created_idx" ON "request_keys" USING btree ("created_at");--> statement-breakpoint
CREATE UNIQUE INDEX "samples_number_key" ON "samples" USING btree ("project_id","number");--> statement-breakpoint
CREATE INDEX "sessions_expire_idx" ON "sessions" USING btree ("expire");--> statement-breakpoint
CREATE INDEX "memberships_user_idx" ON "memberships" USING btree ("user_id");--> statement-breakpoint
CREATE UNIQUE INDEX "users_email_key" ON "users" USING btree ("email");--> statement-breakpoint
CREATE INDEX "measurement_sets_wearer_idx" ON "measurement_sets" USING btree ("wearer_id","taken_on");--> statement-breakpoint
CREATE INDEX "wearers_studio_idx" ON "wearers" USING btree ("studio_id","name");--> statement-breakpoint
CREATE INDEX "wearers_user_idx" ON "wearers" USING btree ("user_id");