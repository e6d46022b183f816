import 'server-only';
import { can, seesFarm } from '@/lib/access/can';
import { listFarms } from '../../data/farm';
import { listFields } from '../../data/field';
import { listPlantings } from '../../data/planting';
import { listDecisionProgress, listPlantingProgress, listVisitedRowSampleIds } from '../../data/planting-progress';
import { listRowSamples } from '../../data/row-sample';
import { listTrials } from '../../data/trial';
import type { ReadContext } from '../../operations/context';
import { plantingHead } from '../plantings/planting-head';

/** The plantings a person sees, this season's first, with how far each has come: what the start page is made of. */
export async function readStart({ tx, actor, clock, organisation }: ReadContext) {
  const { organisationId } = actor;
  const farms = (await listFarms(tx, { organisationId })).filter((farm) => seesFarm(actor, farm.id));
  const fields = (await listFields(tx, { organisationId })).filter((field) => farms.some((farm) => farm.id === field.farmId));
  const plantings = (await listPlantings(tx, { organisationId })).filter((each) => fields.some((field) => field.id === each.fieldId));
  const plantingIds = plantings.map((each) => each.id);
  const progress = await listPlantingProgress(tx, { organisationId, plantingIds });
  const decisions = can(actor, 'decision.read') ? await listDecisionProgress(tx, { organisationId, plantingIds }) : [];
  const trials = await listTrials(tx, { organisationId });
  const visited = new Set(actor.role === 'scout' ? await listVisitedRowSampleIds(tx, { organisationId, plantingIds }) : []);
  const today = clock.today(organisation.timeZone);
  const seasons = [];
  for (const planting of plantings) {
    const field = fields.find((each) => each.id === planting.fieldId);
    const farm = farms.find((each) => each.id === field?.farmId);
    if (!field || !farm) continue;
    const trial = trials.find((each) => each.plantingId === planting.id);
    const decision = decisions.find((each) => each.plantingId === planting.id);
    const counted = progress.find((each) => each.plantingId === planting.id);
    // Only a scout's page opens the rows themselves.
    const samples = actor.role === 'scout' ? await listRowSamples(tx, { organisationId, plantingId: planting.id }) : [];
    seasons.push({
      ...plantingHead(planting, field, farm),
      thisSeason: planting.plantedOn.slice(0, 4) >= today.slice(0, 4),
      rowSamples: counted?.rowSamples ?? 0,
      rowSamplesVisited: counted?.rowSamplesVisited ?? 0,
      firstVisitOn: counted?.firstVisitOn ?? null,
      lastVisitOn: counted?.lastVisitOn ?? null,
      trial: trial ? { locked: trial.lockedAt !== null } : null,
      summedUp: decision?.summedUp ?? false,
      decided: decision?.newestDecision ? { choice: decision.newestDecision.decided, at: decision.newestDecision.signedAt } : null,
      rows: samples
        .map((sample) => ({ id: sample.id, label: sample.label, visited: visited.has(sample.id) }))
        // S2-1 stands before S10-1, as the pegs do in the field.
        .sort((a, b) => a.label.localeCompare(b.label, 'en', { numeric: true })),
    });
  }
  return { farms: farms.length, fields: fields.length, plantings: seasons };
}
export type Start = Awaited<ReturnType<typeof readStart>>;
