import 'server-only';
import { and, asc, eq, isNotNull, isNull, or } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { condition } from '@/db/schema/condition';
import { person } from '@/db/schema/person';
import { rowSample } from '@/db/schema/row-sample';

const columns = {
  id: condition.id,
  plantingId: condition.plantingId,
  rowSampleId: condition.rowSampleId,
  observedOn: condition.observedOn,
  observedAt: condition.observedAt,
  growthStage: condition.growthStage,
  soilTemperatureTyped: condition.soilTemperatureTyped,
  soilTemperatureUnit: condition.soilTemperatureUnit,
  soilTemperatureThousandths: condition.soilTemperatureThousandths,
  soilMoisture: condition.soilMoisture,
  replacesId: condition.replacesId,
  importId: condition.importId,
  personId: condition.createdBy,
  personName: person.name,
  recordedAt: condition.createdAt,
};

export type ConditionRow = Awaited<ReturnType<typeof listConditions>>[number];

/** All conditions of a planting, corrected and withdrawn ones among them, as they came in. */
export async function listConditions(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  return tx
    .select(columns)
    .from(condition)
    .leftJoin(rowSample, and(eq(rowSample.organisationId, condition.organisationId), eq(rowSample.id, condition.rowSampleId), isNull(rowSample.removedAt)))
    .innerJoin(person, eq(person.id, condition.createdBy))
    .where(and(
        eq(condition.organisationId, params.organisationId),
        eq(condition.plantingId, params.plantingId),
        // What was seen at a row sample goes with it.
        or(isNull(condition.rowSampleId), isNotNull(rowSample.id)),
      ))
    .orderBy(asc(condition.createdAt), asc(condition.id));
}

/** Adds one; says whether it was new. */
export async function insertCondition(tx: Transaction, values: typeof condition.$inferInsert): Promise<boolean> {
  const inserted = await tx.insert(condition).values(values).onConflictDoNothing().returning({ id: condition.id });
  return inserted.length === 1;
}

export async function findCondition(tx: Transaction, params: { organisationId: string; id: string }) {
  const rows = await tx
    .select(columns)
    .from(condition)
    .innerJoin(person, eq(person.id, condition.createdBy))
    .where(and(eq(condition.organisationId, params.organisationId), eq(condition.id, params.id)));
  return rows[0];
}

/** What was recorded as a correction of one, taken back or not. */
export async function listCorrectionsOfCondition(tx: Transaction, params: { organisationId: string; id: string }) {
  return tx
    .select(columns)
    .from(condition)
    .innerJoin(person, eq(person.id, condition.createdBy))
    .where(and(eq(condition.organisationId, params.organisationId), eq(condition.replacesId, params.id)));
}
