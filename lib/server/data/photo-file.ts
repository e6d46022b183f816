import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { photoFile } from '@/db/schema/photo-file';

const columns = {
  photoId: photoFile.photoId,
  storedKey: photoFile.storedKey,
  smallKey: photoFile.smallKey,
  sha256: photoFile.sha256,
  bytes: photoFile.bytes,
  width: photoFile.width,
  height: photoFile.height,
  storedAt: photoFile.storedAt,
};

/** Notes that a photo's file is stored; says whether it was new. */
export async function insertPhotoFile(tx: Transaction, values: typeof photoFile.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(photoFile).values(values).onConflictDoNothing().returning({ photoId: photoFile.photoId });
  return inserted.length === 1;
}

export async function findPhotoFile(tx: Transaction, params: { organisationId: string; photoId: string }) {
  const rows = await tx
    .select(columns)
    .from(photoFile)
    .where(and(eq(photoFile.organisationId, params.organisationId), eq(photoFile.photoId, params.photoId)));
  return rows[0];
}

/** The files that have come of these photos. */
export async function listPhotoFiles(tx: Transaction, params: { organisationId: string; photoIds: readonly string[] }) {
  if (params.photoIds.length === 0) return [];
  return tx
    .select(columns)
    .from(photoFile)
    .where(and(eq(photoFile.organisationId, params.organisationId), inArray(photoFile.photoId, [...params.photoIds])));
}
