import { sql } from 'drizzle-orm';
import { check, foreignKey, integer, pgTable, primaryKey, unique, uuid } from 'drizzle-orm/pg-core';
import { organisationId, thingId } from './columns';
import { block } from './block';
import { setting } from './setting';

/** One row is a strip as planned: its number in field order over the whole trial, and the setting drawn for it. */
export const strip = pgTable(
  'strip',
  {
    organisationId: organisationId(),
    id: thingId(),
    blockId: uuid('block_id').notNull(),
    number: integer('number').notNull(),
    plannedSettingId: uuid('planned_setting_id').notNull(),
  },
  (t) => [
    primaryKey({ name: 'strip_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'strip_block_fk', columns: [t.organisationId, t.blockId], foreignColumns: [block.organisationId, block.id] }),
    foreignKey({ name: 'strip_setting_fk', columns: [t.organisationId, t.plannedSettingId], foreignColumns: [setting.organisationId, setting.id] }),
    unique('strip_number_unique').on(t.organisationId, t.blockId, t.number),
    check('strip_number_positive', sql`${t.number} > 0`),
  ],
);
