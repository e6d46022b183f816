import 'server-only';
import { and, eq, min } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { rowSample } from '@/db/schema/row-sample';
import { visit } from '@/db/schema/visit';

/** Adds a visit once; one that stands already under this id stays as it is. */
export async function insertVisitOnce(tx: Transaction, values: typeof visit.$inferInsert) {
  await tx.insert(visit).values(values).onConflictDoNothing();
}

export async function insertVisits(tx: Transaction, values: (typeof visit.$inferInsert)[]) {
  if (values.length > 0) await tx.insert(visit).values(values);
}

export async function findVisit(tx: Transaction, params: { organisationId: string; visitId: string }) {
  const rows = await tx
    .select()
    .from(visit)
    .where(and(eq(visit.organisationId, params.organisationId), eq(visit.id, params.visitId)));
  return rows[0];
}

/** The day of the first visit to any row sample of a planting; undefined where nobody has been there. */
export async function findFirstVisitDay(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  const rows = await tx
    .select({ day: min(visit.visitedOn) })
    .from(visit)
    .innerJoin(rowSample, and(eq(rowSample.organisationId, visit.organisationId), eq(rowSample.id, visit.rowSampleId)))
    .where(and(eq(visit.organisationId, params.organisationId), eq(rowSample.plantingId, params.plantingId)));
  return rows[0]?.day ?? undefined;
}

/** Whether anybody has been at a row sample. */
export async function hasVisits(tx: Transaction, params: { organisationId: string; rowSampleId: string }) {
  const rows = await tx
    .select({ id: visit.id })
    .from(visit)
    .where(and(eq(visit.organisationId, params.organisationId), eq(visit.rowSampleId, params.rowSampleId)))
    .limit(1);
  return rows.length > 0;
}
