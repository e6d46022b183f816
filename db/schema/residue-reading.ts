import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, uuid } from 'drizzle-orm/pg-core';
import { calendarDay, organisationId, origin, originChecks, thingId } from './columns';
import { rowSample } from './row-sample';

/** One row is in-row cover read along the seed row of a row sample: marks over residue, of the marks read. Appended. */
export const residueReading = pgTable(
  'residue_reading',
  {
    organisationId: organisationId(),
    id: thingId(),
    rowSampleId: uuid('row_sample_id').notNull(),
    readOn: calendarDay('read_on').notNull(),
    marksRead: integer('marks_read').notNull(),
    marksCovered: integer('marks_covered').notNull(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'residue_reading_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'residue_reading_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    index('residue_reading_row_sample_index').on(t.organisationId, t.rowSampleId),
    check('residue_reading_marks_range', sql`${t.marksRead} between 1 and 1000 and ${t.marksCovered} between 0 and ${t.marksRead}`),
    ...originChecks('residue_reading', t),
  ],
);
