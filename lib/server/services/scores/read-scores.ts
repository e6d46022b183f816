import 'server-only';
import type { RowSample } from '@/lib/agronomy/row-sample';
import { can } from '@/lib/access/can';
import type { ScoredSetting, ScoredStrip, Scores } from '@/lib/schemas/scores';
import type { ReadContext } from '../../operations/context';
import { readCoreSamples, type CoreSamples } from './core-samples';
import { fieldZones, standOfParts } from './field-zones';
import { plantingFacts } from './planting-facts';
import { scoredGroup } from './scored-group';
import { scoredRow } from './scored-row';
import { settingOfStrip } from './setting-of-strip';
import { soundSamples } from './sound-samples';
import { trialSettings } from './trial-settings';
import { wholePlanting } from './whole-planting';

/** What the stand of a planting says of itself at every level: the planting, its zones, settings, strips and row samples. */
export async function readScores(context: ReadContext, { planting }: { planting: string }): Promise<Scores> {
  const core = await readCoreSamples(context, planting);
  const sound = soundSamples(core.samples);
  const { parts, acresNotSampled, rowSamplesOutside } = fieldZones(core, sound.samples);
  const stand = parts.length > 0 ? standOfParts(parts) : null;
  // Who counts must not know which setting stands in a strip, and scores by setting are a comparison.
  const seesSettings = can(context.actor, 'comparison.read');
  const acresTotal = parts.reduce((sum, part) => sum + part.acres, 0);
  return {
    planting: plantingFacts(core),
    whole: wholePlanting(sound.samples, stand),
    zoneStand: stand && { stand, acresNotSampled, rowSamplesOutside },
    zones: parts.map(({ zoneId, name, acres, samples }) => ({
      zoneId,
      name,
      acres,
      areaShare: acres / acresTotal,
      ...scoredGroup(samples),
    })),
    settings: seesSettings ? scoredSettings(core, sound.samples) : [],
    strips: scoredStrips(core, sound.samples, seesSettings),
    rowSamples: core.rowSamples
      .map((rowSample) => scoredRow(core, sound, rowSample, seesSettings))
      .sort((a, b) => inOrder.compare(a.label, b.label)),
  };
}

const inOrder = new Intl.Collator('en-US', { numeric: true });

function scoredSettings(core: CoreSamples, samples: readonly RowSample[]): ScoredSetting[] {
  return trialSettings(core).map(({ setting, seriesIndex, isReference }) => {
    const strips = new Set(
      core.strips.filter((strip) => settingOfStrip(strip).settingId === setting.id).map((strip) => strip.id),
    );
    const own = samples.filter((sample) => sample.stripId !== null && strips.has(sample.stripId));
    return { settingId: setting.id, name: setting.name, seriesIndex, isReference, ...scoredGroup(own) };
  });
}

function scoredStrips(core: CoreSamples, samples: readonly RowSample[], seesSettings: boolean): ScoredStrip[] {
  return core.strips.map((strip) => {
    const { settingId, basis } = settingOfStrip(strip);
    return {
      stripId: strip.id,
      number: strip.number,
      blockNumber: strip.blockNumber,
      settingId: seesSettings ? settingId : null,
      settingName: (seesSettings && core.settings.find((setting) => setting.id === settingId)?.name) || null,
      settingBasis: basis,
      ...scoredGroup(samples.filter((sample) => sample.stripId === strip.id)),
    };
  });
}
