import type { PlantingInput } from '@/lib/schemas/planting';
import type { StartSpotCountInput } from '@/lib/schemas/spot-count';

/** A planting as a spot count knows it. What nobody was asked in the field stays empty; the days are those a new plan starts with. */
export function spotPlanting({ plantedOn, crop, rowSpacing, seedingRate, intendedStand }: StartSpotCountInput): PlantingInput {
  return {
    plantedOn, plantedAt: null, crop, rowSpacing, seedingRate, intendedStand,
    tagGermination: null, fullYield: null, previousCrop: null, tillage: null,
    slowAfterDays: 2, lateAfterDays: 7, veryLateAfterDays: 14,
    zones: [],
  };
}
