import 'server-only';
import { daysSincePlanting } from '@/lib/agronomy/days-since-planting';
import type { RowCount, RowSample, TapePlace } from '@/lib/agronomy/row-sample';
import type { PlantingRow } from '../../data/planting';
import type { RowSampleRow } from '../../data/row-sample';
import { rowSampleFacts } from '../counts/count-facts';
import type { ObservedCount, ObservedTapeSheet } from '../counts/read-observations';

/** One row sample with what was observed in it, as the calculations take it; nothing is computed here but days and inches. */
export function coreSample(
  planting: PlantingRow,
  rowSample: RowSampleRow,
  counts: readonly ObservedCount[],
  tapeSheet: ObservedTapeSheet | undefined,
): RowSample {
  const { rowSpacingInches, seedsPerAcre, intendedPlantsPerAcre, lengthInches } = rowSampleFacts(planting, rowSample);
  const daysOf = (visit: { on: string; at: string | null }) =>
    daysSincePlanting({ on: planting.plantedOn, at: planting.plantedAt }, visit);
  return {
    rowSampleId: rowSample.id,
    stripId: rowSample.stripId,
    crop: planting.crop,
    rowSpacingInches,
    seedsPerAcre,
    intendedPlantsPerAcre,
    lengthInches,
    startEnd: rowSample.startEnd,
    farEnd: rowSample.farEnd,
    counts: counts.map((count): RowCount => ({
      days: daysOf({ on: count.visitedOn, at: count.visitedAt }),
      plantsUp: count.plantsUp,
      plantsDoubtful: count.doubtful,
    })),
    tape: tapeSheet
      ? tapeSheet.places.map(({ positionInches, segment, kind, firstSeen }): TapePlace => ({
          positionInches,
          segment,
          kind,
          firstSeen: firstSeen && {
            afterDays: firstSeen.after && daysOf(firstSeen.after),
            byDays: daysOf(firstSeen.by),
          },
        }))
      : null,
    lateLimits: {
      slowDays: planting.slowAfterDays,
      lateDays: planting.lateAfterDays,
      veryLateDays: planting.veryLateAfterDays,
    },
  };
}
