import 'server-only';
import { and, asc, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { setting } from '@/db/schema/setting';

export type SettingRow = typeof setting.$inferSelect;

export async function listSettings(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select()
    .from(setting)
    .where(and(eq(setting.organisationId, params.organisationId), isNull(setting.removedAt)))
    .orderBy(asc(setting.createdAt), asc(setting.id));
}

export async function findSetting(tx: Transaction, params: { organisationId: string; settingId: string }) {
  const rows = await tx
    .select()
    .from(setting)
    .where(and(eq(setting.organisationId, params.organisationId), eq(setting.id, params.settingId), isNull(setting.removedAt)));
  return rows[0];
}

/** The settings that still stand, held against removal until the transaction ends. */
export async function lockSettings(tx: Transaction, params: { organisationId: string; settingIds: readonly string[] }) {
  const rows = await tx
    .select({ id: setting.id })
    .from(setting)
    .where(and(eq(setting.organisationId, params.organisationId), inArray(setting.id, [...params.settingIds]), isNull(setting.removedAt)))
    .orderBy(asc(setting.id))
    .for('share');
  return new Set(rows.map((row) => row.id));
}

/** A setting held for a change, so that no layout is drawn with it in between. */
export async function lockSetting(tx: Transaction, params: { organisationId: string; settingId: string }) {
  const rows = await tx
    .select()
    .from(setting)
    .where(and(eq(setting.organisationId, params.organisationId), eq(setting.id, params.settingId), isNull(setting.removedAt)))
    .for('update');
  return rows[0];
}

/** Lets one transaction at a time give a setting its name, so that two people cannot take the same one at once. */
export async function lockSettingNames(tx: Transaction, params: { organisationId: string }) {
  await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended('setting-names:' || ${params.organisationId}, 0))`);
}

export async function insertSetting(tx: Transaction, values: typeof setting.$inferInsert) {
  const inserted = await tx.insert(setting).values(values).onConflictDoNothing().returning({ id: setting.id });
  return inserted.length === 1;
}

/** Changes a setting that still stands at the version the edit was made on; says whether it did. */
export async function updateSetting(
  tx: Transaction,
  params: { organisationId: string; settingId: string; version: number; values: Partial<typeof setting.$inferInsert> },
) {
  const changed = await tx
    .update(setting)
    .set({ ...params.values, version: params.version + 1 })
    .where(and(eq(setting.organisationId, params.organisationId), eq(setting.id, params.settingId), eq(setting.version, params.version)))
    .returning({ id: setting.id });
  return changed.length === 1;
}

export async function removeSetting(tx: Transaction, params: { organisationId: string; settingId: string; version: number }) {
  const removed = await tx
    .update(setting)
    .set({ removedAt: sql`now()`, version: params.version + 1 })
    .where(and(eq(setting.organisationId, params.organisationId), eq(setting.id, params.settingId), eq(setting.version, params.version)))
    .returning({ id: setting.id });
  return removed.length === 1;
}
