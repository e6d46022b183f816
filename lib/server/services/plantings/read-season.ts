import 'server-only';
import { can } from '@/lib/access/can';
import { listDecisionProgress, listPlantingProgress } from '../../data/planting-progress';
import { listStrips } from '../../data/strip';
import { findTrialOfPlanting } from '../../data/trial';
import type { ReadContext } from '../../operations/context';
import { findSeenPlanting } from './find-seen-planting';
import { plantingHead } from './planting-head';

/** What stands above every page of a planting: where one is, and how far its season has come. */
export async function readSeason(context: ReadContext, plantingId: string) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const { planting, field, farm } = await findSeenPlanting(context, plantingId);
  const trial = await findTrialOfPlanting(tx, { organisationId, plantingId });
  const strips = trial ? await listStrips(tx, { organisationId, trialId: trial.id }) : [];
  const [progress] = await listPlantingProgress(tx, { organisationId, plantingIds: [plantingId] });
  const [decided] = can(actor, 'decision.read')
    ? await listDecisionProgress(tx, { organisationId, plantingIds: [plantingId] })
    : [];
  return {
    head: plantingHead(planting, field, farm),
    trial: trial ? { locked: trial.lockedAt !== null, settings: new Set(strips.map((strip) => strip.plannedSettingId)).size } : null,
    firstVisitOn: progress?.firstVisitOn ?? null,
    lastVisitOn: progress?.lastVisitOn ?? null,
    decided: decided?.newestDecision?.decided ?? null,
    may: {
      count: can(actor, 'observations.read'),
      scores: can(actor, 'scores.read'),
      compare: can(actor, 'comparison.read') && trial !== undefined,
      decide: can(actor, 'replant.read'),
    },
  };
}
export type Season = Awaited<ReturnType<typeof readSeason>>;
