import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { entryRestriction } from '@/db/schema/entry-restriction';
import { person } from '@/db/schema/person';

const columns = {
  id: entryRestriction.id,
  fieldId: entryRestriction.fieldId,
  product: entryRestriction.product,
  endedOn: entryRestriction.endedOn,
  endedAt: entryRestriction.endedAt,
  timeZone: entryRestriction.timeZone,
  hours: entryRestriction.hours,
  replacesId: entryRestriction.replacesId,
  importId: entryRestriction.importId,
  personId: entryRestriction.createdBy,
  personName: person.name,
  recordedAt: entryRestriction.createdAt,
};

export type EntryRestrictionRow = Awaited<ReturnType<typeof listEntryRestrictions>>[number];

/** All entry restrictions of an organisation, corrected and withdrawn ones among them, as they came in. */
export async function listEntryRestrictions(tx: Transaction, params: { organisationId: string }) {
  return tx
    .select(columns)
    .from(entryRestriction)
    .innerJoin(person, eq(person.id, entryRestriction.createdBy))
    .where(eq(entryRestriction.organisationId, params.organisationId))
    .orderBy(asc(entryRestriction.createdAt), asc(entryRestriction.id));
}

/** Adds one; says whether it was new. */
export async function insertEntryRestriction(tx: Transaction, values: typeof entryRestriction.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(entryRestriction).values(values).onConflictDoNothing().returning({ id: entryRestriction.id });
  return inserted.length === 1;
}

export async function findEntryRestriction(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(entryRestriction)
    .innerJoin(person, eq(person.id, entryRestriction.createdBy))
    .where(and(eq(entryRestriction.organisationId, params.organisationId), eq(entryRestriction.id, params.id)));
  return rows[0];
}

/** What was recorded as a correction of one, taken back or not. */
export async function listCorrectionsOfEntryRestriction(tx: Transaction, params: { organisationId: string; id: string }) {
  return tx
    .select(columns)
    .from(entryRestriction)
    .innerJoin(person, eq(person.id, entryRestriction.createdBy))
    .where(and(eq(entryRestriction.organisationId, params.organisationId), eq(entryRestriction.replacesId, params.id)));
}
