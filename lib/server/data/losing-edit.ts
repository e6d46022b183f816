import 'server-only';
import { desc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { losingEdit } from '@/db/schema/losing-edit';
import { person } from '@/db/schema/person';
import type { OperationEnvelope } from '@/lib/schemas/operation';

/** Keeps an edit that came on an older version, as it was sent. Sent again, it stands once. */
export async function insertLosingEdit(tx: Transaction, params: { operation: OperationEnvelope; standingVersion: number }) {
  const { operation } = params;
  await tx
    .insert(losingEdit)
    .values({
      organisationId: operation.organisationId,
      operationId: operation.operationId,
      personId: operation.personId,
      kind: operation.kind,
      thingId: operation.thingId,
      baseVersion: operation.baseVersion ?? 0,
      standingVersion: params.standingVersion,
      body: operation.body,
    })
    .onConflictDoNothing();
}

export async function listLosingEdits(tx: Transaction, params: { organisationId: string; most: number }) {
  return tx
    .select({
      operationId: losingEdit.operationId,
      kind: losingEdit.kind,
      thingId: losingEdit.thingId,
      body: losingEdit.body,
      receivedAt: losingEdit.receivedAt,
      personName: person.name,
    })
    .from(losingEdit)
    .innerJoin(person, eq(person.id, losingEdit.personId))
    .where(eq(losingEdit.organisationId, params.organisationId))
    .orderBy(desc(losingEdit.receivedAt))
    .limit(params.most);
}
