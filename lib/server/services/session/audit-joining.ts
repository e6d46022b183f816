import 'server-only';
import { v7 } from 'uuid';
import type { Transaction } from '@/db/connection';
import type { Role } from '@/lib/schemas/vocabulary';
import { insertAuditEvent } from '../../data/audit-event';

/** Writes down that somebody came in by a link. It is no operation of theirs, since they were nobody before it; the link stands for the device. */
export async function auditJoining(
  tx: Transaction,
  params: { organisationId: string; personId: string; linkId: string; role: Role; now: Date },
) {
  const { organisationId, personId, linkId, role, now } = params;
  await insertAuditEvent(tx, {
    operation: {
      operationId: v7(),
      organisationId,
      personId,
      deviceId: linkId,
      deviceSequence: 0,
      kind: 'person.joined',
      version: 1,
      thingId: personId,
      baseVersion: null,
      follows: null,
      body: { role },
      occurred: { date: now.toISOString().slice(0, 10), time: null, zone: 'UTC' },
      confirmations: [],
    },
  });
}
