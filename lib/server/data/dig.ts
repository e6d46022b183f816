import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { dig } from '@/db/schema/dig';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';
import { visit } from '@/db/schema/visit';

const columns = {
  id: dig.id,
  rowSampleId: dig.rowSampleId,
  visitId: dig.visitId,
  visitedOn: visit.visitedOn,
  visitedAt: visit.visitedAt,
  visitMarker: visit.marker,
  personId: visit.personId,
  personName: person.name,
  pairId: dig.pairId,
  plant: dig.plant,
  dugIn: dig.dugIn,
  placeTyped: dig.placeTyped,
  depthTyped: dig.depthTyped,
  depthUnit: dig.depthUnit,
  depthThousandths: dig.depthThousandths,
  residue: dig.residue,
  moisture: dig.moisture,
  crust: dig.crust,
  found: dig.found,
  note: dig.note,
  replacesId: dig.replacesId,
  importId: dig.importId,
  recordedAt: dig.createdAt,
};

export type DigRow = Awaited<ReturnType<typeof listDigs>>[number];

/** All digs of a planting's standing row samples, corrected and withdrawn ones among them, as they came in. */
export async function listDigs(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select(columns)
    .from(dig)
    .innerJoin(visit, and(eq(visit.organisationId, dig.organisationId), eq(visit.id, dig.visitId)))
    .innerJoin(
      rowSample,
      and(eq(rowSample.organisationId, dig.organisationId), eq(rowSample.id, dig.rowSampleId), isNull(rowSample.removedAt)),
    )
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(dig.organisationId, params.organisationId), eq(rowSample.plantingId, params.plantingId)))
    .orderBy(asc(dig.createdAt), asc(dig.id));
}

/** Adds one; says whether it was new. */
export async function insertDig(tx: Transaction, values: typeof dig.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(dig).values(values).onConflictDoNothing().returning({ id: dig.id });
  return inserted.length === 1;
}

export async function findDig(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(dig)
    .innerJoin(visit, and(eq(visit.organisationId, dig.organisationId), eq(visit.id, dig.visitId)))
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(dig.organisationId, params.organisationId), eq(dig.id, params.id)));
  return rows[0];
}

/** What was recorded as a correction of one, taken back or not. */
export async function listCorrectionsOfDig(tx: Transaction, params: { organisationId: string; id: string }) {
  return tx
    .select(columns)
    .from(dig)
    .innerJoin(visit, and(eq(visit.organisationId, dig.organisationId), eq(visit.id, dig.visitId)))
    .innerJoin(person, eq(person.id, visit.personId))
    .where(and(eq(dig.organisationId, params.organisationId), eq(dig.replacesId, params.id)));
}
