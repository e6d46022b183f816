import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { decision } from '@/db/schema/decision';
import { person } from '@/db/schema/person';

export type DecisionRow = Awaited<ReturnType<typeof listDecisions>>[number];

/** All signed decisions of a planting, those of its zones among them, newest first. */
export async function listDecisions(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select({
      id: decision.id,
      zoneId: decision.zoneId,
      recommended: decision.recommended,
      decided: decision.decided,
      signedName: decision.signedName,
      frozen: decision.frozen,
      basisHash: decision.basisHash,
      personName: person.name,
    })
    .from(decision)
    .innerJoin(person, eq(person.id, decision.createdBy))
    .where(
      and(eq(decision.organisationId, params.organisationId), eq(decision.plantingId, params.plantingId)),
    )
    .orderBy(desc(decision.signedAt), desc(decision.id));
}

export async function insertDecision(tx: Transaction, values: typeof decision.$inferInsert) {
  const inserted = await tx
    .insert(decision)
    .values(values)
    .onConflictDoNothing()
    .returning({ id: decision.id });
  return inserted.length === 1;
}
