import 'server-only';
import { badField } from '@/lib/errors/app-error';
import type { RowSampleInput } from '@/lib/schemas/row-sample';
import { listZones } from '../../data/planting-zone';
import type { RowSampleRow } from '../../data/row-sample';
import { listStrips } from '../../data/strip';
import { findTrialOfPlanting } from '../../data/trial';
import type { ReadContext } from '../../operations/context';

/** Where row samples of a planting may lie: its own strips and zones, each under a label of its own. */
export async function placeGuard({ tx, actor }: ReadContext, plantingId: string, standing: readonly RowSampleRow[]) {
  const { organisationId } = actor;
  const trial = await findTrialOfPlanting(tx, { organisationId, plantingId });
  const strips = trial ? await listStrips(tx, { organisationId, trialId: trial.id }) : [];
  const zones = await listZones(tx, { organisationId, plantingId });
  const labels = new Set(standing.map((sample) => sample.label.toLowerCase()));
  return (sample: RowSampleInput, path: string) => {
    if (sample.stripId !== null && !strips.some((strip) => strip.id === sample.stripId)) {
      throw badField(`${path}stripId`, 'This strip is not in the planting. Choose one that is.');
    }
    if (sample.zoneId !== null && !zones.some((zone) => zone.id === sample.zoneId)) {
      throw badField(`${path}zoneId`, 'This zone is not in the planting. Choose one that is.');
    }
    const label = sample.label.toLowerCase();
    if (labels.has(label)) throw badField(`${path}label`, `There is a row sample ${sample.label} already. Give this one another label.`);
    labels.add(label);
  };
}
