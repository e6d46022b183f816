import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { digNoteCharactersMost } from '@/lib/schemas/field-limits';
import {
  crustThicknesses, digFindings, digPlaces, digPlants, digResidues, soilMoistures,
  type CrustThickness, type DigFinding, type DigPlace, type DigPlant, type DigResidue, type SoilMoisture,
} from '@/lib/schemas/vocabulary';
import { oneOf, organisationId, origin, originChecks, readingCheck, readingThousandths, readingTyped, readingUnit, thingId } from './columns';
import { rowSample } from './row-sample';
import { visit } from './visit';

/** One row is one plant, or the place of a missing one, dug up at a visit and looked at. A late plant and its neighbor carry one pair id. Appended. */
export const dig = pgTable(
  'dig',
  {
    organisationId: organisationId(),
    id: thingId(),
    rowSampleId: uuid('row_sample_id').notNull(),
    visitId: uuid('visit_id').notNull(),
    pairId: uuid('pair_id').notNull(),
    plant: text('plant').$type<DigPlant>().notNull(),
    /** Inside the measured length, or in the same length beyond its end mark. */
    dugIn: text('dug_in').$type<DigPlace>().notNull(),
    placeTyped: text('place_typed'),
    depthTyped: readingTyped('depth'),
    depthUnit: readingUnit('depth'),
    depthThousandths: readingThousandths('depth'),
    residue: text('residue').$type<DigResidue>(),
    moisture: text('moisture').$type<SoilMoisture>(),
    crust: text('crust').$type<CrustThickness>(),
    found: text('found').array().$type<DigFinding[]>().notNull(),
    note: text('note'),
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'dig_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'dig_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    foreignKey({ name: 'dig_visit_fk', columns: [t.organisationId, t.visitId], foreignColumns: [visit.organisationId, visit.id] }),
    foreignKey({ name: 'dig_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('dig_row_sample_index').on(t.organisationId, t.rowSampleId),
    oneOf('dig_plant_known', t.plant, digPlants),
    oneOf('dig_dug_in_known', t.dugIn, digPlaces),
    oneOf('dig_residue_known', t.residue, digResidues),
    oneOf('dig_moisture_known', t.moisture, soilMoistures),
    oneOf('dig_crust_known', t.crust, crustThicknesses),
    check('dig_found_known', sql`${t.found} <@ array[${sql.raw(digFindings.map((finding) => `'${finding}'`).join(', '))}]`),
    check('dig_note_length', sql`char_length(${t.note}) <= ${sql.raw(String(digNoteCharactersMost))}`),
    readingCheck('dig_depth_reading', { typed: t.depthTyped, unit: t.depthUnit, thousandths: t.depthThousandths }),
    ...originChecks('dig', t),
  ],
);
