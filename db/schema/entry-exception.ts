import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { equipmentCharactersMost, exceptionCharactersMost } from '@/lib/schemas/field-limits';
import { calendarDay, organisationId, origin, originChecks, thingId } from './columns';
import { entryRestriction } from './entry-restriction';

/** One row is a person entering a field before its restriction ended: under which exception, and with what protective equipment. Appended. */
export const entryException = pgTable(
  'entry_exception',
  {
    organisationId: organisationId(),
    id: thingId(),
    restrictionId: uuid('restriction_id').notNull(),
    enteredOn: calendarDay('entered_on').notNull(),
    exception: text('exception').notNull(),
    equipment: text('equipment').notNull(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'entry_exception_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'entry_exception_restriction_fk', columns: [t.organisationId, t.restrictionId], foreignColumns: [entryRestriction.organisationId, entryRestriction.id] }),
    index('entry_exception_restriction_index').on(t.organisationId, t.restrictionId),
    check('entry_exception_exception_length', sql`char_length(${t.exception}) between 1 and ${sql.raw(String(exceptionCharactersMost))}`),
    check('entry_exception_equipment_length', sql`char_length(${t.equipment}) between 1 and ${sql.raw(String(equipmentCharactersMost))}`),
    ...originChecks('entry_exception', t),
  ],
);
