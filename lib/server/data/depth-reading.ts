import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { depthReading } from '@/db/schema/depth-reading';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';
import { visit } from '@/db/schema/visit';

const columns = {
  id: depthReading.id,
  rowSampleId: depthReading.rowSampleId,
  visitId: depthReading.visitId,
  visitedOn: visit.visitedOn,
  visitedAt: visit.visitedAt,
  visitMarker: visit.marker,
  personId: visit.personId,
  personName: person.name,
  unit: depthReading.unit,
  depthsTyped: depthReading.depthsTyped,
  depthsThousandths: depthReading.depthsThousandths,
  replacesId: depthReading.replacesId,
  importId: depthReading.importId,
  recordedAt: depthReading.createdAt,
};

export type DepthReadingRow = Awaited<ReturnType<typeof listDepthReadings>>[number];

/** All depth readings of a planting's standing row samples, corrected and withdrawn ones among them, as they came in. */
export async function listDepthReadings(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select(columns)
    .from(depthReading)
    .innerJoin(visit, and(eq(visit.organisationId, depthReading.organisationId), eq(visit.id, depthReading.visitId)))
    .innerJoin(
      rowSample,
      and(eq(rowSample.organisationId, depthReading.organisationId), eq(rowSample.id, depthReading.rowSampleId), isNull(rowSample.removedAt)),
    )
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(depthReading.organisationId, params.organisationId), eq(rowSample.plantingId, params.plantingId)))
    .orderBy(asc(depthReading.createdAt), asc(depthReading.id));
}

/** Adds one; says whether it was new. */
export async function insertDepthReading(tx: Transaction, values: typeof depthReading.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(depthReading).values(values).onConflictDoNothing().returning({ id: depthReading.id });
  return inserted.length === 1;
}

export async function findDepthReading(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(depthReading)
    .innerJoin(visit, and(eq(visit.organisationId, depthReading.organisationId), eq(visit.id, depthReading.visitId)))
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(depthReading.organisationId, params.organisationId), eq(depthReading.id, params.id)));
  return rows[0];
}

/** What was recorded as a correction of one, taken back or not. */
export async function listCorrectionsOfDepthReading(tx: Transaction, params: { organisationId: string; id: string }) {
  return tx
    .select(columns)
    .from(depthReading)
    .innerJoin(visit, and(eq(visit.organisationId, depthReading.organisationId), eq(visit.id, depthReading.visitId)))
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(depthReading.organisationId, params.organisationId), eq(depthReading.replacesId, params.id)));
}
