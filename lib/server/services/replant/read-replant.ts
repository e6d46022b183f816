import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { frozenDecisionSchema, type ReplantAnswer, type SignedDecision } from '@/lib/schemas/replant';
import { listDecisions, type DecisionRow } from '../../data/decision';
import { listReplantSheets } from '../../data/replant-sheet';
import { contentHash } from '../../operations/content-hash';
import type { ReadContext } from '../../operations/context';
import { readCoreSamples } from '../scores/core-samples';
import { fieldAcresOf, replantBasis, sheetOfScope, zonesOf, type ReplantRecords } from './replant-basis';

/** Keep or replant for a planting, or for one zone of it: the answer with all it rests on, and what was signed before. */
export async function readReplant(
  context: ReadContext,
  { planting: plantingId, zone }: { planting: string; zone?: string | undefined },
): Promise<ReplantAnswer> {
  const { tx, actor } = context;
  const records = await readReplantRecords(context, plantingId);
  const { core, sheets } = records;
  const zoneId = zone ?? null;
  const basis = basisInPlanting(records, zoneId);
  const sheet = sheetOfScope(sheets, zoneId);
  const counted = new Set(basis.countedRows.map(({ rowSampleId }) => rowSampleId));
  const decisions = await listDecisions(tx, { organisationId: actor.organisationId, plantingId });
  const { fullYieldTyped, fullYieldUnit } = core.planting;
  return {
    basis,
    basisHash: contentHash(basis),
    zones: zonesOf(core),
    fieldAcres: fieldAcresOf(core),
    sheetSavedBy: sheet?.personName ?? null,
    plannedFullYield:
      fullYieldTyped !== null && fullYieldUnit !== null
        ? { typed: fullYieldTyped, unit: fullYieldUnit }
        : null,
    uncountedLabels: core.rowSamples
      .filter((row) => !counted.has(row.id) && (zoneId === null || row.zoneId === zoneId))
      .map(({ label }) => label),
    decisions: decisions.map(shownDecision),
  };
}

export async function readReplantRecords(context: ReadContext, plantingId: string): Promise<ReplantRecords> {
  const core = await readCoreSamples(context, plantingId);
  const sheets = await listReplantSheets(context.tx, {
    organisationId: context.actor.organisationId,
    plantingId,
  });
  return { core, sheets };
}

/** A zone that is not of this planting is not found, as is one that was taken out of its plan. */
export function basisInPlanting(records: ReplantRecords, zoneId: string | null) {
  if (zoneId !== null && !records.core.zones.some(({ id }) => id === zoneId)) throw new AppError('not-found');
  return replantBasis(records, zoneId);
}

function shownDecision(row: DecisionRow): SignedDecision {
  const { basis, signedOn } = frozenDecisionSchema.parse(row.frozen);
  const { id, decided, signedName, personName, basisHash } = row;
  const recommended = basis.answer.kind === 'value' ? basis.answer.recommendation : 'cannot-tell';
  return { id, zone: basis.zone, recommended, decided, signedName, personName, signedOn, basisHash, basis };
}
