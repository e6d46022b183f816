import 'server-only';
import { can } from '@/lib/access/can';
import type { RowSample } from '@/lib/agronomy/row-sample';
import { scoresSchema, type ScoreLevel, type ScoredSetting, type ScoredStrip, type Scores } from '@/lib/schemas/scores';
import type { ReadContext } from '../../operations/context';
import { readCoreSamples, type CoreSamples } from './core-samples';
import { fieldZones, standOfParts } from './field-zones';
import { plantingFacts } from './planting-facts';
import { scoredGroup } from './scored-group';
import { scoredRow } from './scored-row';
import { settingOfStrip } from './setting-of-strip';
import { soundSamples, type SoundSamples } from './sound-samples';
import { trialSettings } from './trial-settings';
import { wholePlanting } from './whole-planting';

/**
 * What the stand of a planting says of itself: the planting with its zones, and one level below it. Who counts is not told
 * which setting stands in a strip, and scores by setting are a comparison; both are left out for a scout.
 */
export async function readScores(
  context: ReadContext,
  { planting, level }: { planting: string; level: ScoreLevel },
): Promise<Scores> {
  const core = await readCoreSamples(context, planting);
  const sound = soundSamples(core.samples);
  const seesSettings = can(context.actor, 'comparison.read');
  const { parts, acresNotSampled, rowSamplesOutside } = fieldZones(core, sound.samples);
  const stand = parts.length > 0 ? standOfParts(parts) : null;
  const acresTotal = parts.reduce((sum, part) => sum + part.acres, 0);
  // What leaves is what the schema names: a field added to the core later does not slip out with it.
  return scoresSchema.parse({
    planting: plantingFacts(core),
    level,
    things: {
      planting: 1,
      setting: seesSettings ? trialSettings(core).length : 0,
      strip: core.strips.length,
      'row-sample': core.rowSamples.length,
    },
    whole: wholePlanting(sound.samples, stand),
    zoneStand: stand && { stand, acresNotSampled, rowSamplesOutside },
    zones: parts.map(({ zoneId, name, acres, samples }) => ({
      zoneId,
      name,
      acres,
      areaShare: acres / acresTotal,
      ...scoredGroup(samples),
    })),
    settings: level === 'setting' && seesSettings ? scoredSettings(core, sound.samples) : [],
    strips: level === 'strip' ? scoredStrips(core, sound.samples, seesSettings) : [],
    rowSamples:
      level === 'row-sample' ? inFieldOrder(core).map((rowSample) => scoredRow(core, sound, rowSample, seesSettings)) : [],
    notes: scoreNotes(core, sound),
  } satisfies Scores);
}

const byLabel = new Intl.Collator('en-US', { numeric: true });

function inFieldOrder(core: CoreSamples) {
  return [...core.rowSamples].sort((a, b) => byLabel.compare(a.label, b.label));
}

function scoreNotes(core: CoreSamples, sound: SoundSamples): Scores['notes'] {
  const observed = new Set(core.samples.map((sample) => sample.rowSampleId));
  const lost = new Set(core.strips.filter((strip) => settingOfStrip(strip).basis === 'lost').map((strip) => strip.id));
  const rows = inFieldOrder(core);
  return {
    notCounted: rows.filter((row) => !observed.has(row.id)).map((row) => row.label),
    impossible: rows.flatMap((row) => {
      const field = sound.impossible.get(row.id);
      return field === undefined ? [] : [{ label: row.label, field }];
    }),
    countsNotUsed: core.observations.counts.filter((count) => !count.used).length,
    rowSamplesOfLostStrips: rows.filter((row) => row.stripId !== null && lost.has(row.stripId)).length,
  };
}

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
    const setting = seesSettings ? core.settings.find((each) => each.id === settingId) : undefined;
    return {
      stripId: strip.id,
      number: strip.number,
      blockNumber: strip.blockNumber,
      settingId: setting?.id ?? null,
      settingName: setting?.name ?? null,
      settingBasis: basis,
      ...scoredGroup(samples.filter((sample) => sample.stripId === strip.id)),
    };
  });
}
