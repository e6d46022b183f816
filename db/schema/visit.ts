import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { calendarDay, organisationId, origin, originChecks, thingId } from './columns';
import { membership } from './membership';
import { rowSample } from './row-sample';

/** One row is a person at a row sample on a local day. A row may be visited twice a day, and by two people. */
export const visit = pgTable(
  'visit',
  {
    organisationId: organisationId(),
    id: thingId(),
    rowSampleId: uuid('row_sample_id').notNull(),
    /** Who was there; the one who typed a paper sheet in stands in created_by. */
    personId: uuid('person_id').notNull(),
    visitedOn: calendarDay('visited_on').notNull(),
    visitedAt: text('visited_at'),
    timeZone: text('time_zone').notNull(),
    /** The colour or number of the markers set at this visit, chosen by the crew. */
    marker: text('marker'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'visit_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'visit_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    foreignKey({ name: 'visit_person_fk', columns: [t.organisationId, t.personId], foreignColumns: [membership.organisationId, membership.personId] }),
    index('visit_row_sample_index').on(t.organisationId, t.rowSampleId),
    check('visit_time_of_day', sql`${t.visitedAt} ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'`),
    ...originChecks('visit', t),
  ],
);
