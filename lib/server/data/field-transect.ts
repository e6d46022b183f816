import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { fieldTransect } from '@/db/schema/field-transect';
import { person } from '@/db/schema/person';

const columns = {
  id: fieldTransect.id,
  plantingId: fieldTransect.plantingId,
  stripId: fieldTransect.stripId,
  readOn: fieldTransect.readOn,
  marksRead: fieldTransect.marksRead,
  marksCovered: fieldTransect.marksCovered,
  replacesId: fieldTransect.replacesId,
  importId: fieldTransect.importId,
  personId: fieldTransect.createdBy,
  personName: person.name,
  recordedAt: fieldTransect.createdAt,
};

export type FieldTransectRow = Awaited<ReturnType<typeof listFieldTransects>>[number];

/** All field transects of a planting, corrected and withdrawn ones among them, as they came in. */
export async function listFieldTransects(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select(columns)
    .from(fieldTransect)
    .innerJoin(person, eq(person.id, fieldTransect.createdBy))
    .where(and(eq(fieldTransect.organisationId, params.organisationId), eq(fieldTransect.plantingId, params.plantingId)))
    .orderBy(asc(fieldTransect.createdAt), asc(fieldTransect.id));
}

/** Adds one; says whether it was new. */
export async function insertFieldTransect(tx: Transaction, values: typeof fieldTransect.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(fieldTransect).values(values).onConflictDoNothing().returning({ id: fieldTransect.id });
  return inserted.length === 1;
}

export async function findFieldTransect(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(fieldTransect)
    .innerJoin(person, eq(person.id, fieldTransect.createdBy))
    .where(and(eq(fieldTransect.organisationId, params.organisationId), eq(fieldTransect.id, params.id)));
  return rows[0];
}

/** What was recorded as a correction of one, taken back or not. */
export async function listCorrectionsOfFieldTransect(tx: Transaction, params: { organisationId: string; id: string }) {
  return tx
    .select(columns)
    .from(fieldTransect)
    .innerJoin(person, eq(person.id, fieldTransect.createdBy))
    .where(and(eq(fieldTransect.organisationId, params.organisationId), eq(fieldTransect.replacesId, params.id)));
}
