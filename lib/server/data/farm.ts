import 'server-only';
import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { farm } from '@/db/schema/farm';

const columns = { id: farm.id, name: farm.name, timeZone: farm.timeZone, version: farm.version };

export async function listFarms(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select(columns)
    .from(farm)
    .where(and(eq(farm.organisationId, params.organisationId), isNull(farm.removedAt)))
    .orderBy(asc(farm.name));
}

export async function findFarm(tx: Transaction, params: { organisationId: string; farmId: string }) {
  const rows = await tx
    .select(columns)
    .from(farm)
    .where(and(eq(farm.organisationId, params.organisationId), eq(farm.id, params.farmId), isNull(farm.removedAt)));
  return rows[0];
}

/** Holds a farm against removal while a field is added to it, and the other way round; false where it is gone. */
export async function lockFarm(tx: Transaction, params: { organisationId: string; farmId: string }) {
  const rows = await tx
    .select({ id: farm.id })
    .from(farm)
    .where(and(eq(farm.organisationId, params.organisationId), eq(farm.id, params.farmId), isNull(farm.removedAt)))
    .for('no key update');
  return rows.length === 1;
}

export async function insertFarm(tx: Transaction, values: typeof farm.$inferInsert) {
  const inserted = await tx.insert(farm).values(values).onConflictDoNothing().returning({ id: farm.id });
  return inserted.length === 1;
}

/** Changes a farm that still stands at the version the edit was made on; says whether it did. */
export async function updateFarm(
  tx: Transaction,
  params: { organisationId: string; farmId: string; version: number; name: string; timeZone: string },
) {
  const changed = await tx
    .update(farm)
    .set({ name: params.name, timeZone: params.timeZone, version: params.version + 1 })
    .where(and(eq(farm.organisationId, params.organisationId), eq(farm.id, params.farmId), eq(farm.version, params.version)))
    .returning({ id: farm.id });
  return changed.length === 1;
}

export async function removeFarm(tx: Transaction, params: { organisationId: string; farmId: string; version: number }) {
  const removed = await tx
    .update(farm)
    .set({ removedAt: sql`now()`, version: params.version + 1 })
    .where(and(eq(farm.organisationId, params.organisationId), eq(farm.id, params.farmId), eq(farm.version, params.version)))
    .returning({ id: farm.id });
  return removed.length === 1;
}
