import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { inTransaction, type Database } from '@/db/connection';
import { allOperations } from '@/lib/server/operations/all-operations';
import { applyOperation } from '@/lib/server/operations/apply-operation';
import { withActor } from '@/lib/server/operations/actor-context';
import { hashOfSecret, newSecret } from '@/lib/server/secret';
import { insertLink } from '@/lib/server/data/one-time-link';
import { openLink } from '@/lib/server/services/session/open-link';

const now = () => new Date();
export const caller = { socketAddress: '192.0.2.7' };

/** The password everybody in these tests has, unless a test gives another. */
export const password = 'a plain test sentence';

/** Makes an organisation the way it is made for real: a first owner opens a one-time link. */
export async function firstOwner(db: Database, email = `${v7()}@example.test`) {
  const secret = newSecret();
  await insertLink(db, { id: v7(), secretHash: hashOfSecret(secret), purpose: 'first-owner', expiresAt: new Date(Date.now() + 60_000).toISOString() });
  const personId = await openLink({ secret, name: 'Test Owner', email, organisationName: 'Test account', timeZone: 'America/Chicago', password }, caller);
  const found = await inTransaction(db, async (tx) => {
    await tx.execute(sql`select set_config('app.person_id', ${personId}, true)`);
    return tx.execute<{ organisation_id: string }>(sql`select organisation_id from membership where person_id = ${personId}`);
  });
  return { personId, email, organisationId: found.rows[0]?.organisation_id ?? '' };
}

let sequence = 0;

/** Sends one operation as a person, with an id of the test's choosing where it is sent twice. */
export function send(
  db: Database,
  who: { personId: string; organisationId: string },
  kind: string,
  thingId: string,
  body: Record<string, unknown>,
  more: Record<string, unknown> = {},
) {
  sequence += 1;
  return applyOperation(
    db,
    {
      organisationId: who.organisationId,
      sender: { personId: who.personId, now, originKind: 'form' },
      handlerOf: (each, version) => allOperations.find((handler) => handler.kind === each && handler.version === version),
    },
    {
      operationId: v7(),
      organisationId: who.organisationId,
      personId: who.personId,
      deviceId: v7(),
      deviceSequence: sequence,
      kind,
      version: 1,
      thingId,
      baseVersion: null,
      follows: null,
      body,
      occurred: { date: '2026-05-18', time: null, zone: 'America/Chicago' },
      confirmations: [],
      ...more,
    },
  );
}

export const secretOf = (answer: { result?: Record<string, unknown> | undefined }) => String(answer.result?.path).replace('/link/', '');

export const roleOf = (db: Database, who: { personId: string; organisationId: string }) =>
  withActor(db, { ...who, now }, async ({ actor }) => ({ role: actor.role, farmIds: actor.farmIds }));
