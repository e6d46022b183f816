import 'server-only';
import { listRowSamples } from '../../data/row-sample';
import { listSettings } from '../../data/setting';
import { listStrips } from '../../data/strip';
import { findTrialOfPlanting } from '../../data/trial';
import { listZones } from '../../data/planting-zone';
import type { ReadContext } from '../../operations/context';
import { groupByRowSample, readObservations } from '../counts/read-observations';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { coreSample } from './core-sample';

export type CoreSamples = Awaited<ReturnType<typeof readCoreSamples>>;

/**
 * Everything the figures of a planting rest on, read once: its row samples, trial, zones and observations, and the row
 * samples with counts or a tape sheet as the calculations take them. Of two counts at one visit only the used one goes in.
 */
export async function readCoreSamples(context: ReadContext, plantingId: string) {
  const { planting, field, farm } = await findSeenPlanting(context, plantingId);
  const { tx } = context;
  const params = { organisationId: context.actor.organisationId, plantingId };
  const rowSamples = await listRowSamples(tx, params);
  const zones = await listZones(tx, params);
  const trial = await findTrialOfPlanting(tx, params);
  const strips = trial ? await listStrips(tx, { organisationId: params.organisationId, trialId: trial.id }) : [];
  const settings = await listSettings(tx, params);
  const observations = await readObservations(tx, params);
  const counts = groupByRowSample(observations.counts.filter((count) => count.used));
  const sheets = new Map(observations.tapeSheets.filter((sheet) => sheet.used).map((sheet) => [sheet.rowSampleId, sheet]));
  const samples = rowSamples
    .filter(({ id }) => counts.has(id) || sheets.has(id))
    .map((rowSample) => coreSample(planting, rowSample, counts.get(rowSample.id) ?? [], sheets.get(rowSample.id)));
  return { planting, field, farm, rowSamples, zones, trial, strips, settings, observations, samples };
}
