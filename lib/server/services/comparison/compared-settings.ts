import { mapOutcome } from '@/lib/agronomy/outcome';
import type { RowSample } from '@/lib/agronomy/row-sample';
import { rowAreaAcres } from '@/lib/agronomy/stand';
import type { ComparedSetting } from '@/lib/schemas/comparison';
import type { CoreSamples } from '../scores/core-samples';
import { scoredGroup } from '../scores/scored-group';
import type { SoundSamples } from '../scores/sound-samples';
import { trialSettings } from '../scores/trial-settings';
import type { ComparedStrip } from './compared-strips';
import { typicalRow } from './typical-row';

/** Each setting with the curve of all its row samples, what its unevenness may cost, and one row to draw. */
export function comparedSettings(core: CoreSamples, sound: SoundSamples, strips: readonly ComparedStrip[]): ComparedSetting[] {
  return trialSettings(core).map(({ setting, seriesIndex, isReference }) => {
    const own = strips.filter((strip) => strip.settingId === setting.id);
    const samples = own.flatMap((strip) => strip.samples);
    const scored = scoredGroup(samples);
    const rowSampleIds = new Set(
      core.rowSamples.filter((row) => own.some(({ strip }) => strip.id === row.stripId)).map((row) => row.id),
    );
    const acres = areaCounted(samples);
    return {
      settingId: setting.id,
      name: setting.name,
      phrase: setting.phrase,
      seriesIndex,
      isReference,
      strips: own.length,
      rowSamples: samples.length,
      curve: mapOutcome(scored.figures.emergenceCurve, (curve) => ({
        points: curve.points.map(({ days, plantsUp }) => ({ days, plantsPerAcre: plantsUp / acres })),
        plantsLost: curve.plantsLost,
        countingEnded: curve.countingEnded,
      })),
      scored,
      typicalRow: typicalRow(core, samples, sound.scores),
      coverReadings: core.observations.residueReadings.filter((reading) => rowSampleIds.has(reading.rowSampleId)).length,
    };
  });
}

/** The ground of the row samples that carry the curve: those that were counted. */
function areaCounted(samples: readonly RowSample[]): number {
  return samples
    .filter((sample) => sample.counts.length > 0)
    .reduce((sum, sample) => sum + rowAreaAcres(sample.lengthInches, sample.rowSpacingInches), 0);
}
