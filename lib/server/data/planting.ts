import 'server-only';
import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { planting } from '@/db/schema/planting';

export type PlantingRow = typeof planting.$inferSelect;

export async function listPlantings(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select()
    .from(planting)
    .where(and(eq(planting.organisationId, params.organisationId), isNull(planting.removedAt)))
    .orderBy(desc(planting.plantedOn));
}

export async function findPlanting(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  const rows = await tx
    .select()
    .from(planting)
    .where(
      and(eq(planting.organisationId, params.organisationId), eq(planting.id, params.plantingId), isNull(planting.removedAt)),
    );
  return rows[0];
}

/** Holds a planting against other changes of its plan until the transaction ends; false where it is gone. */
export async function lockPlanting(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  const rows = await tx
    .select({ id: planting.id })
    .from(planting)
    .where(and(eq(planting.organisationId, params.organisationId), eq(planting.id, params.plantingId), isNull(planting.removedAt)))
    .for('no key update');
  return rows.length === 1;
}

export async function insertPlanting(tx: Transaction, values: typeof planting.$inferInsert) {
  const inserted = await tx.insert(planting).values(values).onConflictDoNothing().returning({ id: planting.id });
  return inserted.length === 1;
}

/** Changes a planting that still stands at the version the edit was made on; says whether it did. */
export async function updatePlanting(
  tx: Transaction,
  params: { organisationId: string; plantingId: string; version: number; values: Partial<typeof planting.$inferInsert> },
) {
  const changed = await tx
    .update(planting)
    .set({ ...params.values, version: params.version + 1 })
    .where(
      and(
        eq(planting.organisationId, params.organisationId),
        eq(planting.id, params.plantingId),
        eq(planting.version, params.version),
      ),
    )
    .returning({ id: planting.id });
  return changed.length === 1;
}

export async function removePlanting(tx: Transaction, params: { organisationId: string; plantingId: string; version: number }) {
  const removed = await tx
    .update(planting)
    .set({ removedAt: sql`now()`, version: params.version + 1 })
    .where(
      and(
        eq(planting.organisationId, params.organisationId),
        eq(planting.id, params.plantingId),
        eq(planting.version, params.version),
      ),
    )
    .returning({ id: planting.id });
  return removed.length === 1;
}
