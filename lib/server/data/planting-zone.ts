import 'server-only';
import { and, asc, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { plantingZone } from '@/db/schema/planting-zone';

export type ZoneRow = typeof plantingZone.$inferSelect;

export async function listZones(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select()
    .from(plantingZone)
    .where(
      and(
        eq(plantingZone.organisationId, params.organisationId),
        eq(plantingZone.plantingId, params.plantingId),
        isNull(plantingZone.removedAt),
      ),
    )
    .orderBy(asc(plantingZone.name));
}

export async function insertZones(tx: Transaction, values: (typeof plantingZone.$inferInsert)[]) {
  if (values.length > 0) await tx.insert(plantingZone).values(values);
}

export async function updateZone(
  tx: Transaction,
  params: { organisationId: string; zoneId: string; values: Partial<typeof plantingZone.$inferInsert> },
) {
  await tx
    .update(plantingZone)
    .set({ ...params.values, version: sql`${plantingZone.version} + 1` })
    .where(and(eq(plantingZone.organisationId, params.organisationId), eq(plantingZone.id, params.zoneId)));
}

export async function removeZones(tx: Transaction, params: { organisationId: string; zoneIds: string[] }) {
  if (params.zoneIds.length === 0) return;
  await tx
    .update(plantingZone)
    .set({ removedAt: sql`now()`, version: sql`${plantingZone.version} + 1` })
    .where(and(eq(plantingZone.organisationId, params.organisationId), inArray(plantingZone.id, params.zoneIds)));
}
