import 'server-only';
import { and, asc, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { rowSample } from '@/db/schema/row-sample';

export type RowSampleRow = typeof rowSample.$inferSelect;

export async function listRowSamples(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select()
    .from(rowSample)
    .where(
      and(
        eq(rowSample.organisationId, params.organisationId),
        eq(rowSample.plantingId, params.plantingId),
        isNull(rowSample.removedAt),
      ),
    )
    .orderBy(asc(rowSample.id));
}

export async function findRowSample(tx: Transaction, params: { organisationId: string; rowSampleId: string }) {
  const rows = await tx
    .select()
    .from(rowSample)
    .where(
      and(eq(rowSample.organisationId, params.organisationId), eq(rowSample.id, params.rowSampleId), isNull(rowSample.removedAt)),
    );
  return rows[0];
}

/** Lets one transaction at a time add observations to these row samples, so that each is checked against all that stand. */
export async function lockRowSamples(tx: Transaction, params: { organisationId: string; rowSampleIds: readonly string[] }) {
  if (params.rowSampleIds.length === 0) return;
  await tx
    .select({ id: rowSample.id })
    .from(rowSample)
    .where(and(eq(rowSample.organisationId, params.organisationId), inArray(rowSample.id, [...params.rowSampleIds])))
    .orderBy(asc(rowSample.id))
    .for('update');
}

export async function insertRowSamples(tx: Transaction, values: (typeof rowSample.$inferInsert)[]) {
  const inserted = await tx.insert(rowSample).values(values).returning({ id: rowSample.id });
  return inserted.length;
}

/** Changes a row sample that still stands at the version the edit was made on; says whether it did. */
export async function updateRowSample(
  tx: Transaction,
  params: { organisationId: string; rowSampleId: string; version: number; values: Partial<typeof rowSample.$inferInsert> },
) {
  const changed = await tx
    .update(rowSample)
    .set({ ...params.values, version: params.version + 1 })
    .where(
      and(
        eq(rowSample.organisationId, params.organisationId),
        eq(rowSample.id, params.rowSampleId),
        eq(rowSample.version, params.version),
      ),
    )
    .returning({ id: rowSample.id });
  return changed.length === 1;
}

export async function removeRowSample(tx: Transaction, params: { organisationId: string; rowSampleId: string; version: number }) {
  const removed = await tx
    .update(rowSample)
    .set({ removedAt: sql`now()`, version: params.version + 1 })
    .where(
      and(
        eq(rowSample.organisationId, params.organisationId),
        eq(rowSample.id, params.rowSampleId),
        eq(rowSample.version, params.version),
      ),
    )
    .returning({ id: rowSample.id });
  return removed.length === 1;
}
