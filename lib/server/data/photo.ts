import 'server-only';
import { and, asc, eq, isNotNull, isNull, or } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { photo } from '@/db/schema/photo';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';

const columns = {
  id: photo.id,
  plantingId: photo.plantingId,
  rowSampleId: photo.rowSampleId,
  digId: photo.digId,
  takenOn: photo.takenOn,
  takenAt: photo.takenAt,
  latitudeDegrees: photo.latitudeDegrees,
  longitudeDegrees: photo.longitudeDegrees,
  accuracyMeters: photo.accuracyMeters,
  sha256: photo.sha256,
  bytes: photo.bytes,
  importId: photo.importId,
  personId: photo.createdBy,
  personName: person.name,
  recordedAt: photo.createdAt,
};

export type PhotoRow = Awaited<ReturnType<typeof listPhotos>>[number];

/** All photos of a planting, withdrawn ones among them, as they came in. */
export async function listPhotos(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select(columns)
    .from(photo)
    .leftJoin(rowSample, and(eq(rowSample.organisationId, photo.organisationId), eq(rowSample.id, photo.rowSampleId), isNull(rowSample.removedAt)))
    .innerJoin(person, eq(person.id, photo.createdBy))
    .where(and(
        eq(photo.organisationId, params.organisationId),
        eq(photo.plantingId, params.plantingId),
        // What was seen at a row sample goes with it.
        or(isNull(photo.rowSampleId), isNotNull(rowSample.id)),
      ))
    .orderBy(asc(photo.createdAt), asc(photo.id));
}

/** Adds one; says whether it was new. */
export async function insertPhoto(tx: Transaction, values: typeof photo.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(photo).values(values).onConflictDoNothing().returning({ id: photo.id });
  return inserted.length === 1;
}

export async function findPhoto(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(photo)
    .innerJoin(person, eq(person.id, photo.createdBy))
    .where(and(eq(photo.organisationId, params.organisationId), eq(photo.id, params.id)));
  return rows[0];
}
