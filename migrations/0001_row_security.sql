-- Row security: without an organisation named inside the transaction, no tenant's row is seen or written.
-- FORCE makes it hold for the tables' owner too; the migrator's role may bypass it, so that backfills reach every row.
ALTER TABLE "farm" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "farm" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "farm_own_organisation" ON "farm" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "farm_person" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "farm_person" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "farm_person_own_organisation" ON "farm_person" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "field" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "field" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "field_own_organisation" ON "field" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "planting" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "planting" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "planting_own_organisation" ON "planting" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "planting_zone" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "planting_zone" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "planting_zone_own_organisation" ON "planting_zone" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "setting" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "setting" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "setting_own_organisation" ON "setting" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "study" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "study" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "study_own_organisation" ON "study" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "trial" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "trial" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "trial_own_organisation" ON "trial" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "block" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "block" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "block_own_organisation" ON "block" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "strip" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "strip" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "strip_own_organisation" ON "strip" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "strip_as_planted" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "strip_as_planted" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "strip_as_planted_own_organisation" ON "strip_as_planted" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "row_sample" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "row_sample" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "row_sample_own_organisation" ON "row_sample" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "visit" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "visit" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "visit_own_organisation" ON "visit" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "count" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "count" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "count_own_organisation" ON "count" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "tape_sheet" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "tape_sheet" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "tape_sheet_own_organisation" ON "tape_sheet" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "residue_reading" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "residue_reading" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "residue_reading_own_organisation" ON "residue_reading" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "withdrawal" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "withdrawal" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "withdrawal_own_organisation" ON "withdrawal" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "import_file" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "import_file" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "import_file_own_organisation" ON "import_file" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "replant_sheet" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "replant_sheet" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "replant_sheet_own_organisation" ON "replant_sheet" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "decision" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "decision" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "decision_own_organisation" ON "decision" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "receipt" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "receipt" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "receipt_own_organisation" ON "receipt" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "audit_event" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "audit_event" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "audit_event_own_organisation" ON "audit_event" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "audit_seal" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "audit_seal" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "audit_seal_own_organisation" ON "audit_seal" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "losing_edit" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "losing_edit" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "losing_edit_own_organisation" ON "losing_edit" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
ALTER TABLE "membership" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "membership" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "organisation" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "organisation" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY "membership_own_organisation" ON "membership" USING (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
CREATE POLICY "membership_own_person" ON "membership" FOR SELECT USING (person_id = nullif(current_setting('app.person_id', true), '')::uuid);
--> statement-breakpoint
CREATE POLICY "organisation_own" ON "organisation" USING (id = nullif(current_setting('app.organisation_id', true), '')::uuid) WITH CHECK (id = nullif(current_setting('app.organisation_id', true), '')::uuid);
--> statement-breakpoint
CREATE POLICY "organisation_of_member" ON "organisation" FOR SELECT USING (EXISTS (SELECT 1 FROM membership WHERE membership.organisation_id = organisation.id AND membership.person_id = nullif(current_setting('app.person_id', true), '')::uuid AND membership.removed_at IS NULL));
--> statement-breakpoint
CREATE FUNCTION organisations_with_unsealed_events() RETURNS SETOF uuid LANGUAGE sql STABLE SECURITY DEFINER SET search_path = public, pg_temp AS $$ SELECT DISTINCT organisation_id FROM audit_event WHERE NOT EXISTS (SELECT 1 FROM audit_seal WHERE audit_seal.organisation_id = audit_event.organisation_id AND audit_seal.event_id = audit_event.id) $$;
--> statement-breakpoint
REVOKE ALL ON FUNCTION organisations_with_unsealed_events() FROM PUBLIC;
