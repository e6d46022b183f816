import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { count } from '@/db/schema/count';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';
import { visit } from '@/db/schema/visit';

const columns = {
  id: count.id,
  rowSampleId: count.rowSampleId,
  visitId: count.visitId,
  visitedOn: visit.visitedOn,
  visitedAt: visit.visitedAt,
  marker: visit.marker,
  personId: visit.personId,
  personName: person.name,
  countedAs: count.countedAs,
  plants: count.plants,
  doubtful: count.doubtful,
  replacesId: count.replacesId,
  originKind: count.originKind,
  importId: count.importId,
  recordedAt: count.createdAt,
};

export type CountRow = Awaited<ReturnType<typeof listCounts>>[number];

/**
 * All counts of a planting's standing row samples, or of one of them, corrected and withdrawn ones among them, as they came
 * in. A write asks for its own row: a season's counts of the planting would make each one dearer than the one before.
 */
export async function listCounts(tx: Transaction, params: { organisationId: string; plantingId: string; rowSampleId?: string }) {
  return tx
    .select(columns)
    .from(count)
    .innerJoin(visit, and(eq(visit.organisationId, count.organisationId), eq(visit.id, count.visitId)))
    .innerJoin(rowSample, and(eq(rowSample.organisationId, count.organisationId), eq(rowSample.id, count.rowSampleId), isNull(rowSample.removedAt)))
    .innerJoin(person, eq(person.id, visit.personId))
    .where(
      and(
        eq(count.organisationId, params.organisationId),
        eq(rowSample.plantingId, params.plantingId),
        params.rowSampleId === undefined ? undefined : eq(count.rowSampleId, params.rowSampleId),
      ),
    )
    .orderBy(asc(count.createdAt), asc(count.id));
}

/** Adds counts; says how many were new. Even the longest file's fit into one statement. */
export async function insertCounts(tx: Transaction, values: (typeof count.$inferInsert)[]): Promise<number> {
  if (values.length === 0) return 0;
  const inserted = await tx.insert(count).values(values).onConflictDoNothing().returning({ id: count.id });
  return inserted.length;
}

export async function findCount(tx: Transaction, params: { organisationId: string; countId: string }) {
  const rows = await tx
    .select({ id: count.id, rowSampleId: count.rowSampleId })
    .from(count)
    .where(and(eq(count.organisationId, params.organisationId), eq(count.id, params.countId)));
  return rows[0];
}
