import 'server-only';
import { and, asc, eq, isNotNull, isNull, or } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { note } from '@/db/schema/note';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';

const columns = {
  id: note.id,
  plantingId: note.plantingId,
  rowSampleId: note.rowSampleId,
  notedOn: note.notedOn,
  notedAt: note.notedAt,
  text: note.text,
  importId: note.importId,
  personId: note.createdBy,
  personName: person.name,
  recordedAt: note.createdAt,
};

export type NoteRow = Awaited<ReturnType<typeof listNotes>>[number];

/** All notes of a planting, withdrawn ones among them, as they came in. */
export async function listNotes(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select(columns)
    .from(note)
    .leftJoin(rowSample, and(eq(rowSample.organisationId, note.organisationId), eq(rowSample.id, note.rowSampleId), isNull(rowSample.removedAt)))
    .innerJoin(person, eq(person.id, note.createdBy))
    .where(and(
        eq(note.organisationId, params.organisationId),
        eq(note.plantingId, params.plantingId),
        // What was seen at a row sample goes with it.
        or(isNull(note.rowSampleId), isNotNull(rowSample.id)),
      ))
    .orderBy(asc(note.createdAt), asc(note.id));
}

/** Adds one; says whether it was new. */
export async function insertNote(tx: Transaction, values: typeof note.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(note).values(values).onConflictDoNothing().returning({ id: note.id });
  return inserted.length === 1;
}

export async function findNote(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(note)
    .innerJoin(person, eq(person.id, note.createdBy))
    .where(and(eq(note.organisationId, params.organisationId), eq(note.id, params.id)));
  return rows[0];
}
