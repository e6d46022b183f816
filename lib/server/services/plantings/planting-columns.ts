import type { PlantingInput } from '@/lib/schemas/planting';
import { readingColumns } from '../../operations/reading-columns';

/** The columns that a planting's body fills, the same when it is added and when it is changed. */
export function plantingColumns(body: PlantingInput) {
  return {
    plantedOn: body.plantedOn,
    plantedAt: body.plantedAt,
    crop: body.crop,
    previousCrop: body.previousCrop,
    tillage: body.tillage,
    slowAfterDays: body.slowAfterDays,
    lateAfterDays: body.lateAfterDays,
    veryLateAfterDays: body.veryLateAfterDays,
    ...readingColumns('rowSpacing', body.rowSpacing),
    ...readingColumns('seedingRate', body.seedingRate),
    ...readingColumns('intendedStand', body.intendedStand),
    ...readingColumns('tagGermination', body.tagGermination),
    ...readingColumns('fullYield', body.fullYield),
  };
}
