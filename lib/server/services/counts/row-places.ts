import 'server-only';
import { listZones } from '../../data/planting-zone';
import { listRowSamples, type RowSampleRow } from '../../data/row-sample';
import { listStrips } from '../../data/strip';
import { findTrialOfPlanting } from '../../data/trial';
import type { ReadContext } from '../../operations/context';

/** Where a row sample lies; which setting ran there is not said, so that whoever counts does not know it. */
export type RowPlace = { blockNumber: number | null; stripNumber: number | null; zoneName: string | null; planterRow: number | null };
export type PlacedRow = { sample: RowSampleRow; place: RowPlace };

const inOrder = new Intl.Collator('en-US', { numeric: true });

/** The row samples of a planting in the order they are walked: by block and strip, then by label. */
export async function readPlacedRows({ tx, actor }: ReadContext, plantingId: string): Promise<PlacedRow[]> {
  const { organisationId } = actor;
  const samples = await listRowSamples(tx, { organisationId, plantingId });
  const zones = new Map((await listZones(tx, { organisationId, plantingId })).map((zone) => [zone.id, zone.name]));
  const trial = await findTrialOfPlanting(tx, { organisationId, plantingId });
  const strips = new Map((trial ? await listStrips(tx, { organisationId, trialId: trial.id }) : []).map((strip) => [strip.id, strip]));
  return samples
    .map((sample) => {
      const strip = sample.stripId === null ? undefined : strips.get(sample.stripId);
      return {
        sample,
        place: {
          blockNumber: strip?.blockNumber ?? null,
          stripNumber: strip?.number ?? null,
          zoneName: sample.zoneId === null ? null : (zones.get(sample.zoneId) ?? null),
          planterRow: sample.planterRow,
        },
      };
    })
    .sort(
      (a, b) =>
        (a.place.stripNumber ?? Number.MAX_SAFE_INTEGER) - (b.place.stripNumber ?? Number.MAX_SAFE_INTEGER) ||
        inOrder.compare(a.sample.label, b.sample.label),
    );
}
