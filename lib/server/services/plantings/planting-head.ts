import type { PlantingRow } from '../../data/planting';
import type { FieldRow } from '../../data/field';

/** A planting in one line: where it stands and what it is, as it was typed. */
export function plantingHead(planting: PlantingRow, field: FieldRow, farm: { id: string; name: string }) {
  return {
    plantingId: planting.id,
    fieldId: field.id,
    fieldName: field.name,
    farmId: farm.id,
    farmName: farm.name,
    crop: planting.crop,
    previousCrop: planting.previousCrop,
    tillage: planting.tillage,
    plantedOn: planting.plantedOn,
    rowSpacing: { typed: planting.rowSpacingTyped, unit: planting.rowSpacingUnit },
    seedingRate: { typed: planting.seedingRateTyped, unit: planting.seedingRateUnit },
  };
}
export type PlantingHead = ReturnType<typeof plantingHead>;
