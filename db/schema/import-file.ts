import { foreignKey, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { importKinds, type ImportKind } from '@/lib/schemas/vocabulary';
import { instant, oneOf, organisationId, thingId } from './columns';
import { planting } from './planting';

/** One row is a file that was taken in whole: who brought it, when, and how many records it became. */
export const importFile = pgTable(
  'import_file',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    kind: text('kind').$type<ImportKind>().notNull(),
    fileName: text('file_name').notNull(),
    lines: integer('lines').notNull(),
    records: integer('records').notNull(),
    operationId: uuid('operation_id').notNull(),
    createdBy: uuid('created_by').notNull(),
    createdAt: instant('created_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'import_file_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'import_file_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    oneOf('import_file_kind_known', t.kind, importKinds),
  ],
);
