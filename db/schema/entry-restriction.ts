import { sql } from 'drizzle-orm';
import { check, doublePrecision, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { productCharactersMost, restrictionHoursMost } from '@/lib/schemas/field-limits';
import { calendarDay, organisationId, origin, originChecks, thingId } from './columns';
import { field } from './field';

/** One row is an application in a field and for how many hours after its end nobody enters without protection. Appended; a corrected interval names the one it corrects. */
export const entryRestriction = pgTable(
  'entry_restriction',
  {
    organisationId: organisationId(),
    id: thingId(),
    fieldId: uuid('field_id').notNull(),
    product: text('product').notNull(),
    /** When the application ended, by the farm's clocks. */
    endedOn: calendarDay('ended_on').notNull(),
    endedAt: text('ended_at').notNull(),
    timeZone: text('time_zone').notNull(),
    /** As the label says, such as 24 or 0.5; never reckoned further in SQL. */
    hours: doublePrecision('hours').notNull(),
    replacesId: uuid('replaces_id'),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'entry_restriction_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'entry_restriction_field_fk', columns: [t.organisationId, t.fieldId], foreignColumns: [field.organisationId, field.id] }),
    foreignKey({ name: 'entry_restriction_replaces_fk', columns: [t.organisationId, t.replacesId], foreignColumns: [t.organisationId, t.id] }),
    index('entry_restriction_field_index').on(t.organisationId, t.fieldId),
    check('entry_restriction_time_of_day', sql`${t.endedAt} ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'`),
    check('entry_restriction_product_length', sql`char_length(${t.product}) between 1 and ${sql.raw(String(productCharactersMost))}`),
    check('entry_restriction_hours_range', sql`${t.hours} > 0 and ${t.hours} <= ${sql.raw(String(restrictionHoursMost))}`),
    ...originChecks('entry_restriction', t),
  ],
);
