import { daysSincePlanting } from '@/lib/agronomy/days-since-planting';
import type { ScoredRow } from '@/lib/schemas/scores';
import { readingIn } from '@/lib/schemas/reading';
import type { RowSampleRow } from '../../data/row-sample';
import type { CoreSamples } from './core-samples';
import { drawnPlants } from './drawn-plants';
import { saidPenalties } from './said-penalties';
import { settingOfStrip } from './setting-of-strip';
import type { SoundSamples } from './sound-samples';

/** One row sample with what was observed in it and what that says. */
export function scoredRow(
  core: CoreSamples,
  sound: SoundSamples,
  rowSample: RowSampleRow,
  seesSettings: boolean,
): ScoredRow {
  const strip = core.strips.find((each) => each.id === rowSample.stripId);
  const run = strip ? settingOfStrip(strip) : null;
  const counts = core.observations.counts.filter((count) => count.rowSampleId === rowSample.id);
  const sheet = core.observations.tapeSheets.find((each) => each.rowSampleId === rowSample.id && each.used);
  const scores = sound.scores.get(rowSample.id);
  const sample = sound.samples.find((each) => each.rowSampleId === rowSample.id);
  const planted = { on: core.planting.plantedOn, at: core.planting.plantedAt };
  return {
    rowSampleId: rowSample.id,
    label: rowSample.label,
    planterRow: rowSample.planterRow,
    length: {
      typed: rowSample.lengthTyped,
      unit: rowSample.lengthUnit,
      inches: readingIn({ unit: rowSample.lengthUnit, thousandths: rowSample.lengthThousandths }, 'in'),
    },
    startEnd: rowSample.startEnd,
    farEnd: rowSample.farEnd,
    stripNumber: strip?.number ?? null,
    settingName: (seesSettings && core.settings.find((setting) => setting.id === run?.settingId)?.name) || null,
    settingBasis: run?.basis ?? null,
    zoneName: core.zones.find((zone) => zone.id === rowSample.zoneId)?.name ?? null,
    counts: counts
      .filter((count) => count.used)
      .map(({ visitedOn, visitedAt, personName, plantsUp, doubtful }) => ({
        visitedOn,
        visitedAt,
        personName,
        plantsUp,
        doubtful,
        days: daysSincePlanting(planted, { on: visitedOn, at: visitedAt }),
      })),
    countsNotUsed: counts.filter((count) => !count.used).length,
    tapeSheet: sheet
      ? {
          readOn: sheet.visitedOn,
          personName: sheet.personName,
          tapeUnit: sheet.tapeUnit,
          places: [...sheet.places].sort((a, b) => a.order - b.order).map(({ typed, kind }) => ({ typed, kind })),
          plants: sample ? drawnPlants(sample) : [],
        }
      : null,
    scored: scores ? { figures: scores.figures, penalties: saidPenalties(scores.penalties) } : null,
    impossible: sound.impossible.get(rowSample.id) ?? null,
  };
}
