import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { organisationId, origin, originChecks, thingId } from './columns';
import { setting } from './setting';
import { strip } from './strip';

/** One row says what was really run in a strip, or that it was lost; appended, the newest holds. Analysis reads this, not the plan. */
export const stripAsPlanted = pgTable(
  'strip_as_planted',
  {
    organisationId: organisationId(),
    id: thingId(),
    stripId: uuid('strip_id').notNull(),
    /** Null where the strip was lost. */
    settingId: uuid('setting_id'),
    reason: text('reason'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'strip_as_planted_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'strip_as_planted_strip_fk', columns: [t.organisationId, t.stripId], foreignColumns: [strip.organisationId, strip.id] }),
    foreignKey({ name: 'strip_as_planted_setting_fk', columns: [t.organisationId, t.settingId], foreignColumns: [setting.organisationId, setting.id] }),
    index('strip_as_planted_strip_index').on(t.organisationId, t.stripId),
    check('strip_as_planted_loss_has_reason', sql`${t.settingId} is not null or ${t.reason} is not null`),
    ...originChecks('strip_as_planted', t),
  ],
);
