import { sql } from 'drizzle-orm';
import { check, foreignKey, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { instant, organisationId } from './columns';
import { photo } from './photo';

/** One row is the file of a photo once it has been taken in, checked and encoded anew: under which keys it is stored, and what is stored. Appended. */
export const photoFile = pgTable(
  'photo_file',
  {
    organisationId: organisationId(),
    photoId: uuid('photo_id').notNull(),
    storedKey: text('stored_key').notNull(),
    smallKey: text('small_key').notNull(),
    /** Of the stored file, not of the one that was sent. */
    sha256: text('sha256').notNull(),
    bytes: integer('bytes').notNull(),
    width: integer('width').notNull(),
    height: integer('height').notNull(),
    storedAt: instant('stored_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'photo_file_pk', columns: [t.organisationId, t.photoId] }),
    foreignKey({ name: 'photo_file_photo_fk', columns: [t.organisationId, t.photoId], foreignColumns: [photo.organisationId, photo.id] }),
    check('photo_file_sha256_hex', sql`${t.sha256} ~ '^[0-9a-f]{64}$'`),
    check('photo_file_sizes_positive', sql`${t.bytes} > 0 and ${t.width} > 0 and ${t.height} > 0`),
  ],
);
