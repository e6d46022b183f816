import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { markerTally } from '@/db/schema/marker-tally';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';

const columns = {
  id: markerTally.id,
  rowSampleId: markerTally.rowSampleId,
  happenedOn: markerTally.happenedOn,
  event: markerTally.event,
  markers: markerTally.markers,
  replacesId: markerTally.replacesId,
  importId: markerTally.importId,
  personId: markerTally.createdBy,
  personName: person.name,
  recordedAt: markerTally.createdAt,
};

export type MarkerTallyRow = Awaited<ReturnType<typeof listMarkerTallies>>[number];

/** All tallies of markers of a planting's standing row samples, corrected and withdrawn ones among them, as they came in. */
export async function listMarkerTallies(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select(columns)
    .from(markerTally)
    .innerJoin(rowSample, and(eq(rowSample.organisationId, markerTally.organisationId), eq(rowSample.id, markerTally.rowSampleId), isNull(rowSample.removedAt)))
    .innerJoin(person, eq(person.id, markerTally.createdBy))
    .where(and(eq(markerTally.organisationId, params.organisationId), eq(rowSample.plantingId, params.plantingId)))
    .orderBy(asc(markerTally.createdAt), asc(markerTally.id));
}

/** Adds one; says whether it was new. */
export async function insertMarkerTally(tx: Transaction, values: typeof markerTally.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(markerTally).values(values).onConflictDoNothing().returning({ id: markerTally.id });
  return inserted.length === 1;
}

export async function findMarkerTally(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(markerTally)
    .innerJoin(person, eq(person.id, markerTally.createdBy))
    .where(and(eq(markerTally.organisationId, params.organisationId), eq(markerTally.id, params.id)));
  return rows[0];
}

/** What was recorded as a correction of one, taken back or not. */
export async function listCorrectionsOfMarkerTally(tx: Transaction, params: { organisationId: string; id: string }) {
  return tx
    .select(columns)
    .from(markerTally)
    .innerJoin(person, eq(person.id, markerTally.createdBy))
    .where(and(eq(markerTally.organisationId, params.organisationId), eq(markerTally.replacesId, params.id)));
}
