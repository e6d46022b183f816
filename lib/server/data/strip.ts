import 'server-only';
import { and, asc, desc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/connection';
import { block } from '@/db/schema/block';
import { strip } from '@/db/schema/strip';
import { stripAsPlanted } from '@/db/schema/strip-as-planted';
import { trial } from '@/db/schema/trial';

export type ListedStrip = {
  id: string;
  blockId: string;
  blockNumber: number;
  number: number;
  plannedSettingId: string;
  /** What was really run; null where nobody has said so yet, and its setting null where the strip was lost. */
  asPlanted: { settingId: string | null; reason: string | null } | null;
};

/** The strips of a trial in field order, with the newest word on what was really run. */
export async function listStrips(tx: Transaction, params: { organisationId: string; trialId: string }): Promise<ListedStrip[]> {
  const strips = await tx
    .select({
      id: strip.id,
      blockId: strip.blockId,
      blockNumber: block.number,
      number: strip.number,
      plannedSettingId: strip.plannedSettingId,
    })
    .from(strip)
    .innerJoin(block, and(eq(block.organisationId, strip.organisationId), eq(block.id, strip.blockId)))
    .where(and(eq(strip.organisationId, params.organisationId), eq(block.trialId, params.trialId)))
    .orderBy(asc(block.number), asc(strip.number));
  const planted = await tx
    .select({ stripId: stripAsPlanted.stripId, settingId: stripAsPlanted.settingId, reason: stripAsPlanted.reason })
    .from(stripAsPlanted)
    .innerJoin(strip, and(eq(strip.organisationId, stripAsPlanted.organisationId), eq(strip.id, stripAsPlanted.stripId)))
    .innerJoin(block, and(eq(block.organisationId, strip.organisationId), eq(block.id, strip.blockId)))
    .where(and(eq(stripAsPlanted.organisationId, params.organisationId), eq(block.trialId, params.trialId)))
    .orderBy(desc(stripAsPlanted.createdAt), desc(stripAsPlanted.id));
  return strips.map((each) => {
    const newest = planted.find((row) => row.stripId === each.id);
    return { ...each, asPlanted: newest ? { settingId: newest.settingId, reason: newest.reason } : null };
  });
}

export async function insertBlocks(tx: Transaction, values: (typeof block.$inferInsert)[]) {
  await tx.insert(block).values(values);
}

export async function insertStrips(tx: Transaction, values: (typeof strip.$inferInsert)[]) {
  await tx.insert(strip).values(values);
}

export async function insertStripsAsPlanted(tx: Transaction, values: (typeof stripAsPlanted.$inferInsert)[]) {
  await tx.insert(stripAsPlanted).values(values);
}

/** The settings that standing trials drew or planted, each with whether one of those trials is locked. */
export async function listSettingsInUse(tx: Transaction, params: { organisationId: string }) {
  const rows = await tx
    .select({ planned: strip.plannedSettingId, planted: stripAsPlanted.settingId, lockedAt: trial.lockedAt, plantingId: trial.plantingId })
    .from(strip)
    .innerJoin(block, and(eq(block.organisationId, strip.organisationId), eq(block.id, strip.blockId)))
    .innerJoin(trial, and(eq(trial.organisationId, block.organisationId), eq(trial.id, block.trialId), isNull(trial.removedAt)))
    .leftJoin(stripAsPlanted, and(eq(stripAsPlanted.organisationId, strip.organisationId), eq(stripAsPlanted.stripId, strip.id)))
    .where(eq(strip.organisationId, params.organisationId));
  const used = new Map<string, { locked: boolean; plantingIds: Set<string> }>();
  for (const row of rows) {
    for (const settingId of [row.planned, row.planted]) {
      if (settingId === null) continue;
      const known = used.get(settingId) ?? { locked: false, plantingIds: new Set<string>() };
      known.plantingIds.add(row.plantingId);
      used.set(settingId, { ...known, locked: known.locked || row.lockedAt !== null });
    }
  }
  return used;
}
