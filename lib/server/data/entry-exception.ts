import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { entryException } from '@/db/schema/entry-exception';
import { person } from '@/db/schema/person';

const columns = {
  id: entryException.id,
  restrictionId: entryException.restrictionId,
  enteredOn: entryException.enteredOn,
  exception: entryException.exception,
  equipment: entryException.equipment,
  importId: entryException.importId,
  personId: entryException.createdBy,
  personName: person.name,
  recordedAt: entryException.createdAt,
};

export type EntryExceptionRow = Awaited<ReturnType<typeof listEntryExceptions>>[number];

/** All exceptions from entry restrictions of an organisation, withdrawn ones among them, as they came in. */
export async function listEntryExceptions(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select(columns)
    .from(entryException)
    .innerJoin(person, eq(person.id, entryException.createdBy))
    .where(eq(entryException.organisationId, params.organisationId))
    .orderBy(asc(entryException.createdAt), asc(entryException.id));
}

/** Adds one; says whether it was new. */
export async function insertEntryException(tx: Transaction, values: typeof entryException.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(entryException).values(values).onConflictDoNothing().returning({ id: entryException.id });
  return inserted.length === 1;
}

export async function findEntryException(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(entryException)
    .innerJoin(person, eq(person.id, entryException.createdBy))
    .where(and(eq(entryException.organisationId, params.organisationId), eq(entryException.id, params.id)));
  return rows[0];
}
