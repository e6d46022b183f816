import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { countKinds, type CountKind } from '@/lib/schemas/vocabulary';
import { oneOf, organisationId, origin, originChecks, thingId } from './columns';
import { rowSample } from './row-sample';
import { visit } from './visit';

/** One row is a count at a visit: plants up in the row sample, as typed (so far, or new since the last visit). Appended, never changed. */
export const count = pgTable(
  'count',
  {
    organisationId: organisationId(),
    id: thingId(),
    rowSampleId: uuid('row_sample_id').notNull(),
    visitId: uuid('visit_id').notNull(),
    countedAs: text('counted_as').$type<CountKind>().notNull(),
    /** The number as typed; what it means is said by counted_as. */
    plants: integer('plants').notNull(),
    /** Of the plants standing, how many may not live. */
    doubtful: integer('doubtful').notNull().default(0),
    /** The count that this one corrects. */
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'count_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'count_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    foreignKey({ name: 'count_visit_fk', columns: [t.organisationId, t.visitId], foreignColumns: [visit.organisationId, visit.id] }),
    foreignKey({ name: 'count_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('count_row_sample_index').on(t.organisationId, t.rowSampleId),
    oneOf('count_counted_as_known', t.countedAs, countKinds),
    check('count_plants_range', sql`${t.plants} between 0 and 2000`),
    check('count_doubtful_range', sql`${t.doubtful} >= 0 and (${t.countedAs} = 'new' or ${t.doubtful} <= ${t.plants})`),
    ...originChecks('count', t),
  ],
);
