CREATE TABLE "audit_event" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"device_id" uuid NOT NULL,
	"device_sequence" bigint NOT NULL,
	"kind" text NOT NULL,
	"version" integer NOT NULL,
	"thing_id" uuid NOT NULL,
	"body" jsonb NOT NULL,
	"occurred" jsonb NOT NULL,
	"confirmations" jsonb NOT NULL,
	"recorded_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "audit_event_pk" PRIMARY KEY("organisation_id","id")
);
--> statement-breakpoint
CREATE TABLE "audit_seal" (
	"organisation_id" uuid NOT NULL,
	"place" integer NOT NULL,
	"event_id" uuid NOT NULL,
	"chain_hash" text NOT NULL,
	"sealed_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "audit_seal_pk" PRIMARY KEY("organisation_id","place"),
	CONSTRAINT "audit_seal_event_unique" UNIQUE("organisation_id","event_id")
);
--> statement-breakpoint
CREATE TABLE "block" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"trial_id" uuid NOT NULL,
	"number" integer NOT NULL,
	CONSTRAINT "block_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "block_number_unique" UNIQUE("organisation_id","trial_id","number"),
	CONSTRAINT "block_number_positive" CHECK ("block"."number" > 0)
);
--> statement-breakpoint
CREATE TABLE "count" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"row_sample_id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"counted_as" text NOT NULL,
	"plants" integer NOT NULL,
	"doubtful" integer DEFAULT 0 NOT NULL,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "count_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "count_counted_as_known" CHECK ("count"."counted_as" in ('so-far', 'new')),
	CONSTRAINT "count_plants_range" CHECK ("count"."plants" between 0 and 2000),
	CONSTRAINT "count_doubtful_range" CHECK ("count"."doubtful" >= 0 and ("count"."counted_as" = 'new' or "count"."doubtful" <= "count"."plants")),
	CONSTRAINT "count_origin_kind_known" CHECK ("count"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "count_import_named" CHECK (("count"."origin_kind" = 'import') = ("count"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "decision" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"zone_id" uuid,
	"recommended" text NOT NULL,
	"decided" text NOT NULL,
	"signed_name" text NOT NULL,
	"signed_at" timestamp with time zone NOT NULL,
	"frozen" jsonb NOT NULL,
	"basis_hash" text NOT NULL,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "decision_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "decision_decided_known" CHECK ("decision"."decided" in ('keep', 'replant')),
	CONSTRAINT "decision_recommended_known" CHECK ("decision"."recommended" in ('keep', 'replant', 'too-close')),
	CONSTRAINT "decision_origin_kind_known" CHECK ("decision"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "decision_import_named" CHECK (("decision"."origin_kind" = 'import') = ("decision"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "farm_person" (
	"organisation_id" uuid NOT NULL,
	"farm_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"removed_at" timestamp with time zone,
	CONSTRAINT "farm_person_pk" PRIMARY KEY("organisation_id","farm_id","person_id")
);
--> statement-breakpoint
CREATE TABLE "farm" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"time_zone" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "farm_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "farm_origin_kind_known" CHECK ("farm"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "farm_import_named" CHECK (("farm"."origin_kind" = 'import') = ("farm"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "field" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"farm_id" uuid NOT NULL,
	"name" text NOT NULL,
	"area_typed" text,
	"area_unit" text,
	"area_thousandths" bigint,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "field_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "field_area_reading" CHECK (num_nonnulls("field"."area_typed", "field"."area_unit", "field"."area_thousandths") in (0, 3) and ("field"."area_unit" is null or "field"."area_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "field"."area_thousandths" >= 0),
	CONSTRAINT "field_origin_kind_known" CHECK ("field"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "field_import_named" CHECK (("field"."origin_kind" = 'import') = ("field"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "import_file" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"file_name" text NOT NULL,
	"lines" integer NOT NULL,
	"records" integer NOT NULL,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "import_file_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "import_file_kind_known" CHECK ("import_file"."kind" in ('counts', 'tape-sheets'))
);
--> statement-breakpoint
CREATE TABLE "losing_edit" (
	"organisation_id" uuid NOT NULL,
	"operation_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"thing_id" uuid NOT NULL,
	"base_version" integer NOT NULL,
	"standing_version" integer NOT NULL,
	"body" jsonb NOT NULL,
	"received_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "losing_edit_pk" PRIMARY KEY("organisation_id","operation_id")
);
--> statement-breakpoint
CREATE TABLE "membership" (
	"organisation_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"role" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	CONSTRAINT "membership_pk" PRIMARY KEY("organisation_id","person_id"),
	CONSTRAINT "membership_role_known" CHECK ("membership"."role" in ('owner', 'agronomist', 'scout', 'grower'))
);
--> statement-breakpoint
CREATE TABLE "one_time_link" (
	"id" uuid PRIMARY KEY NOT NULL,
	"secret_hash" text NOT NULL,
	"purpose" text NOT NULL,
	"organisation_id" uuid,
	"person_id" uuid,
	"email" text,
	"name" text,
	"role" text,
	"farm_ids" uuid[] DEFAULT '{}' NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "one_time_link_secret_unique" UNIQUE("secret_hash"),
	CONSTRAINT "one_time_link_purpose_known" CHECK ("one_time_link"."purpose" in ('first-owner', 'invitation', 'password-reset')),
	CONSTRAINT "one_time_link_role_known" CHECK ("one_time_link"."role" in ('owner', 'agronomist', 'scout', 'grower')),
	CONSTRAINT "one_time_link_invitation_complete" CHECK ("one_time_link"."purpose" <> 'invitation' or ("one_time_link"."organisation_id" is not null and "one_time_link"."email" is not null and "one_time_link"."role" is not null))
);
--> statement-breakpoint
CREATE TABLE "organisation" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"time_zone" text NOT NULL,
	"demo_today" date,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "person" (
	"id" uuid PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text NOT NULL,
	"units" text DEFAULT 'us' NOT NULL,
	"disabled_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "person_email_lower" CHECK ("person"."email" = lower("person"."email")),
	CONSTRAINT "person_units_known" CHECK ("person"."units" in ('us', 'metric'))
);
--> statement-breakpoint
CREATE TABLE "planting_zone" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"name" text NOT NULL,
	"area_typed" text NOT NULL,
	"area_unit" text NOT NULL,
	"area_thousandths" bigint NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "planting_zone_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "planting_zone_area_reading" CHECK (num_nonnulls("planting_zone"."area_typed", "planting_zone"."area_unit", "planting_zone"."area_thousandths") in (0, 3) and ("planting_zone"."area_unit" is null or "planting_zone"."area_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "planting_zone"."area_thousandths" >= 0),
	CONSTRAINT "planting_zone_origin_kind_known" CHECK ("planting_zone"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "planting_zone_import_named" CHECK (("planting_zone"."origin_kind" = 'import') = ("planting_zone"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "planting" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"field_id" uuid NOT NULL,
	"planted_on" date NOT NULL,
	"planted_at" text,
	"crop" text NOT NULL,
	"row_spacing_typed" text NOT NULL,
	"row_spacing_unit" text NOT NULL,
	"row_spacing_thousandths" bigint NOT NULL,
	"seeding_rate_typed" text NOT NULL,
	"seeding_rate_unit" text NOT NULL,
	"seeding_rate_thousandths" bigint NOT NULL,
	"tag_germination_typed" text,
	"tag_germination_unit" text,
	"tag_germination_thousandths" bigint,
	"intended_stand_typed" text NOT NULL,
	"intended_stand_unit" text NOT NULL,
	"intended_stand_thousandths" bigint NOT NULL,
	"full_yield_typed" text,
	"full_yield_unit" text,
	"full_yield_thousandths" bigint,
	"previous_crop" text,
	"tillage" text,
	"slow_after_days" integer DEFAULT 2 NOT NULL,
	"late_after_days" integer DEFAULT 7 NOT NULL,
	"very_late_after_days" integer DEFAULT 14 NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "planting_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "planting_crop_known" CHECK ("planting"."crop" in ('corn', 'soybean', 'sorghum', 'sunflower', 'cotton', 'other')),
	CONSTRAINT "planting_tillage_known" CHECK ("planting"."tillage" in ('no-till', 'strip-till', 'reduced', 'conventional')),
	CONSTRAINT "planting_planted_at_time" CHECK ("planting"."planted_at" ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
	CONSTRAINT "planting_limits_rise" CHECK (0 < "planting"."slow_after_days" and "planting"."slow_after_days" < "planting"."late_after_days" and "planting"."late_after_days" < "planting"."very_late_after_days"),
	CONSTRAINT "planting_row_spacing_reading" CHECK (num_nonnulls("planting"."row_spacing_typed", "planting"."row_spacing_unit", "planting"."row_spacing_thousandths") in (0, 3) and ("planting"."row_spacing_unit" is null or "planting"."row_spacing_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "planting"."row_spacing_thousandths" >= 0),
	CONSTRAINT "planting_seeding_rate_reading" CHECK (num_nonnulls("planting"."seeding_rate_typed", "planting"."seeding_rate_unit", "planting"."seeding_rate_thousandths") in (0, 3) and ("planting"."seeding_rate_unit" is null or "planting"."seeding_rate_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "planting"."seeding_rate_thousandths" >= 0),
	CONSTRAINT "planting_tag_germination_reading" CHECK (num_nonnulls("planting"."tag_germination_typed", "planting"."tag_germination_unit", "planting"."tag_germination_thousandths") in (0, 3) and ("planting"."tag_germination_unit" is null or "planting"."tag_germination_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "planting"."tag_germination_thousandths" >= 0),
	CONSTRAINT "planting_intended_stand_reading" CHECK (num_nonnulls("planting"."intended_stand_typed", "planting"."intended_stand_unit", "planting"."intended_stand_thousandths") in (0, 3) and ("planting"."intended_stand_unit" is null or "planting"."intended_stand_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "planting"."intended_stand_thousandths" >= 0),
	CONSTRAINT "planting_full_yield_reading" CHECK (num_nonnulls("planting"."full_yield_typed", "planting"."full_yield_unit", "planting"."full_yield_thousandths") in (0, 3) and ("planting"."full_yield_unit" is null or "planting"."full_yield_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "planting"."full_yield_thousandths" >= 0),
	CONSTRAINT "planting_origin_kind_known" CHECK ("planting"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "planting_import_named" CHECK (("planting"."origin_kind" = 'import') = ("planting"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "receipt" (
	"organisation_id" uuid NOT NULL,
	"operation_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"device_id" uuid NOT NULL,
	"device_sequence" bigint NOT NULL,
	"kind" text NOT NULL,
	"thing_id" uuid NOT NULL,
	"content_hash" text NOT NULL,
	"answer" jsonb,
	"received_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "receipt_pk" PRIMARY KEY("organisation_id","operation_id")
);
--> statement-breakpoint
CREATE TABLE "replant_sheet" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"zone_id" uuid,
	"inputs" jsonb NOT NULL,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "replant_sheet_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "replant_sheet_origin_kind_known" CHECK ("replant_sheet"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "replant_sheet_import_named" CHECK (("replant_sheet"."origin_kind" = 'import') = ("replant_sheet"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "residue_reading" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"row_sample_id" uuid NOT NULL,
	"read_on" date NOT NULL,
	"marks_read" integer NOT NULL,
	"marks_covered" integer NOT NULL,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "residue_reading_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "residue_reading_marks_range" CHECK ("residue_reading"."marks_read" between 1 and 1000 and "residue_reading"."marks_covered" between 0 and "residue_reading"."marks_read"),
	CONSTRAINT "residue_reading_origin_kind_known" CHECK ("residue_reading"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "residue_reading_import_named" CHECK (("residue_reading"."origin_kind" = 'import') = ("residue_reading"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "row_sample" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"strip_id" uuid,
	"zone_id" uuid,
	"label" text NOT NULL,
	"planter_row" integer,
	"length_typed" text NOT NULL,
	"length_unit" text NOT NULL,
	"length_thousandths" bigint NOT NULL,
	"start_end" text NOT NULL,
	"far_end" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "row_sample_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "row_sample_start_end_known" CHECK ("row_sample"."start_end" in ('mark', 'plant')),
	CONSTRAINT "row_sample_far_end_known" CHECK ("row_sample"."far_end" in ('mark', 'plant')),
	CONSTRAINT "row_sample_planter_row_positive" CHECK ("row_sample"."planter_row" > 0),
	CONSTRAINT "row_sample_length_positive" CHECK ("row_sample"."length_thousandths" > 0),
	CONSTRAINT "row_sample_length_reading" CHECK (num_nonnulls("row_sample"."length_typed", "row_sample"."length_unit", "row_sample"."length_thousandths") in (0, 3) and ("row_sample"."length_unit" is null or "row_sample"."length_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "row_sample"."length_thousandths" >= 0),
	CONSTRAINT "row_sample_origin_kind_known" CHECK ("row_sample"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "row_sample_import_named" CHECK (("row_sample"."origin_kind" = 'import') = ("row_sample"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "session" (
	"secret_hash" text PRIMARY KEY NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"last_seen_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"revoked_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "setting" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"phrase" text NOT NULL,
	"cleaner" text NOT NULL,
	"wheels" text,
	"pressure_direction" text,
	"pressure_typed" text,
	"pressure_unit" text,
	"pressure_thousandths" bigint,
	"working_depth_typed" text,
	"working_depth_unit" text,
	"working_depth_thousandths" bigint,
	"adjusted_from" text,
	"note" text,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "setting_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "setting_cleaner_known" CHECK ("setting"."cleaner" in ('none', 'fixed', 'floating')),
	CONSTRAINT "setting_wheels_known" CHECK ("setting"."wheels" in ('smooth', 'toothed')),
	CONSTRAINT "setting_pressure_direction_known" CHECK ("setting"."pressure_direction" in ('own-weight', 'down', 'lift')),
	CONSTRAINT "setting_adjusted_from_known" CHECK ("setting"."adjusted_from" in ('cab', 'wrench')),
	CONSTRAINT "setting_pressure_reading" CHECK (num_nonnulls("setting"."pressure_typed", "setting"."pressure_unit", "setting"."pressure_thousandths") in (0, 3) and ("setting"."pressure_unit" is null or "setting"."pressure_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "setting"."pressure_thousandths" >= 0),
	CONSTRAINT "setting_working_depth_reading" CHECK (num_nonnulls("setting"."working_depth_typed", "setting"."working_depth_unit", "setting"."working_depth_thousandths") in (0, 3) and ("setting"."working_depth_unit" is null or "setting"."working_depth_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "setting"."working_depth_thousandths" >= 0),
	CONSTRAINT "setting_origin_kind_known" CHECK ("setting"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "setting_import_named" CHECK (("setting"."origin_kind" = 'import') = ("setting"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "strip_as_planted" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"strip_id" uuid NOT NULL,
	"setting_id" uuid,
	"reason" text,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "strip_as_planted_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "strip_as_planted_loss_has_reason" CHECK ("strip_as_planted"."setting_id" is not null or "strip_as_planted"."reason" is not null),
	CONSTRAINT "strip_as_planted_origin_kind_known" CHECK ("strip_as_planted"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "strip_as_planted_import_named" CHECK (("strip_as_planted"."origin_kind" = 'import') = ("strip_as_planted"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "strip" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"block_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"planned_setting_id" uuid NOT NULL,
	CONSTRAINT "strip_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "strip_number_unique" UNIQUE("organisation_id","block_id","number"),
	CONSTRAINT "strip_number_positive" CHECK ("strip"."number" > 0)
);
--> statement-breakpoint
CREATE TABLE "study" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "study_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "study_origin_kind_known" CHECK ("study"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "study_import_named" CHECK (("study"."origin_kind" = 'import') = ("study"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "tape_sheet" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"row_sample_id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"tape_unit" text NOT NULL,
	"places_typed" text[] NOT NULL,
	"places_thousandths" integer[] NOT NULL,
	"markers" text[] NOT NULL,
	"kinds" text[] NOT NULL,
	"leaf_stage_tenths" integer[] NOT NULL,
	"plants" integer NOT NULL,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "tape_sheet_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "tape_sheet_unit_known" CHECK ("tape_sheet"."tape_unit" in ('in', 'ft-in', 'ft-tenths', 'cm')),
	CONSTRAINT "tape_sheet_arrays_match" CHECK (cardinality("tape_sheet"."places_typed") = cardinality("tape_sheet"."places_thousandths") and cardinality("tape_sheet"."markers") = cardinality("tape_sheet"."places_thousandths") and cardinality("tape_sheet"."kinds") = cardinality("tape_sheet"."places_thousandths") and cardinality("tape_sheet"."leaf_stage_tenths") = cardinality("tape_sheet"."places_thousandths")),
	CONSTRAINT "tape_sheet_plants_range" CHECK ("tape_sheet"."plants" between 0 and cardinality("tape_sheet"."places_thousandths")),
	CONSTRAINT "tape_sheet_origin_kind_known" CHECK ("tape_sheet"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "tape_sheet_import_named" CHECK (("tape_sheet"."origin_kind" = 'import') = ("tape_sheet"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "throttle" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "trial" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"study_id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"layout" text NOT NULL,
	"main_figure" text NOT NULL,
	"comparison_rule" text NOT NULL,
	"reference_setting_id" uuid NOT NULL,
	"random_seed" integer NOT NULL,
	"locked_at" timestamp with time zone,
	"locked_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	"removed_at" timestamp with time zone,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "trial_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "trial_layout_known" CHECK ("trial"."layout" in ('complete-blocks', 'pairs')),
	CONSTRAINT "trial_main_figure_known" CHECK ("trial"."main_figure" in ('spread-days', 'half-up-days', 'plants-per-acre', 'late-share', 'spacing-sd', 'score')),
	CONSTRAINT "trial_comparison_rule_known" CHECK ("trial"."comparison_rule" in ('tukey', 'holm')),
	CONSTRAINT "trial_lock_complete" CHECK (("trial"."locked_at" is null) = ("trial"."locked_by" is null)),
	CONSTRAINT "trial_origin_kind_known" CHECK ("trial"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "trial_import_named" CHECK (("trial"."origin_kind" = 'import') = ("trial"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "visit" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"row_sample_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"visited_on" date NOT NULL,
	"visited_at" text,
	"time_zone" text NOT NULL,
	"marker" text,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "visit_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "visit_time_of_day" CHECK ("visit"."visited_at" ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
	CONSTRAINT "visit_origin_kind_known" CHECK ("visit"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "visit_import_named" CHECK (("visit"."origin_kind" = 'import') = ("visit"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "withdrawal" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"target_kind" text NOT NULL,
	"target_id" uuid NOT NULL,
	"reason" text NOT NULL,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "withdrawal_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "withdrawal_target_kind_known" CHECK ("withdrawal"."target_kind" in ('count', 'tape-sheet', 'residue-reading', 'import')),
	CONSTRAINT "withdrawal_origin_kind_known" CHECK ("withdrawal"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "withdrawal_import_named" CHECK (("withdrawal"."origin_kind" = 'import') = ("withdrawal"."import_id" is not null))
);
--> statement-breakpoint
ALTER TABLE "audit_event" ADD CONSTRAINT "audit_event_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "audit_seal" ADD CONSTRAINT "audit_seal_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "block" ADD CONSTRAINT "block_trial_fk" FOREIGN KEY ("organisation_id","trial_id") REFERENCES "public"."trial"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "count" ADD CONSTRAINT "count_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "count" ADD CONSTRAINT "count_visit_fk" FOREIGN KEY ("organisation_id","visit_id") REFERENCES "public"."visit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "count" ADD CONSTRAINT "count_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."count"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "decision" ADD CONSTRAINT "decision_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "decision" ADD CONSTRAINT "decision_zone_fk" FOREIGN KEY ("organisation_id","zone_id") REFERENCES "public"."planting_zone"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "farm_person" ADD CONSTRAINT "farm_person_farm_fk" FOREIGN KEY ("organisation_id","farm_id") REFERENCES "public"."farm"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "farm_person" ADD CONSTRAINT "farm_person_membership_fk" FOREIGN KEY ("organisation_id","person_id") REFERENCES "public"."membership"("organisation_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "farm" ADD CONSTRAINT "farm_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "field" ADD CONSTRAINT "field_farm_fk" FOREIGN KEY ("organisation_id","farm_id") REFERENCES "public"."farm"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "import_file" ADD CONSTRAINT "import_file_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "losing_edit" ADD CONSTRAINT "losing_edit_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_person_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "planting_zone" ADD CONSTRAINT "planting_zone_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "planting" ADD CONSTRAINT "planting_field_fk" FOREIGN KEY ("organisation_id","field_id") REFERENCES "public"."field"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "receipt" ADD CONSTRAINT "receipt_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "replant_sheet" ADD CONSTRAINT "replant_sheet_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "replant_sheet" ADD CONSTRAINT "replant_sheet_zone_fk" FOREIGN KEY ("organisation_id","zone_id") REFERENCES "public"."planting_zone"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "residue_reading" ADD CONSTRAINT "residue_reading_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "row_sample" ADD CONSTRAINT "row_sample_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "row_sample" ADD CONSTRAINT "row_sample_strip_fk" FOREIGN KEY ("organisation_id","strip_id") REFERENCES "public"."strip"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "row_sample" ADD CONSTRAINT "row_sample_zone_fk" FOREIGN KEY ("organisation_id","zone_id") REFERENCES "public"."planting_zone"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "session" ADD CONSTRAINT "session_person_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setting" ADD CONSTRAINT "setting_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "strip_as_planted" ADD CONSTRAINT "strip_as_planted_strip_fk" FOREIGN KEY ("organisation_id","strip_id") REFERENCES "public"."strip"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "strip_as_planted" ADD CONSTRAINT "strip_as_planted_setting_fk" FOREIGN KEY ("organisation_id","setting_id") REFERENCES "public"."setting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "strip" ADD CONSTRAINT "strip_block_fk" FOREIGN KEY ("organisation_id","block_id") REFERENCES "public"."block"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "strip" ADD CONSTRAINT "strip_setting_fk" FOREIGN KEY ("organisation_id","planned_setting_id") REFERENCES "public"."setting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "study" ADD CONSTRAINT "study_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisation"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD CONSTRAINT "tape_sheet_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD CONSTRAINT "tape_sheet_visit_fk" FOREIGN KEY ("organisation_id","visit_id") REFERENCES "public"."visit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD CONSTRAINT "tape_sheet_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."tape_sheet"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "trial" ADD CONSTRAINT "trial_study_fk" FOREIGN KEY ("organisation_id","study_id") REFERENCES "public"."study"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "trial" ADD CONSTRAINT "trial_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "trial" ADD CONSTRAINT "trial_reference_fk" FOREIGN KEY ("organisation_id","reference_setting_id") REFERENCES "public"."setting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit" ADD CONSTRAINT "visit_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit" ADD CONSTRAINT "visit_person_fk" FOREIGN KEY ("organisation_id","person_id") REFERENCES "public"."membership"("organisation_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_event_recorded_index" ON "audit_event" USING btree ("organisation_id","recorded_at","id");--> statement-breakpoint
CREATE INDEX "count_row_sample_index" ON "count" USING btree ("organisation_id","row_sample_id");--> statement-breakpoint
CREATE INDEX "decision_planting_index" ON "decision" USING btree ("organisation_id","planting_id");--> statement-breakpoint
CREATE INDEX "field_farm_index" ON "field" USING btree ("organisation_id","farm_id");--> statement-breakpoint
CREATE INDEX "membership_person_index" ON "membership" USING btree ("person_id");--> statement-breakpoint
CREATE UNIQUE INDEX "person_email_unique" ON "person" USING btree ("email");--> statement-breakpoint
CREATE INDEX "planting_field_index" ON "planting" USING btree ("organisation_id","field_id");--> statement-breakpoint
CREATE INDEX "replant_sheet_planting_index" ON "replant_sheet" USING btree ("organisation_id","planting_id");--> statement-breakpoint
CREATE INDEX "residue_reading_row_sample_index" ON "residue_reading" USING btree ("organisation_id","row_sample_id");--> statement-breakpoint
CREATE INDEX "row_sample_planting_index" ON "row_sample" USING btree ("organisation_id","planting_id");--> statement-breakpoint
CREATE UNIQUE INDEX "row_sample_label_unique" ON "row_sample" USING btree ("organisation_id","planting_id","label") WHERE "row_sample"."removed_at" is null;--> statement-breakpoint
CREATE INDEX "session_person_index" ON "session" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "strip_as_planted_strip_index" ON "strip_as_planted" USING btree ("organisation_id","strip_id");--> statement-breakpoint
CREATE INDEX "tape_sheet_row_sample_index" ON "tape_sheet" USING btree ("organisation_id","row_sample_id");--> statement-breakpoint
CREATE UNIQUE INDEX "trial_planting_unique" ON "trial" USING btree ("organisation_id","planting_id") WHERE "trial"."removed_at" is null;--> statement-breakpoint
CREATE INDEX "visit_row_sample_index" ON "visit" USING btree ("organisation_id","row_sample_id");--> statement-breakpoint
CREATE INDEX "withdrawal_target_index" ON "withdrawal" USING btree ("organisation_id","target_id");