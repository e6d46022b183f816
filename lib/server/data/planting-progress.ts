import 'server-only';
import { and, count as rowsOf, countDistinct, eq, exists, inArray, isNull, max, min, notExists, or, sql } from 'drizzle-orm';
import type { AnyPgColumn } from 'drizzle-orm/pg-core';
import type { Transaction } from '@/db/connection';
import { count } from '@/db/schema/count';
import { decision } from '@/db/schema/decision';
import { replantSheet } from '@/db/schema/replant-sheet';
import { rowSample } from '@/db/schema/row-sample';
import { tapeSheet } from '@/db/schema/tape-sheet';
import { visit } from '@/db/schema/visit';
import { withdrawal } from '@/db/schema/withdrawal';

export type PlantingProgress = {
  plantingId: string;
  rowSamples: number;
  rowSamplesVisited: number;
  firstVisitOn: string | null;
  lastVisitOn: string | null;
};

const noProgress = (plantingId: string): PlantingProgress => ({
  plantingId, rowSamples: 0, rowSamplesVisited: 0, firstVisitOn: null, lastVisitOn: null,
});

/** How far counting has come in each planting. A visit counts while anything that was seen at it still stands. */
export async function listPlantingProgress(
  tx: Transaction,
  params: { organisationId: string; plantingIds: readonly string[] },
): Promise<PlantingProgress[]> {
  if (params.plantingIds.length === 0) return [];
  const stands = (observationId: AnyPgColumn, importId: AnyPgColumn) =>
    notExists(
      tx
        .select({ one: sql`1` })
        .from(withdrawal)
        .where(and(eq(withdrawal.organisationId, params.organisationId), or(eq(withdrawal.targetId, observationId), eq(withdrawal.targetId, importId)))),
    );
  const seenAtVisit = or(
    exists(
      tx.select({ one: sql`1` }).from(count)
        .where(and(eq(count.organisationId, params.organisationId), eq(count.visitId, visit.id), stands(count.id, count.importId))),
    ),
    exists(
      tx.select({ one: sql`1` }).from(tapeSheet)
        .where(and(eq(tapeSheet.organisationId, params.organisationId), eq(tapeSheet.visitId, visit.id), stands(tapeSheet.id, tapeSheet.importId))),
    ),
  );
  const rows = await tx
    .select({
      plantingId: rowSample.plantingId,
      rowSamples: countDistinct(rowSample.id),
      rowSamplesVisited: countDistinct(visit.rowSampleId),
      firstVisitOn: min(visit.visitedOn),
      lastVisitOn: max(visit.visitedOn),
    })
    .from(rowSample)
    .leftJoin(visit, and(eq(visit.organisationId, rowSample.organisationId), eq(visit.rowSampleId, rowSample.id), seenAtVisit))
    .where(
      and(
        eq(rowSample.organisationId, params.organisationId),
        inArray(rowSample.plantingId, [...params.plantingIds]),
        isNull(rowSample.removedAt),
      ),
    )
    .groupBy(rowSample.plantingId);
  return params.plantingIds.map((plantingId) => rows.find((row) => row.plantingId === plantingId) ?? noProgress(plantingId));
}

/** The first visit to any row of a planting, as its day and time stand against planting; a time not noted is taken as noon. */
export async function findFirstVisit(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  const rows = await tx
    .select({ on: visit.visitedOn, at: visit.visitedAt })
    .from(visit)
    .innerJoin(rowSample, and(eq(rowSample.organisationId, visit.organisationId), eq(rowSample.id, visit.rowSampleId)))
    .where(and(eq(visit.organisationId, params.organisationId), eq(rowSample.plantingId, params.plantingId)))
    .orderBy(visit.visitedOn, sql`coalesce(${visit.visitedAt}, '12:00')`)
    .limit(1);
  return rows[0];
}

/** Which rows of a planting's samples have been seen at all, for whoever has to type in the rest. */
export async function listVisitedRowSampleIds(tx: Transaction, params: { organisationId: string; plantingIds: readonly string[] }) {
  if (params.plantingIds.length === 0) return [];
  const rows = await tx
    .selectDistinct({ rowSampleId: visit.rowSampleId })
    .from(visit)
    .innerJoin(rowSample, and(eq(rowSample.organisationId, visit.organisationId), eq(rowSample.id, visit.rowSampleId)))
    .where(and(eq(visit.organisationId, params.organisationId), inArray(rowSample.plantingId, [...params.plantingIds])));
  return rows.map((row) => row.rowSampleId);
}

/** When a keep-or-replant sum was last typed, and when a decision was last signed, by planting. */
export async function listDecisionProgress(tx: Transaction, params: { organisationId: string; plantingIds: readonly string[] }) {
  if (params.plantingIds.length === 0) return [];
  const ids = [...params.plantingIds];
  const sheets = await tx
    .select({ plantingId: replantSheet.plantingId, sheets: rowsOf(), lastAt: max(replantSheet.createdAt) })
    .from(replantSheet)
    .where(and(eq(replantSheet.organisationId, params.organisationId), inArray(replantSheet.plantingId, ids)))
    .groupBy(replantSheet.plantingId);
  const decisions = await tx
    .select({ plantingId: decision.plantingId, decided: decision.decided, signedAt: decision.signedAt, zoneId: decision.zoneId })
    .from(decision)
    .where(and(eq(decision.organisationId, params.organisationId), inArray(decision.plantingId, ids)))
    .orderBy(sql`${decision.signedAt} desc`);
  return ids.map((plantingId) => ({
    plantingId,
    summedUp: sheets.some((sheet) => sheet.plantingId === plantingId),
    newestDecision: decisions.find((each) => each.plantingId === plantingId),
  }));
}
