import type { PlantingRow } from '../../data/planting';
import type { ZoneRow } from '../../data/planting-zone';
import { readingOf } from '../../operations/reading-columns';

/** A planting with its zones as it leaves the server: every fact as it was typed. */
export function plantingView(planting: PlantingRow, zones: readonly ZoneRow[]) {
  return {
    id: planting.id,
    version: planting.version,
    plantedOn: planting.plantedOn,
    plantedAt: planting.plantedAt,
    crop: planting.crop,
    rowSpacing: { typed: planting.rowSpacingTyped, unit: planting.rowSpacingUnit, thousandths: planting.rowSpacingThousandths },
    seedingRate: { typed: planting.seedingRateTyped, unit: planting.seedingRateUnit, thousandths: planting.seedingRateThousandths },
    tagGermination: readingOf(planting.tagGerminationTyped, planting.tagGerminationUnit, planting.tagGerminationThousandths),
    intendedStand: { typed: planting.intendedStandTyped, unit: planting.intendedStandUnit, thousandths: planting.intendedStandThousandths },
    fullYield: readingOf(planting.fullYieldTyped, planting.fullYieldUnit, planting.fullYieldThousandths),
    previousCrop: planting.previousCrop,
    tillage: planting.tillage,
    slowAfterDays: planting.slowAfterDays,
    lateAfterDays: planting.lateAfterDays,
    veryLateAfterDays: planting.veryLateAfterDays,
    zones: zones.map((zone) => ({
      id: zone.id,
      name: zone.name,
      area: { typed: zone.areaTyped, unit: zone.areaUnit, thousandths: zone.areaThousandths },
    })),
  };
}
export type PlantingView = ReturnType<typeof plantingView>;
