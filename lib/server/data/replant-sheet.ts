import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { person } from '@/db/schema/person';
import { replantSheet } from '@/db/schema/replant-sheet';

export type ReplantSheetRow = Awaited<ReturnType<typeof listReplantSheets>>[number];

/** All versions of a planting's sums, those of its zones among them, newest first. */
export async function listReplantSheets(
  tx: Transaction,
  params: { organisationId: string; plantingId: string },
) {
  return tx
    .select({
      id: replantSheet.id,
      zoneId: replantSheet.zoneId,
      inputs: replantSheet.inputs,
      savedAt: replantSheet.createdAt,
      personName: person.name,
    })
    .from(replantSheet)
    .innerJoin(person, eq(person.id, replantSheet.createdBy))
    .where(
      and(
        eq(replantSheet.organisationId, params.organisationId),
        eq(replantSheet.plantingId, params.plantingId),
      ),
    )
    .orderBy(desc(replantSheet.createdAt), desc(replantSheet.id));
}

export async function insertReplantSheet(tx: Transaction, values: typeof replantSheet.$inferInsert) {
  const inserted = await tx
    .insert(replantSheet)
    .values(values)
    .onConflictDoNothing()
    .returning({ id: replantSheet.id });
  return inserted.length === 1;
}
