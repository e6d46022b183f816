import 'server-only';
import { and, eq, isNull, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { study } from '@/db/schema/study';
import { trial } from '@/db/schema/trial';

export type TrialRow = typeof trial.$inferSelect;

/** The standing trial of a planting; one laid out again removes the one before it. */
export async function findTrialOfPlanting(tx: Transaction, params: { organisationId: string; plantingId: string }) {
  const rows = await tx
    .select()
    .from(trial)
    .where(and(eq(trial.organisationId, params.organisationId), eq(trial.plantingId, params.plantingId), isNull(trial.removedAt)));
  return rows[0];
}

export async function listTrials(tx: Transaction, params: { organisationId: string }) {
  return tx.select().from(trial).where(and(eq(trial.organisationId, params.organisationId), isNull(trial.removedAt)));
}

export async function findTrial(tx: Transaction, params: { organisationId: string; trialId: string }) {
  const rows = await tx
    .select()
    .from(trial)
    .where(and(eq(trial.organisationId, params.organisationId), eq(trial.id, params.trialId), isNull(trial.removedAt)));
  return rows[0];
}

export async function findStudy(tx: Transaction, params: { organisationId: string; studyId: string }) {
  const rows = await tx
    .select({ id: study.id, name: study.name })
    .from(study)
    .where(and(eq(study.organisationId, params.organisationId), eq(study.id, params.studyId)));
  return rows[0];
}

export async function insertTrial(tx: Transaction, values: typeof trial.$inferInsert) {
  await tx.insert(trial).values(values);
}

export async function insertStudyOnce(tx: Transaction, values: typeof study.$inferInsert) {
  await tx.insert(study).values(values).onConflictDoNothing();
}

export async function removeTrial(tx: Transaction, params: { organisationId: string; trialId: string }) {
  await tx
    .update(trial)
    .set({ removedAt: sql`now()`, version: sql`${trial.version} + 1` })
    .where(and(eq(trial.organisationId, params.organisationId), eq(trial.id, params.trialId)));
}

export async function lockTrialRow(
  tx: Transaction,
  params: { organisationId: string; trialId: string; version: number; personId: string; at: string },
) {
  const locked = await tx
    .update(trial)
    .set({ lockedAt: params.at, lockedBy: params.personId, version: params.version + 1 })
    .where(and(eq(trial.organisationId, params.organisationId), eq(trial.id, params.trialId), eq(trial.version, params.version)))
    .returning({ id: trial.id });
  return locked.length === 1;
}
