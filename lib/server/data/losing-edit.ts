import 'server-only';
import type { Transaction } from '@/db/connection';
import { losingEdit } from '@/db/schema/losing-edit';
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
