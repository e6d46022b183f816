import 'server-only';
import { and, asc, desc, eq, isNull, sql } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/connection';
import { auditEvent } from '@/db/schema/audit-event';
import { auditSeal } from '@/db/schema/audit-seal';

/** The organisations that have events no seal covers. A function of the database answers, since the role sees one tenant at a time. */
export async function listOrganisationsToSeal(db: Database): Promise<string[]> {
  const found = await db.execute<{ id: string }>(sql`select organisations_with_unsealed_events() as id`);
  return found.rows.map((row) => row.id);
}

/** Holds off a second sealer of the same organisation until this transaction ends. */
export async function lockSeals(tx: Transaction, params: { organisationId: string }) {
  await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended('seal:' || ${params.organisationId}, 0))`);
}

export async function findLastSeal(tx: Transaction, params: { organisationId: string }) {
  const rows = await tx
    .select({ place: auditSeal.place, chainHash: auditSeal.chainHash })
    .from(auditSeal)
    .where(eq(auditSeal.organisationId, params.organisationId))
    .orderBy(desc(auditSeal.place))
    .limit(1);
  return rows[0];
}

const eventColumns = {
  id: auditEvent.id,
  personId: auditEvent.personId,
  deviceId: auditEvent.deviceId,
  deviceSequence: auditEvent.deviceSequence,
  kind: auditEvent.kind,
  version: auditEvent.version,
  thingId: auditEvent.thingId,
  body: auditEvent.body,
  occurred: auditEvent.occurred,
  confirmations: auditEvent.confirmations,
  readInBy: auditEvent.readInBy,
  recordedAt: auditEvent.recordedAt,
};

export async function listUnsealedEvents(tx: Transaction, params: { organisationId: string; most: number }) {
  return tx
    .select(eventColumns)
    .from(auditEvent)
    .leftJoin(auditSeal, and(eq(auditSeal.organisationId, auditEvent.organisationId), eq(auditSeal.eventId, auditEvent.id)))
    .where(and(eq(auditEvent.organisationId, params.organisationId), isNull(auditSeal.eventId)))
    .orderBy(asc(auditEvent.recordedAt), asc(auditEvent.id))
    .limit(params.most);
}

/** The sealed events in the order of the chain, to check it. */
export async function listSealedEvents(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select({ ...eventColumns, place: auditSeal.place, chainHash: auditSeal.chainHash })
    .from(auditSeal)
    .innerJoin(auditEvent, and(eq(auditEvent.organisationId, auditSeal.organisationId), eq(auditEvent.id, auditSeal.eventId)))
    .where(eq(auditSeal.organisationId, params.organisationId))
    .orderBy(asc(auditSeal.place));
}

export async function insertSeals(
  tx: Transaction,
  params: { organisationId: string; seals: { place: number; eventId: string; chainHash: string }[] },
) {
  if (params.seals.length === 0) return;
  await tx.insert(auditSeal).values(params.seals.map((seal) => ({ organisationId: params.organisationId, ...seal })));
}
