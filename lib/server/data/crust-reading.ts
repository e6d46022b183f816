import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { crustReading } from '@/db/schema/crust-reading';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';
import { visit } from '@/db/schema/visit';

const columns = {
  id: crustReading.id,
  rowSampleId: crustReading.rowSampleId,
  visitId: crustReading.visitId,
  visitedOn: visit.visitedOn,
  visitedAt: visit.visitedAt,
  visitMarker: visit.marker,
  personId: visit.personId,
  personName: person.name,
  sproutsSound: crustReading.sproutsSound,
  sproutsDead: crustReading.sproutsDead,
  crust: crustReading.crust,
  replacesId: crustReading.replacesId,
  importId: crustReading.importId,
  recordedAt: crustReading.createdAt,
};

export type CrustReadingRow = Awaited<ReturnType<typeof listCrustReadings>>[number];

/** All crust readings of a planting's standing row samples, corrected and withdrawn ones among them, as they came in. */
export async function listCrustReadings(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select(columns)
    .from(crustReading)
    .innerJoin(visit, and(eq(visit.organisationId, crustReading.organisationId), eq(visit.id, crustReading.visitId)))
    .innerJoin(
      rowSample,
      and(eq(rowSample.organisationId, crustReading.organisationId), eq(rowSample.id, crustReading.rowSampleId), isNull(rowSample.removedAt)),
    )
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(crustReading.organisationId, params.organisationId), eq(rowSample.plantingId, params.plantingId)))
    .orderBy(asc(crustReading.createdAt), asc(crustReading.id));
}

/** Adds one; says whether it was new. */
export async function insertCrustReading(tx: Transaction, values: typeof crustReading.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(crustReading).values(values).onConflictDoNothing().returning({ id: crustReading.id });
  return inserted.length === 1;
}

export async function findCrustReading(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(crustReading)
    .innerJoin(visit, and(eq(visit.organisationId, crustReading.organisationId), eq(visit.id, crustReading.visitId)))
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(crustReading.organisationId, params.organisationId), eq(crustReading.id, params.id)));
  return rows[0];
}

/** What was recorded as a correction of one, taken back or not. */
export async function listCorrectionsOfCrustReading(tx: Transaction, params: { organisationId: string; id: string }) {
  return tx
    .select(columns)
    .from(crustReading)
    .innerJoin(visit, and(eq(visit.organisationId, crustReading.organisationId), eq(visit.id, crustReading.visitId)))
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(crustReading.organisationId, params.organisationId), eq(crustReading.replacesId, params.id)));
}
