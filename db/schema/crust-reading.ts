import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { sproutsMost } from '@/lib/schemas/field-limits';
import { crustThicknesses, type CrustThickness } from '@/lib/schemas/vocabulary';
import { oneOf, organisationId, origin, originChecks, thingId } from './columns';
import { rowSample } from './row-sample';
import { visit } from './visit';

/** One row is what was found below a crust at a visit: sprouts that are sound, and sprouts that are not. Appended. */
export const crustReading = pgTable(
  'crust_reading',
  {
    organisationId: organisationId(),
    id: thingId(),
    rowSampleId: uuid('row_sample_id').notNull(),
    visitId: uuid('visit_id').notNull(),
    sproutsSound: integer('sprouts_sound').notNull(),
    sproutsDead: integer('sprouts_dead').notNull(),
    crust: text('crust').$type<CrustThickness>().notNull(),
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'crust_reading_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'crust_reading_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    foreignKey({ name: 'crust_reading_visit_fk', columns: [t.organisationId, t.visitId], foreignColumns: [visit.organisationId, visit.id] }),
    foreignKey({ name: 'crust_reading_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('crust_reading_row_sample_index').on(t.organisationId, t.rowSampleId),
    oneOf('crust_reading_crust_known', t.crust, crustThicknesses),
    check('crust_reading_sprouts_range', sql`${t.sproutsSound} between 0 and ${sql.raw(String(sproutsMost))} and ${t.sproutsDead} between 0 and ${sql.raw(String(sproutsMost))}`),
    ...originChecks('crust_reading', t),
  ],
);
