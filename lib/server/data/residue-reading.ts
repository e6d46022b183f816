import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { residueReading } from '@/db/schema/residue-reading';
import { rowSample } from '@/db/schema/row-sample';

export async function listResidueReadings(tx: Transaction, params: { organisationId: string; plantingId: string; rowSampleId?: string }) {
  return tx
    .select({
      id: residueReading.id,
      rowSampleId: residueReading.rowSampleId,
      readOn: residueReading.readOn,
      marksRead: residueReading.marksRead,
      marksCovered: residueReading.marksCovered,
      importId: residueReading.importId,
    })
    .from(residueReading)
    .innerJoin(
      rowSample,
      and(eq(rowSample.organisationId, residueReading.organisationId), eq(rowSample.id, residueReading.rowSampleId), isNull(rowSample.removedAt)),
    )
    .where(
      and(
        eq(residueReading.organisationId, params.organisationId),
        eq(rowSample.plantingId, params.plantingId),
        params.rowSampleId === undefined ? undefined : eq(residueReading.rowSampleId, params.rowSampleId),
      ),
    )
    .orderBy(asc(residueReading.createdAt), asc(residueReading.id));
}

/** Adds a reading; says whether it was new. */
export async function insertResidueReading(tx: Transaction, values: typeof residueReading.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(residueReading).values(values).onConflictDoNothing().returning({ id: residueReading.id });
  return inserted.length === 1;
}

export async function findResidueReading(tx: Transaction, params: { organisationId: string; residueReadingId: string }) {
  const rows = await tx
    .select({
      id: residueReading.id,
      rowSampleId: residueReading.rowSampleId,
      readOn: residueReading.readOn,
      marksRead: residueReading.marksRead,
      marksCovered: residueReading.marksCovered,
    })
    .from(residueReading)
    .where(and(eq(residueReading.organisationId, params.organisationId), eq(residueReading.id, params.residueReadingId)));
  return rows[0];
}
