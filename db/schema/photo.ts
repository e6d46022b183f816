import { sql } from 'drizzle-orm';
import { check, doublePrecision, foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { photoAccuracyMetersMost, photoBytesMost } from '@/lib/schemas/field-limits';
import { calendarDay, organisationId, origin, originChecks, thingId } from './columns';
import { planting } from './planting';
import { rowSample } from './row-sample';

/** One row is that a photo was taken: of what, when and where, and the hash of the file that the phone will send. Appended; the file itself stands in photo_file. */
export const photo = pgTable(
  'photo',
  {
    organisationId: organisationId(),
    id: thingId(),
    plantingId: uuid('planting_id').notNull(),
    rowSampleId: uuid('row_sample_id'),
    /** No foreign key: the picture of a dig may arrive before the dig, and stays a picture of its row where that one is refused. */
    digId: uuid('dig_id'),
    takenOn: calendarDay('taken_on').notNull(),
    takenAt: text('taken_at'),
    timeZone: text('time_zone').notNull(),
    latitudeDegrees: doublePrecision('latitude_degrees'),
    longitudeDegrees: doublePrecision('longitude_degrees'),
    accuracyMeters: doublePrecision('accuracy_meters'),
    /** Of the bytes as the phone sends them, before they are encoded anew. */
    sha256: text('sha256').notNull(),
    bytes: integer('bytes').notNull(),
    ...origin(),
  },
  (t) => [
    primaryKey({ name: 'photo_pk', columns: [t.organisationId, t.id] }),
    foreignKey({ name: 'photo_planting_fk', columns: [t.organisationId, t.plantingId], foreignColumns: [planting.organisationId, planting.id] }),
    foreignKey({ name: 'photo_row_sample_fk', columns: [t.organisationId, t.rowSampleId], foreignColumns: [rowSample.organisationId, rowSample.id] }),
    index('photo_planting_index').on(t.organisationId, t.plantingId),
    check('photo_time_of_day', sql`${t.takenAt} ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'`),
    check(
      'photo_place_whole',
      sql`num_nonnulls(${t.latitudeDegrees}, ${t.longitudeDegrees}, ${t.accuracyMeters}) in (0, 3) and (${t.latitudeDegrees} is null or (${t.latitudeDegrees} between -90 and 90 and ${t.longitudeDegrees} between -180 and 180 and ${t.accuracyMeters} between 0 and ${sql.raw(String(photoAccuracyMetersMost))}))`,
    ),
    check('photo_sha256_hex', sql`${t.sha256} ~ '^[0-9a-f]{64}$'`),
    check('photo_bytes_range', sql`${t.bytes} between 1 and ${sql.raw(String(photoBytesMost))}`),
    ...originChecks('photo', t),
  ],
);
