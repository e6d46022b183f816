import 'server-only';
import type { Transaction } from '@/db/connection';
import { auditEvent } from '@/db/schema/audit-event';
import type { OperationEnvelope } from '@/lib/schemas/operation';

/** Writes the one audit row of an operation; its id is the operation's, so that it can only stand once. */
export async function insertAuditEvent(tx: Transaction, params: { operation: OperationEnvelope }) {
  const { operation } = params;
  await tx.insert(auditEvent).values({
    organisationId: operation.organisationId,
    id: operation.operationId,
    personId: operation.personId,
    deviceId: operation.deviceId,
    deviceSequence: operation.deviceSequence,
    kind: operation.kind,
    version: operation.version,
    thingId: operation.thingId,
    body: operation.body,
    occurred: operation.occurred,
    confirmations: operation.confirmations,
  });
}
