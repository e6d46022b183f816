import { countingEnded } from '@/lib/agronomy/counting-ended';
import { sortedCounts } from '@/lib/agronomy/sorted-counts';
import type { ComparisonNotes } from '@/lib/schemas/comparison';
import type { CoreSamples } from '../scores/core-samples';
import { settingOfStrip } from '../scores/setting-of-strip';
import type { SoundSamples } from '../scores/sound-samples';
import type { ComparedStrip } from './compared-strips';

/** What a reader must know beside the numbers: what was lost, planted otherwise, visited unequally or not yet counted out. */
export function comparisonNotes(
  core: CoreSamples,
  sound: SoundSamples,
  strips: readonly ComparedStrip[],
  stripsCompared: number,
): ComparisonNotes {
  const counted = strips.filter(({ samples }) => samples.some((sample) => sample.counts.length > 0));
  const visits = counted.map(({ samples }) => Math.max(...samples.map((sample) => sample.counts.length)));
  const lastVisits = counted.map((strip) => lastVisitOf(core, strip)).sort();
  const inStrips = new Set(core.strips.map((strip) => strip.id));
  const observed = new Set(core.samples.map((sample) => sample.rowSampleId));
  const labelled = (isWanted: (row: CoreSamples['rowSamples'][number]) => boolean) =>
    core.rowSamples.filter(isWanted).map((row) => row.label);
  const isInStrip = (row: CoreSamples['rowSamples'][number]) => row.stripId !== null && inStrips.has(row.stripId);
  return {
    stripsTotal: core.strips.length,
    stripsCompared,
    stillCounting: counted
      .filter(({ samples }) => !samples.every((sample) => sample.counts.length === 0 || countingEnded(sortedCounts(sample))))
      .map(({ strip }) => strip.number),
    notCounted: strips.filter((strip) => !counted.includes(strip)).map(({ strip }) => strip.number),
    visitsLeast: visits.length > 0 ? Math.min(...visits) : 0,
    visitsMost: visits.length > 0 ? Math.max(...visits) : 0,
    lastVisitLeast: lastVisits[0] ?? null,
    lastVisitMost: lastVisits.at(-1) ?? null,
    ...stripsRun(core),
    rowSamplesNotCounted: labelled((row) => isInStrip(row) && !observed.has(row.id)),
    rowSamplesImpossible: labelled((row) => sound.impossible.has(row.id)),
    rowSamplesOutsideStrips: core.rowSamples.filter((row) => !isInStrip(row)).length,
  };
}

function stripsRun(core: CoreSamples) {
  const run = core.strips.map((strip) => ({ ...strip, ...settingOfStrip(strip) }));
  const otherwise = run.filter((strip) => strip.settingId !== null && strip.settingId !== strip.plannedSettingId);
  const lost = run.filter((strip) => strip.basis === 'lost');
  return {
    plantedOtherwise: otherwise.map((strip) => ({
      number: strip.number,
      plannedId: strip.plannedSettingId,
      settingId: strip.settingId ?? strip.plannedSettingId,
      reason: strip.asPlanted?.reason ?? null,
    })),
    asPlannedOnly: run.filter((strip) => strip.basis === 'as-planned').length,
    lost: lost.map((strip) => ({
      number: strip.number,
      reason: strip.asPlanted?.reason ?? null,
      rowSamples: core.rowSamples.filter((row) => row.stripId === strip.id).length,
    })),
    blocksNotAsDealt: [...new Set(otherwise.map((strip) => strip.blockNumber))],
  };
}

function lastVisitOf(core: CoreSamples, { samples }: ComparedStrip): string {
  const own = new Set(samples.map((sample) => sample.rowSampleId));
  return core.observations.counts
    .filter((count) => count.used && own.has(count.rowSampleId))
    .reduce((last, count) => (count.visitedOn > last ? count.visitedOn : last), '');
}
