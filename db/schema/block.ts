import { sql } from 'drizzle-orm';
import { check, foreignKey, integer, pgTable, primaryKey, unique, uuid } from 'drizzle-orm/pg-core';
import { organisationId, thingId } from './columns';
import { trial } from './trial';

/** One row is a block of a trial: neighbouring strips in which every setting had an equal chance of each place. */
export const block = pgTable(
  'block',
  {
    organisationId: organisationId(),
    id: thingId(),
    trialId: uuid('trial_id').notNull(),
    number: integer('number').notNull(),
  },
  (t) => [
    primaryKey({ name: 'block_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'block_trial_fk', columns: [t.organisationId, t.trialId], foreignColumns: [trial.organisationId, trial.id] }),
    unique('block_number_unique').on(t.organisationId, t.trialId, t.number),
    check('block_number_positive', sql`${t.number} > 0`),
  ],
);
