import 'server-only';
import { eq } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/connection';
import { person } from '@/db/schema/person';
import type { UnitSystem } from '@/lib/schemas/vocabulary';

export async function findPersonByEmail(db: Database | Transaction, params: { email: string }) {
  const rows = await db
    .select({ id: person.id, name: person.name, passwordHash: person.passwordHash, disabledAt: person.disabledAt })
    .from(person)
    .where(eq(person.email, params.email));
  return rows[0];
}

export async function findPasswordHash(db: Database | Transaction, params: { personId: string }) {
  const rows = await db.select({ passwordHash: person.passwordHash }).from(person).where(eq(person.id, params.personId));
  return rows[0]?.passwordHash;
}

export async function insertPerson(tx: Transaction, values: { id: string; email: string; name: string; passwordHash: string }) {
  await tx.insert(person).values(values);
}

export async function updatePassword(tx: Transaction, params: { personId: string; passwordHash: string }) {
  await tx.update(person).set({ passwordHash: params.passwordHash }).where(eq(person.id, params.personId));
}

export async function updateUnits(db: Database, params: { personId: string; units: UnitSystem }) {
  await db.update(person).set({ units: params.units }).where(eq(person.id, params.personId));
}

/** Whether anybody has an account here at all. */
export async function hasPeople(db: Database): Promise<boolean> {
  const rows = await db.select({ id: person.id }).from(person).limit(1);
  return rows.length > 0;
}
