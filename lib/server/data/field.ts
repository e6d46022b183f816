import 'server-only';
import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { field } from '@/db/schema/field';

export type FieldRow = typeof field.$inferSelect;

export async function listFields(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select()
    .from(field)
    .where(and(eq(field.organisationId, params.organisationId), isNull(field.removedAt)))
    .orderBy(asc(field.name));
}

export async function findField(tx: Transaction, params: { organisationId: string; fieldId: string }) {
  const rows = await tx
    .select()
    .from(field)
    .where(and(eq(field.organisationId, params.organisationId), eq(field.id, params.fieldId), isNull(field.removedAt)));
  return rows[0];
}

/** Holds a field against removal while it is planted, and the other way round; false where it is gone. */
export async function lockField(tx: Transaction, params: { organisationId: string; fieldId: string }) {
  const rows = await tx
    .select({ id: field.id })
    .from(field)
    .where(and(eq(field.organisationId, params.organisationId), eq(field.id, params.fieldId), isNull(field.removedAt)))
    .for('no key update');
  return rows.length === 1;
}

export async function insertField(tx: Transaction, values: typeof field.$inferInsert) {
  const inserted = await tx.insert(field).values(values).onConflictDoNothing().returning({ id: field.id });
  return inserted.length === 1;
}

/** Changes a field that still stands at the version the edit was made on; says whether it did. */
export async function updateField(
  tx: Transaction,
  params: { organisationId: string; fieldId: string; version: number; values: Partial<typeof field.$inferInsert> },
) {
  const changed = await tx
    .update(field)
    .set({ ...params.values, version: params.version + 1 })
    .where(and(eq(field.organisationId, params.organisationId), eq(field.id, params.fieldId), eq(field.version, params.version)))
    .returning({ id: field.id });
  return changed.length === 1;
}

export async function removeField(tx: Transaction, params: { organisationId: string; fieldId: string; version: number }) {
  const removed = await tx
    .update(field)
    .set({ removedAt: sql`now()`, version: params.version + 1 })
    .where(and(eq(field.organisationId, params.organisationId), eq(field.id, params.fieldId), eq(field.version, params.version)))
    .returning({ id: field.id });
  return removed.length === 1;
}
