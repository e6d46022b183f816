import 'server-only';
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';
import { tapeSheet } from '@/db/schema/tape-sheet';
import { visit } from '@/db/schema/visit';

export type TapeSheetRow = Awaited<ReturnType<typeof listTapeSheets>>[number];

/** All tape sheets of a planting's standing row samples, earlier versions among them, as they came in. */
export async function listTapeSheets(tx: Transaction, params: { organisationId: string; plantingId: string; rowSampleId?: string }) {
  return tx
    .select({
      id: tapeSheet.id,
      rowSampleId: tapeSheet.rowSampleId,
      visitId: tapeSheet.visitId,
      visitedOn: visit.visitedOn,
      visitedAt: visit.visitedAt,
      visitMarker: visit.marker,
      personId: visit.personId,
      personName: person.name,
      tapeUnit: tapeSheet.tapeUnit,
      readFrom: tapeSheet.readFrom,
      zeroAt: tapeSheet.zeroAt,
      segmentStarts: tapeSheet.segmentStarts,
      lengthUnit: rowSample.lengthUnit,
      lengthThousandths: rowSample.lengthThousandths,
      placesTyped: tapeSheet.placesTyped,
      placesThousandths: tapeSheet.placesThousandths,
      markers: tapeSheet.markers,
      kinds: tapeSheet.kinds,
      leafStageTenths: tapeSheet.leafStageTenths,
      replacesId: tapeSheet.replacesId,
      importId: tapeSheet.importId,
      recordedAt: tapeSheet.createdAt,
    })
    .from(tapeSheet)
    .innerJoin(visit, and(eq(visit.organisationId, tapeSheet.organisationId), eq(visit.id, tapeSheet.visitId)))
    .innerJoin(
      rowSample,
      and(eq(rowSample.organisationId, tapeSheet.organisationId), eq(rowSample.id, tapeSheet.rowSampleId), isNull(rowSample.removedAt)),
    )
    .innerJoin(person, eq(person.id, visit.personId))
    .where(
      and(
        eq(tapeSheet.organisationId, params.organisationId),
        eq(rowSample.plantingId, params.plantingId),
        params.rowSampleId === undefined ? undefined : eq(tapeSheet.rowSampleId, params.rowSampleId),
      ),
    )
    .orderBy(asc(tapeSheet.createdAt), asc(tapeSheet.id));
}

/** Adds tape sheets; says how many were new. */
export async function insertTapeSheets(tx: Transaction, values: (typeof tapeSheet.$inferInsert)[]): Promise<number> {
  if (values.length === 0) return 0;
  const inserted = await tx.insert(tapeSheet).values(values).onConflictDoNothing().returning({ id: tapeSheet.id });
  return inserted.length;
}

export async function findTapeSheet(tx: Transaction, params: { organisationId: string; tapeSheetId: string }) {
  const rows = await tx
    .select({ id: tapeSheet.id, rowSampleId: tapeSheet.rowSampleId })
    .from(tapeSheet)
    .where(and(eq(tapeSheet.organisationId, params.organisationId), eq(tapeSheet.id, params.tapeSheetId)));
  return rows[0];
}
