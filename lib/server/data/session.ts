import 'server-only';
import { and, eq, gt, isNull, sql } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/connection';
import { person } from '@/db/schema/person';
import { session } from '@/db/schema/session';

export async function insertSession(
  db: Database | Transaction,
  values: { secretHash: string; personId: string; expiresAt: string },
) {
  await db.insert(session).values(values);
}

/** The person behind a session that is neither revoked nor too old, and whose account is not disabled. */
export async function findSessionPerson(db: Database, params: { secretHash: string; now: string }) {
  const rows = await db
    .select({ personId: person.id, name: person.name, email: person.email, units: person.units, lastSeenAt: session.lastSeenAt })
    .from(session)
    .innerJoin(person, eq(person.id, session.personId))
    .where(
      and(
        eq(session.secretHash, params.secretHash),
        isNull(session.revokedAt),
        gt(session.expiresAt, params.now),
        isNull(person.disabledAt),
      ),
    );
  return rows[0];
}

export async function touchSession(db: Database, params: { secretHash: string; expiresAt: string }) {
  await db.update(session).set({ lastSeenAt: sql`now()`, expiresAt: params.expiresAt }).where(eq(session.secretHash, params.secretHash));
}

export async function revokeSession(db: Database | Transaction, params: { secretHash: string }) {
  await db.update(session).set({ revokedAt: sql`now()` }).where(and(eq(session.secretHash, params.secretHash), isNull(session.revokedAt)));
}

export async function revokeSessionsOfPerson(db: Database | Transaction, params: { personId: string }) {
  await db.update(session).set({ revokedAt: sql`now()` }).where(and(eq(session.personId, params.personId), isNull(session.revokedAt)));
}
