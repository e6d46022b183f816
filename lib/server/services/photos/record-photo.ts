import 'server-only';
import { recordPhotoSchema, type RecordPhotoInput } from '@/lib/schemas/photo';
import { findPhoto, insertPhoto } from '../../data/photo';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { assertSeasonDay } from '../field-records/assert-season-day';
import { holdPlace } from '../field-records/hold-place';
import { keepRecord } from '../field-records/keep-record';

/** Notes that a photo was taken. Its file comes by itself, later, and is held against the hash given here. */
async function service(context: WriteContext, body: RecordPhotoInput): Promise<Written> {
  const seen = await holdPlace(context, body);
  assertSeasonDay(context, seen, 'takenOn', body.takenOn);
  const { place, ...rest } = body;
  const columns = { ...rest, latitudeDegrees: place?.latitude ?? null, longitudeDegrees: place?.longitude ?? null, accuracyMeters: place?.accuracyMeters ?? null };
  return keepRecord(context, {
    find: findPhoto,
    corrections: null,
    isSame: (row) => Object.entries(columns).every(([key, value]) => row[key as keyof typeof columns] === value),
    insert: (origin) => insertPhoto(context.tx, { ...origin, ...columns, timeZone: seen.farm.timeZone }),
  });
}

export const recordPhoto = defineOperation({ kind: 'photo.record', version: 1, action: 'observations.write', body: recordPhotoSchema, service });
