import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { noteCharactersMost } from '@/lib/schemas/field-limits';
import { calendarDay, organisationId, origin, originChecks, thingId } from './columns';
import { planting } from './planting';
import { rowSample } from './row-sample';

/** One row is a note in the scout's own words, about a row sample or about the planting. Appended. */
export const note = pgTable(
  'note',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    rowSampleId: uuid('row_sample_id'),
    notedOn: calendarDay('noted_on').notNull(),
    notedAt: text('noted_at'),
    timeZone: text('time_zone').notNull(),
    text: text('text').notNull(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'note_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'note_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    foreignKey({ name: 'note_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    index('note_planting_index').on(t.organisationId, t.plantingId),
    check('note_time_of_day', sql`${t.notedAt} ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'`),
    check('note_text_length', sql`char_length(${t.text}) between 1 and ${sql.raw(String(noteCharactersMost))}`),
    ...originChecks('note', t),
  ],
);
