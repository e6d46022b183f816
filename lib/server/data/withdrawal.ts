import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { withdrawal } from '@/db/schema/withdrawal';

/** The ids of all that was taken back in an organisation: observations, and imports with all they brought. */
export async function listWithdrawnIds(tx: Transaction, params: { organisationId: string }): Promise<Set<string>> {
  const rows = await tx.select({ id: withdrawal.targetId }).from(withdrawal).where(eq(withdrawal.organisationId, params.organisationId));
  return new Set(rows.map((row) => row.id));
}

/** Adds a withdrawal; says whether it was new. */
export async function insertWithdrawal(tx: Transaction, values: typeof withdrawal.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(withdrawal).values(values).onConflictDoNothing().returning({ id: withdrawal.id });
  return inserted.length === 1;
}

/** Which of these were taken back by themselves. */
export async function listWithdrawnAmong(tx: Transaction, params: { organisationId: string; ids: readonly string[] }): Promise<Set<string>> {
  if (params.ids.length === 0) return new Set();
  const rows = await tx
    .select({ id: withdrawal.targetId })
    .from(withdrawal)
    .where(and(eq(withdrawal.organisationId, params.organisationId), inArray(withdrawal.targetId, [...params.ids])));
  return new Set(rows.map((row) => row.id));
}
