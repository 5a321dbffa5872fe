CREATE TABLE "anchors" (
	"id" uuid PRIMARY KEY NOT NULL,
	"site_id" uuid NOT NULL,
	"label" text NOT NULL,
	"code" text NOT NULL,
	"uses" text[] NOT NULL,
	"point" geometry(Point,4326) NOT NULL,
	"point_error_m" double precision,
	"elevation_m" double precision,
	"design_azimuth_deg" double precision,
	"design_elevation_deg" double precision,
	"face_azimuth_deg" double precision,
	"face_dip_deg" double precision,
	"rigging" jsonb,
	"masterpoint_x_mm" double precision,
	"masterpoint_y_mm" double precision,
	"masterpoint_z_mm" double precision,
	"washing" text,
	"sea_distance_m" double precision,
	"sea_distance_source" text,
	"sea_distance_error_m" double precision,
	"sea_distance_note" text,
	"row_name" text,
	"row_length_m" double precision,
	"note" text,
	"condition" text DEFAULT 'in_service' NOT NULL,
	"derived_condition" text DEFAULT 'in_service' NOT NULL,
	"decided_condition" text,
	"decided_reason" text,
	"decided_by" uuid,
	"decided_at" timestamp (3) with time zone,
	"out_of_use_since" timestamp (3) with time zone,
	"struck_at" timestamp (3) with time zone,
	"struck_by" uuid,
	"struck_reason" text,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "anchors_code_unique" UNIQUE("code")
);
--> statement-breakpoint
CREATE TABLE "edges" (
	"id" uuid PRIMARY KEY NOT NULL,
	"anchor_id" uuid NOT NULL,
	"label" text NOT NULL,
	"sharpness" text NOT NULL,
	"padding_needed" boolean DEFAULT true NOT NULL,
	"secured" text,
	"x1_mm" double precision,
	"y1_mm" double precision,
	"x2_mm" double precision,
	"y2_mm" double precision,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "fittings" (
	"id" uuid PRIMARY KEY NOT NULL,
	"anchor_id" uuid NOT NULL,
	"placement_id" uuid,
	"kind" text NOT NULL,
	"metal" text,
	"diameter_mm" double precision,
	"diameter_left_mm" double precision,
	"replaceable" boolean DEFAULT true NOT NULL,
	"installed_on" date,
	"removed_at" timestamp (3) with time zone,
	"note" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "placements" (
	"id" uuid PRIMARY KEY NOT NULL,
	"anchor_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"kind" text DEFAULT 'bolt' NOT NULL,
	"role" text DEFAULT 'main' NOT NULL,
	"x_mm" double precision,
	"y_mm" double precision,
	"z_mm" double precision,
	"face_azimuth_deg" double precision,
	"face_dip_deg" double precision,
	"overhang" boolean,
	"hole_diameter_mm" double precision,
	"hole_depth_mm" double precision,
	"axis_azimuth_deg" double precision,
	"axis_elevation_deg" double precision,
	"edge_distance_mm" double precision,
	"edge_side" text,
	"dead_holes" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"rock_body_id" uuid,
	"size_mm" double precision,
	"note" text,
	"struck_at" timestamp (3) with time zone,
	"struck_by" uuid,
	"struck_reason" text,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "placements_anchorId_number_unique" UNIQUE("anchor_id","number")
);
--> statement-breakpoint
CREATE TABLE "rock_bodies" (
	"id" uuid PRIMARY KEY NOT NULL,
	"anchor_id" uuid NOT NULL,
	"label" text NOT NULL,
	"attachment" text DEFAULT 'unknown' NOT NULL,
	"length_m" double precision,
	"width_m" double precision,
	"height_m" double precision,
	"note" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "area_policies" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid NOT NULL,
	"version_no" integer NOT NULL,
	"policy" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	CONSTRAINT "area_policies_areaId_versionNo_unique" UNIQUE("area_id","version_no")
);
--> statement-breakpoint
CREATE TABLE "areas" (
	"id" uuid PRIMARY KEY NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"summary" text DEFAULT '' NOT NULL,
	"visibility" text DEFAULT 'public' NOT NULL,
	"boundary" geometry(Geometry,4326),
	"coast" text DEFAULT 'other' NOT NULL,
	"so2" text,
	"time_zone" text DEFAULT 'UTC' NOT NULL,
	"contact_email" text,
	"emergency" jsonb,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "areas_slug_unique" UNIQUE("slug")
);
--> statement-breakpoint
CREATE TABLE "closures" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid NOT NULL,
	"site_id" uuid,
	"anchor_id" uuid,
	"reason" text NOT NULL,
	"starts_on" date NOT NULL,
	"ends_on" date,
	"yearly" boolean DEFAULT false NOT NULL,
	"source" text,
	"lifted_at" timestamp (3) with time zone,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "coastline" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "coastline_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"source" text NOT NULL,
	"error_m" double precision NOT NULL,
	"covers_m" double precision NOT NULL,
	"geom" geometry(Geometry,4326) NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sites" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"visibility" text DEFAULT 'public' NOT NULL,
	"point" geometry(Point,4326) NOT NULL,
	"summary" text DEFAULT '' NOT NULL,
	"rock_type" text,
	"ucs_mpa" double precision,
	"ucs_basis" text,
	"washing" text,
	"so2" text,
	"salted_road_distance_m" double precision,
	"warm_dry" boolean DEFAULT false NOT NULL,
	"approach" text,
	"land_permission" text,
	"no_bolt_zones" text,
	"struck_at" timestamp (3) with time zone,
	"struck_by" uuid,
	"struck_reason" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "sites_areaId_slug_unique" UNIQUE("area_id","slug")
);
--> statement-breakpoint
CREATE TABLE "bolts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"placement_id" uuid NOT NULL,
	"bolt_type_id" uuid,
	"form" text NOT NULL,
	"bolt_metal" text,
	"hanger_metal" text,
	"link_metal" text,
	"lever_mm" double precision,
	"batch" text,
	"installed_on" date,
	"installed_on_precision" text DEFAULT 'day' NOT NULL,
	"installed_by" text,
	"installed_by_user_id" uuid,
	"method" text,
	"adhesive_id" uuid,
	"adhesive_batch" text,
	"adhesive_expires_on" date,
	"glue_temp_c" double precision,
	"rock_temp_c" double precision,
	"hole_cleaning" text,
	"torque_nm" double precision,
	"recheck_due_on" date,
	"embedment_mm" double precision,
	"usable_from" timestamp (3) with time zone,
	"witness_mark" boolean,
	"magnetic" boolean,
	"rust_grade" integer,
	"claimed_standard" text,
	"note" text,
	"removed_on" date,
	"removed_by" text,
	"removed_why" text,
	"replaces_bolt_id" uuid,
	"condition" text DEFAULT 'in_service' NOT NULL,
	"derived_condition" text DEFAULT 'in_service' NOT NULL,
	"decided_condition" text,
	"decided_reason" text,
	"decided_by" uuid,
	"decided_at" timestamp (3) with time zone,
	"out_of_use_since" timestamp (3) with time zone,
	"struck_at" timestamp (3) with time zone,
	"struck_by" uuid,
	"struck_reason" text,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "pull_tests" (
	"id" uuid PRIMARY KEY NOT NULL,
	"bolt_id" uuid NOT NULL,
	"direction" text NOT NULL,
	"load_kn" double precision NOT NULL,
	"hold_s" double precision,
	"movement_mm" double precision,
	"mode" text NOT NULL,
	"tested_on" date NOT NULL,
	"tested_by" text,
	"note" text,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "adhesives" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"bond_mpa" double precision,
	"cure_steps" jsonb NOT NULL,
	"cartridge_ml" double precision,
	"source_note" text DEFAULT '' NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "adhesives_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "bolt_types" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"form" text NOT NULL,
	"bolt_metal" text,
	"hanger_metal" text,
	"link_metal" text,
	"rod_count" integer,
	"rod_diameter_mm" double precision,
	"lever_mm" double precision,
	"shank_diameter_mm" double precision,
	"length_mm" double precision,
	"hole_diameter_mm" double precision,
	"eye_radius_mm" double precision,
	"coating_thickness_um" double precision,
	"rated_radial_kn" double precision,
	"rated_axial_kn" double precision,
	"bend_onset_low_kn" double precision,
	"bend_onset_high_kn" double precision,
	"bend_onset_axial_kn" double precision,
	"bend_onset_basis" text DEFAULT 'unknown' NOT NULL,
	"standard" text,
	"allowed_methods" text[] DEFAULT '{}' NOT NULL,
	"status" text DEFAULT 'current' NOT NULL,
	"source_note" text DEFAULT '' NOT NULL,
	"has_ring" boolean DEFAULT false NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "bolt_types_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "webbings" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"mass_g_per_m" double precision NOT NULL,
	"width_mm" double precision NOT NULL,
	"stretch" jsonb NOT NULL,
	"strength_kn" double precision,
	"source_note" text DEFAULT '' NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "webbings_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "api_tokens" (
	"id" uuid PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"name" text NOT NULL,
	"token_hash" text NOT NULL,
	"hint" text NOT NULL,
	"scopes" text[] NOT NULL,
	"expires_at" timestamp (3) with time zone,
	"last_used_at" timestamp (3) with time zone,
	"revoked_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "api_tokens_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "invitations" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid NOT NULL,
	"email" text NOT NULL,
	"role" text NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"accepted_at" timestamp (3) with time zone,
	"accepted_by" uuid,
	"revoked_at" timestamp (3) with time zone,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "memberships" (
	"user_id" uuid NOT NULL,
	"area_id" uuid NOT NULL,
	"role" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "memberships_user_id_area_id_pk" PRIMARY KEY("user_id","area_id")
);
--> statement-breakpoint
CREATE TABLE "one_time_tokens" (
	"id" uuid PRIMARY KEY NOT NULL,
	"purpose" text NOT NULL,
	"token_hash" text NOT NULL,
	"email" text,
	"user_id" uuid,
	"invitation_id" uuid,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"used_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "one_time_tokens_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer NOT NULL,
	"expire" timestamp (3) with time zone
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text,
	"email_verified_at" timestamp (3) with time zone,
	"is_admin" boolean DEFAULT false NOT NULL,
	"session_epoch" integer DEFAULT 1 NOT NULL,
	"second_factor_secret" text,
	"is_demo" boolean DEFAULT false NOT NULL,
	"disabled_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "users_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "events" (
	"id" uuid PRIMARY KEY NOT NULL,
	"at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"actor_user_id" uuid,
	"actor_name" text NOT NULL,
	"area_id" uuid,
	"anchor_id" uuid,
	"subject_type" text NOT NULL,
	"subject_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"summary" text NOT NULL,
	"before" jsonb,
	"after" jsonb,
	"reason" text
);
--> statement-breakpoint
CREATE TABLE "outbox" (
	"id" uuid PRIMARY KEY NOT NULL,
	"to_email" text NOT NULL,
	"subject" text NOT NULL,
	"body" text NOT NULL,
	"kind" text NOT NULL,
	"area_id" uuid,
	"dedupe_key" text NOT NULL,
	"state" text DEFAULT 'queued' NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"next_attempt_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"last_error" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"sent_at" timestamp (3) with time zone
);
--> statement-breakpoint
CREATE TABLE "sink_mails" (
	"id" uuid PRIMARY KEY NOT NULL,
	"received_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"from_address" text NOT NULL,
	"to_address" text NOT NULL,
	"subject" text NOT NULL,
	"body" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "watches" (
	"id" uuid PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"anchor_id" uuid,
	"site_id" uuid,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "rebolt_job_assignees" (
	"job_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "rebolt_job_assignees_job_id_user_id_pk" PRIMARY KEY("job_id","user_id")
);
--> statement-breakpoint
CREATE TABLE "rebolt_job_placements" (
	"job_id" uuid NOT NULL,
	"placement_id" uuid NOT NULL,
	"bolt_id" uuid,
	CONSTRAINT "rebolt_job_placements_job_id_placement_id_pk" PRIMARY KEY("job_id","placement_id")
);
--> statement-breakpoint
CREATE TABLE "rebolt_jobs" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid NOT NULL,
	"anchor_id" uuid NOT NULL,
	"state" text DEFAULT 'proposed' NOT NULL,
	"title" text NOT NULL,
	"priority" double precision DEFAULT 0 NOT NULL,
	"priority_parts" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"moved_by" uuid,
	"moved_points" double precision,
	"moved_reason" text,
	"opened_by_report_id" uuid,
	"waiting_since" timestamp (3) with time zone NOT NULL,
	"due_on" date,
	"outcome" text,
	"hole_fate" text,
	"outcome_note" text,
	"outcome_photo_id" uuid,
	"new_bolt_id" uuid,
	"decided_reason" text,
	"decided_by" uuid,
	"decided_at" timestamp (3) with time zone,
	"done_at" timestamp (3) with time zone,
	"done_by" uuid,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "photos" (
	"id" uuid PRIMARY KEY NOT NULL,
	"report_id" uuid,
	"bolt_id" uuid,
	"job_id" uuid,
	"anchor_id" uuid,
	"sha256" text NOT NULL,
	"original_key" text NOT NULL,
	"large_key" text NOT NULL,
	"thumb_key" text NOT NULL,
	"width_px" integer NOT NULL,
	"height_px" integer NOT NULL,
	"scale_mm_per_px" double precision,
	"marks" jsonb,
	"caption" text DEFAULT '' NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "reports" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid,
	"site_id" uuid,
	"anchor_id" uuid,
	"placement_id" uuid,
	"bolt_id" uuid,
	"fitting_id" uuid,
	"span_id" uuid,
	"point" geometry(Point,4326),
	"kind" text NOT NULL,
	"depth" text DEFAULT 'seen' NOT NULL,
	"observed_at" timestamp (3) with time zone NOT NULL,
	"received_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"measured" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"grade" integer,
	"found_sound" boolean DEFAULT false NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"confirmed" boolean DEFAULT true NOT NULL,
	"took_out_of_use" boolean DEFAULT false NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"handled_at" timestamp (3) with time zone,
	"handled_by" uuid,
	"handled_how" text,
	"reporter_name" text,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "kits" (
	"id" uuid PRIMARY KEY NOT NULL,
	"owner_user_id" uuid,
	"area_id" uuid,
	"name" text NOT NULL,
	"segments" jsonb NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "line_log" (
	"id" uuid PRIMARY KEY NOT NULL,
	"span_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	"tension_kn" double precision,
	"wind_mps" double precision,
	"people" integer,
	"note" text,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "load_checks" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid NOT NULL,
	"span_id" uuid,
	"anchor_id" uuid,
	"inputs" jsonb NOT NULL,
	"outputs" jsonb NOT NULL,
	"engine_version" text NOT NULL,
	"policy_version" integer NOT NULL,
	"for_date" date NOT NULL,
	"checklist" jsonb,
	"share_hash" text,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "load_checks_shareHash_unique" UNIQUE("share_hash")
);
--> statement-breakpoint
CREATE TABLE "span_rigs" (
	"id" uuid PRIMARY KEY NOT NULL,
	"span_id" uuid NOT NULL,
	"version_no" integer NOT NULL,
	"rig" jsonb NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	CONSTRAINT "span_rigs_spanId_versionNo_unique" UNIQUE("span_id","version_no")
);
--> statement-breakpoint
CREATE TABLE "spans" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid NOT NULL,
	"anchor_a_id" uuid NOT NULL,
	"anchor_b_id" uuid NOT NULL,
	"name" text NOT NULL,
	"length_m" double precision NOT NULL,
	"note" text,
	"struck_at" timestamp (3) with time zone,
	"struck_by" uuid,
	"struck_reason" text,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "anchor_eval" (
	"anchor_id" uuid PRIMARY KEY NOT NULL,
	"verdict" text NOT NULL,
	"utilisation" double precision,
	"finding_count" integer NOT NULL,
	"codes" text[] NOT NULL,
	"help_most" text,
	"place_class" jsonb,
	"engine_version" text NOT NULL,
	"policy_version" integer NOT NULL,
	"evaluated_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "batch_warnings" (
	"id" uuid PRIMARY KEY NOT NULL,
	"area_id" uuid,
	"title" text NOT NULL,
	"body" text NOT NULL,
	"says" text NOT NULL,
	"bolt_type_id" uuid,
	"adhesive_id" uuid,
	"metal" text,
	"batch_pattern" text,
	"installed_from" date,
	"installed_to" date,
	"source" text,
	"published_at" timestamp (3) with time zone,
	"closed_at" timestamp (3) with time zone,
	"digest" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"created_by" uuid,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "bolt_eval" (
	"bolt_id" uuid PRIMARY KEY NOT NULL,
	"anchor_id" uuid NOT NULL,
	"verdict" text NOT NULL,
	"utilisation" double precision,
	"engine_version" text NOT NULL,
	"policy_version" integer NOT NULL,
	"evaluated_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "findings" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "findings_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"anchor_id" uuid NOT NULL,
	"bolt_id" uuid,
	"placement_number" integer,
	"fitting_id" uuid,
	"uses" text[] NOT NULL,
	"code" text NOT NULL,
	"level" text NOT NULL,
	"title" text NOT NULL,
	"text" text NOT NULL,
	"clears_when" text,
	"numbers" jsonb NOT NULL,
	"assumed" jsonb NOT NULL,
	"source_mark" text NOT NULL,
	"source_name" text NOT NULL
);
--> statement-breakpoint
ALTER TABLE "anchors" ADD CONSTRAINT "anchors_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edges" ADD CONSTRAINT "edges_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fittings" ADD CONSTRAINT "fittings_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fittings" ADD CONSTRAINT "fittings_placement_id_placements_id_fk" FOREIGN KEY ("placement_id") REFERENCES "public"."placements"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "placements" ADD CONSTRAINT "placements_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "placements" ADD CONSTRAINT "placements_rock_body_id_rock_bodies_id_fk" FOREIGN KEY ("rock_body_id") REFERENCES "public"."rock_bodies"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rock_bodies" ADD CONSTRAINT "rock_bodies_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "area_policies" ADD CONSTRAINT "area_policies_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "closures" ADD CONSTRAINT "closures_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "closures" ADD CONSTRAINT "closures_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sites" ADD CONSTRAINT "sites_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bolts" ADD CONSTRAINT "bolts_placement_id_placements_id_fk" FOREIGN KEY ("placement_id") REFERENCES "public"."placements"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bolts" ADD CONSTRAINT "bolts_bolt_type_id_bolt_types_id_fk" FOREIGN KEY ("bolt_type_id") REFERENCES "public"."bolt_types"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bolts" ADD CONSTRAINT "bolts_adhesive_id_adhesives_id_fk" FOREIGN KEY ("adhesive_id") REFERENCES "public"."adhesives"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pull_tests" ADD CONSTRAINT "pull_tests_bolt_id_bolts_id_fk" FOREIGN KEY ("bolt_id") REFERENCES "public"."bolts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "api_tokens" ADD CONSTRAINT "api_tokens_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "one_time_tokens" ADD CONSTRAINT "one_time_tokens_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watches" ADD CONSTRAINT "watches_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watches" ADD CONSTRAINT "watches_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "watches" ADD CONSTRAINT "watches_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_job_assignees" ADD CONSTRAINT "rebolt_job_assignees_job_id_rebolt_jobs_id_fk" FOREIGN KEY ("job_id") REFERENCES "public"."rebolt_jobs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_job_assignees" ADD CONSTRAINT "rebolt_job_assignees_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_job_placements" ADD CONSTRAINT "rebolt_job_placements_job_id_rebolt_jobs_id_fk" FOREIGN KEY ("job_id") REFERENCES "public"."rebolt_jobs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_job_placements" ADD CONSTRAINT "rebolt_job_placements_placement_id_placements_id_fk" FOREIGN KEY ("placement_id") REFERENCES "public"."placements"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_job_placements" ADD CONSTRAINT "rebolt_job_placements_bolt_id_bolts_id_fk" FOREIGN KEY ("bolt_id") REFERENCES "public"."bolts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_jobs" ADD CONSTRAINT "rebolt_jobs_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_jobs" ADD CONSTRAINT "rebolt_jobs_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_jobs" ADD CONSTRAINT "rebolt_jobs_opened_by_report_id_reports_id_fk" FOREIGN KEY ("opened_by_report_id") REFERENCES "public"."reports"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rebolt_jobs" ADD CONSTRAINT "rebolt_jobs_new_bolt_id_bolts_id_fk" FOREIGN KEY ("new_bolt_id") REFERENCES "public"."bolts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_report_id_reports_id_fk" FOREIGN KEY ("report_id") REFERENCES "public"."reports"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_bolt_id_bolts_id_fk" FOREIGN KEY ("bolt_id") REFERENCES "public"."bolts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_placement_id_placements_id_fk" FOREIGN KEY ("placement_id") REFERENCES "public"."placements"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_bolt_id_bolts_id_fk" FOREIGN KEY ("bolt_id") REFERENCES "public"."bolts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_fitting_id_fittings_id_fk" FOREIGN KEY ("fitting_id") REFERENCES "public"."fittings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_span_id_spans_id_fk" FOREIGN KEY ("span_id") REFERENCES "public"."spans"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kits" ADD CONSTRAINT "kits_owner_user_id_users_id_fk" FOREIGN KEY ("owner_user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kits" ADD CONSTRAINT "kits_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "line_log" ADD CONSTRAINT "line_log_span_id_spans_id_fk" FOREIGN KEY ("span_id") REFERENCES "public"."spans"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "load_checks" ADD CONSTRAINT "load_checks_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "load_checks" ADD CONSTRAINT "load_checks_span_id_spans_id_fk" FOREIGN KEY ("span_id") REFERENCES "public"."spans"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "load_checks" ADD CONSTRAINT "load_checks_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "span_rigs" ADD CONSTRAINT "span_rigs_span_id_spans_id_fk" FOREIGN KEY ("span_id") REFERENCES "public"."spans"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "spans" ADD CONSTRAINT "spans_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "spans" ADD CONSTRAINT "spans_anchor_a_id_anchors_id_fk" FOREIGN KEY ("anchor_a_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "spans" ADD CONSTRAINT "spans_anchor_b_id_anchors_id_fk" FOREIGN KEY ("anchor_b_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "anchor_eval" ADD CONSTRAINT "anchor_eval_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_warnings" ADD CONSTRAINT "batch_warnings_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_warnings" ADD CONSTRAINT "batch_warnings_bolt_type_id_bolt_types_id_fk" FOREIGN KEY ("bolt_type_id") REFERENCES "public"."bolt_types"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_warnings" ADD CONSTRAINT "batch_warnings_adhesive_id_adhesives_id_fk" FOREIGN KEY ("adhesive_id") REFERENCES "public"."adhesives"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bolt_eval" ADD CONSTRAINT "bolt_eval_bolt_id_bolts_id_fk" FOREIGN KEY ("bolt_id") REFERENCES "public"."bolts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bolt_eval" ADD CONSTRAINT "bolt_eval_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings" ADD CONSTRAINT "findings_anchor_id_anchors_id_fk" FOREIGN KEY ("anchor_id") REFERENCES "public"."anchors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings" ADD CONSTRAINT "findings_bolt_id_bolts_id_fk" FOREIGN KEY ("bolt_id") REFERENCES "public"."bolts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "anchors_point_index" ON "anchors" USING gist ("point");--> statement-breakpoint
CREATE INDEX "anchors_site_id_index" ON "anchors" USING btree ("site_id");--> statement-breakpoint
CREATE INDEX "anchors_condition_index" ON "anchors" USING btree ("condition");--> statement-breakpoint
CREATE INDEX "edges_anchor_id_index" ON "edges" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "fittings_anchor_id_index" ON "fittings" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "rock_bodies_anchor_id_index" ON "rock_bodies" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "closures_area_id_index" ON "closures" USING btree ("area_id");--> statement-breakpoint
CREATE INDEX "coastline_geom_index" ON "coastline" USING gist ("geom");--> statement-breakpoint
CREATE INDEX "sites_point_index" ON "sites" USING gist ("point");--> statement-breakpoint
CREATE INDEX "bolts_placement_id_index" ON "bolts" USING btree ("placement_id");--> statement-breakpoint
CREATE INDEX "bolts_bolt_type_id_index" ON "bolts" USING btree ("bolt_type_id");--> statement-breakpoint
CREATE INDEX "bolts_adhesive_id_index" ON "bolts" USING btree ("adhesive_id");--> statement-breakpoint
CREATE INDEX "pull_tests_bolt_id_index" ON "pull_tests" USING btree ("bolt_id");--> statement-breakpoint
CREATE INDEX "invitations_area_id_index" ON "invitations" USING btree ("area_id");--> statement-breakpoint
CREATE INDEX "memberships_area_id_index" ON "memberships" USING btree ("area_id");--> statement-breakpoint
CREATE INDEX "one_time_tokens_email_purpose_index" ON "one_time_tokens" USING btree ("email","purpose");--> statement-breakpoint
CREATE INDEX "events_anchor_id_at_index" ON "events" USING btree ("anchor_id","at");--> statement-breakpoint
CREATE INDEX "events_area_id_at_index" ON "events" USING btree ("area_id","at");--> statement-breakpoint
CREATE INDEX "events_subject_id_index" ON "events" USING btree ("subject_id");--> statement-breakpoint
CREATE UNIQUE INDEX "outbox_dedupe_key_index" ON "outbox" USING btree ("dedupe_key");--> statement-breakpoint
CREATE INDEX "outbox_state_next_attempt_at_index" ON "outbox" USING btree ("state","next_attempt_at");--> statement-breakpoint
CREATE UNIQUE INDEX "watches_user_id_anchor_id_index" ON "watches" USING btree ("user_id","anchor_id");--> statement-breakpoint
CREATE UNIQUE INDEX "watches_user_id_site_id_index" ON "watches" USING btree ("user_id","site_id");--> statement-breakpoint
CREATE INDEX "watches_anchor_id_index" ON "watches" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "rebolt_jobs_area_id_state_index" ON "rebolt_jobs" USING btree ("area_id","state");--> statement-breakpoint
CREATE INDEX "rebolt_jobs_anchor_id_index" ON "rebolt_jobs" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "photos_report_id_index" ON "photos" USING btree ("report_id");--> statement-breakpoint
CREATE INDEX "photos_anchor_id_index" ON "photos" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "photos_bolt_id_index" ON "photos" USING btree ("bolt_id");--> statement-breakpoint
CREATE INDEX "reports_anchor_id_index" ON "reports" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "reports_bolt_id_index" ON "reports" USING btree ("bolt_id");--> statement-breakpoint
CREATE INDEX "reports_state_index" ON "reports" USING btree ("state");--> statement-breakpoint
CREATE INDEX "reports_point_index" ON "reports" USING gist ("point");--> statement-breakpoint
CREATE INDEX "line_log_span_id_index" ON "line_log" USING btree ("span_id");--> statement-breakpoint
CREATE INDEX "load_checks_span_id_index" ON "load_checks" USING btree ("span_id");--> statement-breakpoint
CREATE INDEX "spans_anchor_a_id_index" ON "spans" USING btree ("anchor_a_id");--> statement-breakpoint
CREATE INDEX "spans_anchor_b_id_index" ON "spans" USING btree ("anchor_b_id");--> statement-breakpoint
CREATE INDEX "spans_area_id_index" ON "spans" USING btree ("area_id");--> statement-breakpoint
CREATE INDEX "anchor_eval_verdict_index" ON "anchor_eval" USING btree ("verdict");--> statement-breakpoint
CREATE INDEX "anchor_eval_utilisation_anchor_id_index" ON "anchor_eval" USING btree ("utilisation" DESC NULLS LAST,"anchor_id");--> statement-breakpoint
CREATE INDEX "bolt_eval_anchor_id_index" ON "bolt_eval" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "findings_anchor_id_index" ON "findings" USING btree ("anchor_id");--> statement-breakpoint
CREATE INDEX "findings_bolt_id_index" ON "findings" USING btree ("bolt_id");--> statement-breakpoint
CREATE INDEX "findings_code_index" ON "findings" USING btree ("code");