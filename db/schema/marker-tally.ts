import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { markersMost } from '@/lib/schemas/field-limits';
import { markerEvents, type MarkerEvent } from '@/lib/schemas/vocabulary';
import { calendarDay, oneOf, organisationId, origin, originChecks, thingId } from './columns';
import { rowSample } from './row-sample';

/** One row is a number of markers set in a row sample or taken up again, so that none is left to the next machine. Appended. */
export const markerTally = pgTable(
  'marker_tally',
  {
    organisationId: organisationId(),
    id: thingId(),
    rowSampleId: uuid('row_sample_id').notNull(),
    happenedOn: calendarDay('happened_on').notNull(),
    event: text('event').$type<MarkerEvent>().notNull(),
    markers: integer('markers').notNull(),
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'marker_tally_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'marker_tally_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    foreignKey({ name: 'marker_tally_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('marker_tally_row_sample_index').on(t.organisationId, t.rowSampleId),
    oneOf('marker_tally_event_known', t.event, markerEvents),
    check('marker_tally_markers_range', sql`${t.markers} between 0 and ${sql.raw(String(markersMost))}`),
    ...originChecks('marker_tally', t),
  ],
);
