import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, uuid } from 'drizzle-orm/pg-core';
import { marksMost } from '@/lib/schemas/field-limits';
import { calendarDay, organisationId, origin, originChecks, thingId } from './columns';
import { planting } from './planting';
import { strip } from './strip';

/** One row is field cover read along one line across the rows, in a strip or anywhere in the field: marks over residue, of the marks read. Appended. */
export const fieldTransect = pgTable(
  'field_transect',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    stripId: uuid('strip_id'),
    readOn: calendarDay('read_on').notNull(),
    marksRead: integer('marks_read').notNull(),
    marksCovered: integer('marks_covered').notNull(),
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'field_transect_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'field_transect_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    foreignKey({ name: 'field_transect_strip_fk', columns: [t.organisationId, t.stripId], foreignColumns: [strip.organisationId, strip.id] }),
    foreignKey({ name: 'field_transect_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('field_transect_planting_index').on(t.organisationId, t.plantingId),
    check('field_transect_marks_range', sql`${t.marksRead} between 1 and ${sql.raw(String(marksMost))} and ${t.marksCovered} between 0 and ${t.marksRead}`),
    ...originChecks('field_transect', t),
  ],
);
