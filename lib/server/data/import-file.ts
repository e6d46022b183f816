import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { importFile } from '@/db/schema/import-file';
import { person } from '@/db/schema/person';

export async function listImportFiles(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select({
      id: importFile.id,
      kind: importFile.kind,
      fileName: importFile.fileName,
      lines: importFile.lines,
      records: importFile.records,
      createdAt: importFile.createdAt,
      personName: person.name,
    })
    .from(importFile)
    .innerJoin(person, eq(person.id, importFile.createdBy))
    .where(and(eq(importFile.organisationId, params.organisationId), eq(importFile.plantingId, params.plantingId)))
    .orderBy(desc(importFile.createdAt));
}

export async function findImportFile(tx: Transaction, params: { organisationId: string; importId: string }) {
  const rows = await tx
    .select({
      id: importFile.id,
      plantingId: importFile.plantingId,
      kind: importFile.kind,
      fileName: importFile.fileName,
      lines: importFile.lines,
      records: importFile.records,
    })
    .from(importFile)
    .where(and(eq(importFile.organisationId, params.organisationId), eq(importFile.id, params.importId)));
  return rows[0];
}

export async function insertImportFile(tx: Transaction, values: typeof importFile.$inferInsert) {
  await tx.insert(importFile).values(values);
}
