import 'server-only';
import { and, desc, eq, lt } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Transaction } from '@/db/connection';
import { auditEvent } from '@/db/schema/audit-event';
import { person } from '@/db/schema/person';
import type { OperationEnvelope } from '@/lib/schemas/operation';

/** Writes the one audit row of an operation; its id is the operation's, so that it can only stand once. */
export async function insertAuditEvent(tx: Transaction, params: { operation: OperationEnvelope; readInBy?: string | null }) {
  const { operation, readInBy = null } = params;
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
    readInBy,
  });
}

const reader = alias(person, 'reader');

/** A page of an organisation's changes, the newest first, with the names of who made them. */
export async function listAuditEvents(tx: Transaction, params: { organisationId: string; most: number; before: string | null }) {
  return tx
    .select({
      id: auditEvent.id,
      kind: auditEvent.kind,
      thingId: auditEvent.thingId,
      body: auditEvent.body,
      deviceId: auditEvent.deviceId,
      recordedAt: auditEvent.recordedAt,
      personName: person.name,
      readInByName: reader.name,
    })
    .from(auditEvent)
    .innerJoin(person, eq(person.id, auditEvent.personId))
    .leftJoin(reader, eq(reader.id, auditEvent.readInBy))
    .where(and(eq(auditEvent.organisationId, params.organisationId), params.before ? lt(auditEvent.recordedAt, params.before) : undefined))
    .orderBy(desc(auditEvent.recordedAt), desc(auditEvent.id))
    .limit(params.most);
}
