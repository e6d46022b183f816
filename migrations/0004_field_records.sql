CREATE TABLE "condition" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"row_sample_id" uuid,
	"observed_on" date NOT NULL,
	"observed_at" text,
	"time_zone" text NOT NULL,
	"growth_stage" text,
	"soil_temperature_typed" text,
	"soil_temperature_unit" text,
	"soil_temperature_thousandths" bigint,
	"soil_moisture" text,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "condition_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "condition_time_of_day" CHECK ("condition"."observed_at" ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
	CONSTRAINT "condition_growth_stage_known" CHECK ("condition"."growth_stage" in ('VE', 'V1', 'V2', 'V3', 'V4', 'V5', 'V6', 'V7', 'V8', 'V9', 'V10')),
	CONSTRAINT "condition_soil_moisture_known" CHECK ("condition"."soil_moisture" in ('dry', 'moist', 'wet')),
	CONSTRAINT "condition_soil_temperature_unit_known" CHECK ("condition"."soil_temperature_unit" in ('F', 'C')),
	CONSTRAINT "condition_soil_temperature_reading" CHECK (num_nonnulls("condition"."soil_temperature_typed", "condition"."soil_temperature_unit", "condition"."soil_temperature_thousandths") in (0, 3) and ("condition"."soil_temperature_unit" is null or ("condition"."soil_temperature_unit" = 'F' and "condition"."soil_temperature_thousandths" between 0 and 150000) or ("condition"."soil_temperature_unit" = 'C' and "condition"."soil_temperature_thousandths" between -18000 and 66000))),
	CONSTRAINT "condition_says_something" CHECK (num_nonnulls("condition"."growth_stage", "condition"."soil_temperature_typed", "condition"."soil_moisture") > 0),
	CONSTRAINT "condition_origin_kind_known" CHECK ("condition"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "condition_import_named" CHECK (("condition"."origin_kind" = 'import') = ("condition"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "crust_reading" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"row_sample_id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"sprouts_sound" integer NOT NULL,
	"sprouts_dead" integer NOT NULL,
	"crust" text NOT NULL,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "crust_reading_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "crust_reading_crust_known" CHECK ("crust_reading"."crust" in ('none', 'thin', 'thick')),
	CONSTRAINT "crust_reading_sprouts_range" CHECK ("crust_reading"."sprouts_sound" between 0 and 2000 and "crust_reading"."sprouts_dead" between 0 and 2000),
	CONSTRAINT "crust_reading_origin_kind_known" CHECK ("crust_reading"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "crust_reading_import_named" CHECK (("crust_reading"."origin_kind" = 'import') = ("crust_reading"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "depth_reading" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"row_sample_id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"unit" text NOT NULL,
	"depths_typed" text[] NOT NULL,
	"depths_thousandths" integer[] NOT NULL,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "depth_reading_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "depth_reading_unit_known" CHECK ("depth_reading"."unit" in ('in', 'cm')),
	CONSTRAINT "depth_reading_depths_range" CHECK (cardinality("depth_reading"."depths_typed") = cardinality("depth_reading"."depths_thousandths") and cardinality("depth_reading"."depths_thousandths") between 1 and 30 and 0 <= all ("depth_reading"."depths_thousandths")),
	CONSTRAINT "depth_reading_origin_kind_known" CHECK ("depth_reading"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "depth_reading_import_named" CHECK (("depth_reading"."origin_kind" = 'import') = ("depth_reading"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "dig" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"row_sample_id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"pair_id" uuid NOT NULL,
	"plant" text NOT NULL,
	"dug_in" text NOT NULL,
	"place_typed" text,
	"depth_typed" text,
	"depth_unit" text,
	"depth_thousandths" bigint,
	"residue" text,
	"moisture" text,
	"crust" text,
	"found" text[] NOT NULL,
	"note" text,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "dig_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "dig_plant_known" CHECK ("dig"."plant" in ('late', 'neighbor', 'missing')),
	CONSTRAINT "dig_dug_in_known" CHECK ("dig"."dug_in" in ('in-sample', 'twin-length')),
	CONSTRAINT "dig_residue_known" CHECK ("dig"."residue" in ('none', 'beside-seed', 'pinned', 'over-row')),
	CONSTRAINT "dig_moisture_known" CHECK ("dig"."moisture" in ('dry', 'moist', 'wet')),
	CONSTRAINT "dig_crust_known" CHECK ("dig"."crust" in ('none', 'thin', 'thick')),
	CONSTRAINT "dig_found_known" CHECK ("dig"."found" <@ array['no-seed', 'firm-seed', 'swollen-seed', 'rotted', 'twisted-shoot', 'hollow-or-cut', 'burned-tips', 'residue-in-furrow', 'sound']),
	CONSTRAINT "dig_note_length" CHECK (char_length("dig"."note") <= 500),
	CONSTRAINT "dig_depth_reading" CHECK (num_nonnulls("dig"."depth_typed", "dig"."depth_unit", "dig"."depth_thousandths") in (0, 3) and ("dig"."depth_unit" is null or "dig"."depth_unit" in ('in', 'ft', 'cm', 'm', 'mm', 'acres', 'ha', 'per-acre', 'per-ha', 'percent', 'bu/ac', 't/ha', 'lb', 'kg', 'lbf', 'psi', 'kPa', 'N')) and "dig"."depth_thousandths" >= 0),
	CONSTRAINT "dig_origin_kind_known" CHECK ("dig"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "dig_import_named" CHECK (("dig"."origin_kind" = 'import') = ("dig"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "entry_exception" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"restriction_id" uuid NOT NULL,
	"entered_on" date NOT NULL,
	"exception" text NOT NULL,
	"equipment" text NOT NULL,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "entry_exception_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "entry_exception_exception_length" CHECK (char_length("entry_exception"."exception") between 1 and 200),
	CONSTRAINT "entry_exception_equipment_length" CHECK (char_length("entry_exception"."equipment") between 1 and 200),
	CONSTRAINT "entry_exception_origin_kind_known" CHECK ("entry_exception"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "entry_exception_import_named" CHECK (("entry_exception"."origin_kind" = 'import') = ("entry_exception"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "entry_restriction" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"field_id" uuid NOT NULL,
	"product" text NOT NULL,
	"ended_on" date NOT NULL,
	"ended_at" text NOT NULL,
	"time_zone" text NOT NULL,
	"hours" double precision NOT NULL,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "entry_restriction_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "entry_restriction_time_of_day" CHECK ("entry_restriction"."ended_at" ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
	CONSTRAINT "entry_restriction_product_length" CHECK (char_length("entry_restriction"."product") between 1 and 80),
	CONSTRAINT "entry_restriction_hours_range" CHECK ("entry_restriction"."hours" > 0 and "entry_restriction"."hours" <= 2000),
	CONSTRAINT "entry_restriction_origin_kind_known" CHECK ("entry_restriction"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "entry_restriction_import_named" CHECK (("entry_restriction"."origin_kind" = 'import') = ("entry_restriction"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "field_transect" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"strip_id" uuid,
	"read_on" date NOT NULL,
	"marks_read" integer NOT NULL,
	"marks_covered" integer NOT NULL,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "field_transect_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "field_transect_marks_range" CHECK ("field_transect"."marks_read" between 1 and 1000 and "field_transect"."marks_covered" between 0 and "field_transect"."marks_read"),
	CONSTRAINT "field_transect_origin_kind_known" CHECK ("field_transect"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "field_transect_import_named" CHECK (("field_transect"."origin_kind" = 'import') = ("field_transect"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "marker_tally" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"row_sample_id" uuid NOT NULL,
	"happened_on" date NOT NULL,
	"event" text NOT NULL,
	"markers" integer NOT NULL,
	"replaces_id" uuid,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "marker_tally_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "marker_tally_event_known" CHECK ("marker_tally"."event" in ('set', 'taken-up')),
	CONSTRAINT "marker_tally_markers_range" CHECK ("marker_tally"."markers" between 0 and 2000),
	CONSTRAINT "marker_tally_origin_kind_known" CHECK ("marker_tally"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "marker_tally_import_named" CHECK (("marker_tally"."origin_kind" = 'import') = ("marker_tally"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "note" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"row_sample_id" uuid,
	"noted_on" date NOT NULL,
	"noted_at" text,
	"time_zone" text NOT NULL,
	"text" text NOT NULL,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "note_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "note_time_of_day" CHECK ("note"."noted_at" ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
	CONSTRAINT "note_text_length" CHECK (char_length("note"."text") between 1 and 1000),
	CONSTRAINT "note_origin_kind_known" CHECK ("note"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "note_import_named" CHECK (("note"."origin_kind" = 'import') = ("note"."import_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "photo_file" (
	"organisation_id" uuid NOT NULL,
	"photo_id" uuid NOT NULL,
	"stored_key" text NOT NULL,
	"small_key" text NOT NULL,
	"sha256" text NOT NULL,
	"bytes" integer NOT NULL,
	"width" integer NOT NULL,
	"height" integer NOT NULL,
	"stored_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "photo_file_pk" PRIMARY KEY("organisation_id","photo_id"),
	CONSTRAINT "photo_file_sha256_hex" CHECK ("photo_file"."sha256" ~ '^[0-9a-f]{64}$'),
	CONSTRAINT "photo_file_sizes_positive" CHECK ("photo_file"."bytes" > 0 and "photo_file"."width" > 0 and "photo_file"."height" > 0)
);
--> statement-breakpoint
CREATE TABLE "photo" (
	"organisation_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"planting_id" uuid NOT NULL,
	"row_sample_id" uuid,
	"dig_id" uuid,
	"taken_on" date NOT NULL,
	"taken_at" text,
	"time_zone" text NOT NULL,
	"latitude_degrees" double precision,
	"longitude_degrees" double precision,
	"accuracy_meters" double precision,
	"sha256" text NOT NULL,
	"bytes" integer NOT NULL,
	"origin_kind" text NOT NULL,
	"import_id" uuid,
	"operation_id" uuid NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "photo_pk" PRIMARY KEY("organisation_id","id"),
	CONSTRAINT "photo_time_of_day" CHECK ("photo"."taken_at" ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
	CONSTRAINT "photo_place_whole" CHECK (num_nonnulls("photo"."latitude_degrees", "photo"."longitude_degrees", "photo"."accuracy_meters") in (0, 3) and ("photo"."latitude_degrees" is null or ("photo"."latitude_degrees" between -90 and 90 and "photo"."longitude_degrees" between -180 and 180 and "photo"."accuracy_meters" between 0 and 100000))),
	CONSTRAINT "photo_sha256_hex" CHECK ("photo"."sha256" ~ '^[0-9a-f]{64}$'),
	CONSTRAINT "photo_bytes_range" CHECK ("photo"."bytes" between 1 and 8388608),
	CONSTRAINT "photo_origin_kind_known" CHECK ("photo"."origin_kind" in ('form', 'phone', 'import', 'demo')),
	CONSTRAINT "photo_import_named" CHECK (("photo"."origin_kind" = 'import') = ("photo"."import_id" is not null))
);
--> statement-breakpoint
ALTER TABLE "withdrawal" DROP CONSTRAINT "withdrawal_target_kind_known";--> statement-breakpoint
ALTER TABLE "audit_event" ADD COLUMN "read_in_by" uuid;--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD COLUMN "read_from" text DEFAULT 'start' NOT NULL;--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD COLUMN "zero_at" text DEFAULT 'mark' NOT NULL;--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD COLUMN "segment_starts" integer[] DEFAULT '{}' NOT NULL;--> statement-breakpoint
ALTER TABLE "condition" ADD CONSTRAINT "condition_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "condition" ADD CONSTRAINT "condition_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "condition" ADD CONSTRAINT "condition_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."condition"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "crust_reading" ADD CONSTRAINT "crust_reading_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "crust_reading" ADD CONSTRAINT "crust_reading_visit_fk" FOREIGN KEY ("organisation_id","visit_id") REFERENCES "public"."visit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "crust_reading" ADD CONSTRAINT "crust_reading_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."crust_reading"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "depth_reading" ADD CONSTRAINT "depth_reading_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "depth_reading" ADD CONSTRAINT "depth_reading_visit_fk" FOREIGN KEY ("organisation_id","visit_id") REFERENCES "public"."visit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "depth_reading" ADD CONSTRAINT "depth_reading_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."depth_reading"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dig" ADD CONSTRAINT "dig_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dig" ADD CONSTRAINT "dig_visit_fk" FOREIGN KEY ("organisation_id","visit_id") REFERENCES "public"."visit"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dig" ADD CONSTRAINT "dig_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."dig"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "entry_exception" ADD CONSTRAINT "entry_exception_restriction_fk" FOREIGN KEY ("organisation_id","restriction_id") REFERENCES "public"."entry_restriction"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "entry_restriction" ADD CONSTRAINT "entry_restriction_field_fk" FOREIGN KEY ("organisation_id","field_id") REFERENCES "public"."field"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "entry_restriction" ADD CONSTRAINT "entry_restriction_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."entry_restriction"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "field_transect" ADD CONSTRAINT "field_transect_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "field_transect" ADD CONSTRAINT "field_transect_strip_fk" FOREIGN KEY ("organisation_id","strip_id") REFERENCES "public"."strip"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "field_transect" ADD CONSTRAINT "field_transect_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."field_transect"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "marker_tally" ADD CONSTRAINT "marker_tally_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "marker_tally" ADD CONSTRAINT "marker_tally_replaces_fk" FOREIGN KEY ("organisation_id","replaces_id") REFERENCES "public"."marker_tally"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "note" ADD CONSTRAINT "note_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "note" ADD CONSTRAINT "note_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photo_file" ADD CONSTRAINT "photo_file_photo_fk" FOREIGN KEY ("organisation_id","photo_id") REFERENCES "public"."photo"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photo" ADD CONSTRAINT "photo_planting_fk" FOREIGN KEY ("organisation_id","planting_id") REFERENCES "public"."planting"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photo" ADD CONSTRAINT "photo_row_sample_fk" FOREIGN KEY ("organisation_id","row_sample_id") REFERENCES "public"."row_sample"("organisation_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "condition_planting_index" ON "condition" USING btree ("organisation_id","planting_id");--> statement-breakpoint
CREATE INDEX "crust_reading_row_sample_index" ON "crust_reading" USING btree ("organisation_id","row_sample_id");--> statement-breakpoint
CREATE INDEX "depth_reading_row_sample_index" ON "depth_reading" USING btree ("organisation_id","row_sample_id");--> statement-breakpoint
CREATE INDEX "dig_row_sample_index" ON "dig" USING btree ("organisation_id","row_sample_id");--> statement-breakpoint
CREATE INDEX "entry_exception_restriction_index" ON "entry_exception" USING btree ("organisation_id","restriction_id");--> statement-breakpoint
CREATE INDEX "entry_restriction_field_index" ON "entry_restriction" USING btree ("organisation_id","field_id");--> statement-breakpoint
CREATE INDEX "field_transect_planting_index" ON "field_transect" USING btree ("organisation_id","planting_id");--> statement-breakpoint
CREATE INDEX "marker_tally_row_sample_index" ON "marker_tally" USING btree ("organisation_id","row_sample_id");--> statement-breakpoint
CREATE INDEX "note_planting_index" ON "note" USING btree ("organisation_id","planting_id");--> statement-breakpoint
CREATE INDEX "photo_planting_index" ON "photo" USING btree ("organisation_id","planting_id");--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD CONSTRAINT "tape_sheet_read_from_known" CHECK ("tape_sheet"."read_from" in ('start', 'far-end'));--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD CONSTRAINT "tape_sheet_zero_at_known" CHECK ("tape_sheet"."zero_at" in ('mark', 'plant'));--> statement-breakpoint
ALTER TABLE "tape_sheet" ADD CONSTRAINT "tape_sheet_segment_starts_range" CHECK (1 <= all ("tape_sheet"."segment_starts") and cardinality("tape_sheet"."places_thousandths") > all ("tape_sheet"."segment_starts"));--> statement-breakpoint
ALTER TABLE "withdrawal" ADD CONSTRAINT "withdrawal_target_kind_known" CHECK ("withdrawal"."target_kind" in ('count', 'tape-sheet', 'residue-reading', 'import', 'depth-reading', 'dig', 'crust-reading', 'field-transect', 'condition', 'note', 'marker-tally', 'entry-restriction', 'entry-exception', 'photo'));
--> statement-breakpoint
ALTER TABLE "depth_reading" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "depth_reading" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "depth_reading_own_organisation" ON "depth_reading" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "dig" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "dig" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "dig_own_organisation" ON "dig" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "crust_reading" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "crust_reading" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "crust_reading_own_organisation" ON "crust_reading" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "field_transect" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "field_transect" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "field_transect_own_organisation" ON "field_transect" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "condition" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "condition" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "condition_own_organisation" ON "condition" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "note" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "note" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "note_own_organisation" ON "note" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "marker_tally" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "marker_tally" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "marker_tally_own_organisation" ON "marker_tally" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "entry_restriction" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "entry_restriction" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "entry_restriction_own_organisation" ON "entry_restriction" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "entry_exception" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "entry_exception" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "entry_exception_own_organisation" ON "entry_exception" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "photo" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "photo" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "photo_own_organisation" ON "photo" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "photo_file" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "photo_file" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "photo_file_own_organisation" ON "photo_file" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);